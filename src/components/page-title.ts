import { useEffect } from 'react';

/** The page's name in the tab, the history and what a screen reader says first. */
export function usePageTitle(...parts: readonly string[]): void {
  const title = [...parts, 'Steelyard'].join(' · ');
  useEffect(() => {
    document.title = title;
  }, [title]);
}
