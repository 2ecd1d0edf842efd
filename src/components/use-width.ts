import { type RefObject, useLayoutEffect, useRef, useState } from 'react';

/** Width in px of the element that the ref is put on; `first` until it has been measured. */
export function useWidth<E extends HTMLElement>(first: number): [RefObject<E | null>, number] {
  const box = useRef<E>(null);
  const [width, setWidth] = useState(first);
  useLayoutEffect(() => {
    const element = box.current;
    if (!element) return;
    const measure = () => setWidth((before) => Math.floor(element.clientWidth) || before);
    measure();
    if (typeof ResizeObserver === 'undefined') return;
    const observer = new ResizeObserver(measure);
    observer.observe(element);
    return () => observer.disconnect();
  }, []);
  return [box, width];
}
