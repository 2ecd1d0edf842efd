/** A number to be read, with its raw value for whoever reads the page by program. */
import type { ReactNode } from 'react';

interface FigureProps {
  readonly value: number;
  /** What the number is of, as `data-figure`. */
  readonly name: string;
  readonly children: ReactNode;
}

export function Figure({ value, name, children }: FigureProps) {
  return (
    <data value={value} data-figure={name} className="whitespace-nowrap">
      {children}
    </data>
  );
}
