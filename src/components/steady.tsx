import type { ReactNode } from 'react';

interface SteadyProps {
  /** What may stand here instead: room is kept for the tallest. */
  readonly others: readonly string[];
  /** How the text is set, so that the others take the room they would. */
  readonly className: string;
  readonly children: ReactNode;
}

/** Keeps what stands below from moving when a text changes: the poise stays under the finger. */
export function Steady({ others, className, children }: SteadyProps) {
  return (
    <div className="grid *:[grid-area:1/1]">
      {children}
      {others.map((other) => (
        <span key={other} aria-hidden="true" className={`invisible block ${className}`}>
          {other}
        </span>
      ))}
    </div>
  );
}
