import type { ReactNode } from 'react';

interface SectionHeadProps {
  readonly title: string;
  /** What this is, and what to do here. */
  readonly lead: string;
  /** What can be done with the whole. */
  readonly children?: ReactNode;
}

export function SectionHead({ title, lead, children }: SectionHeadProps) {
  return (
    <header className="mt-5 flex flex-wrap items-start gap-x-6 gap-y-2">
      <div className="min-w-0 max-w-[44em] flex-1 basis-80">
        <h1 className="text-2xl">{title}</h1>
        <p className="mt-1 text-mute">{lead}</p>
      </div>
      {children}
    </header>
  );
}
