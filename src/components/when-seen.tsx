/** What stands far down is made when it comes near the screen, or when the page is printed. */
import { type ReactNode, useEffect, useRef, useState } from 'react';

interface WhenSeenProps {
  /** Room kept until then, in px. */
  readonly height: number;
  readonly children: ReactNode;
}

export function WhenSeen({ height, children }: WhenSeenProps) {
  const box = useRef<HTMLDivElement>(null);
  const [seen, setSeen] = useState(typeof IntersectionObserver === 'undefined');
  useEffect(() => {
    const element = box.current;
    if (seen || !element) return;
    const show = () => setSeen(true);
    const observer = new IntersectionObserver(
      (entries) => entries.some(({ isIntersecting }) => isIntersecting) && show(),
      { rootMargin: '400px' },
    );
    observer.observe(element);
    window.addEventListener('beforeprint', show);
    return () => {
      observer.disconnect();
      window.removeEventListener('beforeprint', show);
    };
  }, [seen]);
  return (
    <div ref={box} className="min-w-0" style={seen ? undefined : { minHeight: height }}>
      {seen && children}
    </div>
  );
}
