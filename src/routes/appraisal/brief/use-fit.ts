/** The largest size of text at which the page holds all that stands on it. */
import { type RefObject, useEffect, useLayoutEffect, useRef, useState } from 'react';

/** Shares of the full size; below the last one the page could not be read. */
const SIZES = [1, 0.96, 0.92, 0.88, 0.84];

/** @returns the sheet's ref, and whether everything is on it at some size */
export function useFit(): [RefObject<HTMLElement | null>, boolean] {
  const sheet = useRef<HTMLElement>(null);
  const [fits, setFits] = useState(true);
  // After every change of the page: what stands on it can come from anywhere.
  useLayoutEffect(() => {
    if (sheet.current) setFits(fitted(sheet.current));
  });
  useEffect(() => {
    const again = () => sheet.current && setFits(fitted(sheet.current));
    // Before the fonts are there their stand-ins were measured.
    void document.fonts?.ready.then(again);
    window.addEventListener('beforeprint', again);
    return () => window.removeEventListener('beforeprint', again);
  }, []);
  return [sheet, fits];
}

/** Measured as printed, whatever the screen is: the page is put back before it is painted. */
function fitted(sheet: HTMLElement): boolean {
  sheet.dataset.measuring = '';
  const size = SIZES.find((each) => {
    sheet.style.setProperty('--fit', String(each));
    return sheet.scrollHeight <= sheet.clientHeight;
  });
  delete sheet.dataset.measuring;
  return size !== undefined;
}
