import { Link } from 'react-router-dom';

/** The name and the mark: an arm, its stand and the poise. Leads to the list. */
export function Brand() {
  return (
    <Link to="/" className="inline-flex min-h-11 items-center gap-2 text-lg font-bold">
      <svg width="32" height="24" viewBox="0 0 32 24" aria-hidden="true">
        <path d="M2 9 L30 5.5" stroke="var(--ink)" strokeWidth="2.4" strokeLinecap="round" />
        <path d="M8.6 22 L11 8 L13.4 22 Z" fill="var(--ink)" />
        <path d="M23 6.5 V11" stroke="var(--brass)" strokeWidth="2" />
        <path d="M20 11 H26 L27.5 17 Q23 20 18.5 17 Z" fill="var(--brass)" />
      </svg>
      <span translate="no">Steelyard</span>
    </Link>
  );
}
