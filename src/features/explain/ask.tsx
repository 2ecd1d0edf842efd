import type { ReactNode } from 'react';

/** A word or number that leads to what it is made of. */
export function Ask({ onClick, children }: { onClick: () => void; children: ReactNode }) {
  return (
    <button
      type="button"
      className="min-h-6 text-left underline decoration-rule-strong underline-offset-4 hover:decoration-current"
      onClick={onClick}
    >
      {children}
    </button>
  );
}
