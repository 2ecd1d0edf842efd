import { createContext, useContext } from 'react';
import type { Subject } from './subject.ts';

export const ExplainContext = createContext<((subject: Subject) => void) | null>(null);

/** Opens the panel that takes a number apart; null where nothing can be explained. */
export function useExplain(): ((subject: Subject) => void) | null {
  return useContext(ExplainContext);
}
