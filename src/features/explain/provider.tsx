/** Lets whatever stands within it open the panel that takes numbers apart. */
import { lazy, type ReactNode, Suspense, useCallback, useState } from 'react';
import type { ModelDocument } from '../../../shared/model/document.ts';
import type { Subject } from './subject.ts';
import { ExplainContext } from './use-explain.ts';

/** Brings the compiler along, which no page needs before something is asked. */
const Panel = lazy(async () => ({ default: (await import('./panel.tsx')).Panel }));

interface ExplainProviderProps {
  /** What the numbers on the page are of. */
  readonly document: ModelDocument;
  readonly children: ReactNode;
}

export function ExplainProvider({ document, children }: ExplainProviderProps) {
  const [asked, setAsked] = useState<readonly Subject[]>([]);
  const open = useCallback((subject: Subject) => setAsked([subject]), []);
  const close = useCallback(() => setAsked([]), []);
  return (
    <ExplainContext value={open}>
      {children}
      {asked.length > 0 && (
        <Suspense fallback={null}>
          <Panel document={document} asked={asked} onAsk={setAsked} onClose={close} />
        </Suspense>
      )}
    </ExplainContext>
  );
}
