/** Ctrl or Cmd with Z takes the last edit back, with Shift brings it again. */
import { useEffect } from 'react';
import type { Session } from '../../store/session.ts';

/** Fields that are no part of the document keep the browser's own undo. */
const OWN_UNDO = '[data-own-undo]';

export function useUndoKeys(session: Session): void {
  useEffect(() => {
    const onKey = (event: KeyboardEvent) => {
      const { key, ctrlKey, metaKey, altKey, shiftKey, target } = event;
      if (event.defaultPrevented || altKey || !(ctrlKey || metaKey)) return;
      if (key.toLowerCase() !== 'z') return;
      if (target instanceof Element && target.closest(OWN_UNDO)) return;
      event.preventDefault();
      void (shiftKey ? session.redo() : session.undo());
    };
    document.addEventListener('keydown', onKey);
    return () => document.removeEventListener('keydown', onKey);
  }, [session]);
}
