import type { ReactNode } from 'react';

/** A part of the question: its heading on the left, what it asks on the right. */
export function Section({ title, children }: { title: string; children: ReactNode }) {
  return (
    <section className="border-t border-ink py-5 lg:grid lg:grid-cols-[13rem_1fr] lg:gap-x-8">
      <h2 className="mb-3 text-lg">{title}</h2>
      <div className="grid max-w-[46em] gap-4">{children}</div>
    </section>
  );
}

/** Fields side by side where there is room. */
export function Pair({ children }: { children: ReactNode }) {
  return <div className="grid items-start gap-4 sm:grid-cols-2">{children}</div>;
}
