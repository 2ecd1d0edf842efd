/** The steps of an appraisal along a graduated arm; the poise hangs at the current one. */

import { useTranslation } from 'react-i18next';
import { NavLink } from 'react-router-dom';

export interface RailStep {
  readonly to: string;
  readonly name: string;
  /** A small fact beside the name, such as how many parameters there are. */
  readonly fact?: string;
}

export function Rail({ steps, onGo }: { steps: readonly RailStep[]; onGo?: () => void }) {
  const { t } = useTranslation();
  return (
    <nav aria-label={t('rail.label')}>
      <ol className="relative before:absolute before:top-[22px] before:bottom-[22px] before:left-2 before:w-0.5 before:bg-rule-strong">
        {steps.map(({ to, name, fact }) => (
          <li key={to}>
            <NavLink
              to={to}
              onClick={onGo}
              className="group relative flex min-h-11 items-center gap-2 rounded-md pr-4 pl-9 text-mute hover:text-ink aria-[current=page]:font-bold aria-[current=page]:text-ink"
            >
              <span
                aria-hidden="true"
                className="absolute top-1/2 left-2 h-0.5 w-3.5 -translate-y-1/2 bg-rule-strong group-aria-[current=page]:hidden"
              />
              <svg
                aria-hidden="true"
                viewBox="0 0 22 22"
                className="absolute top-1/2 -left-0.5 hidden size-[22px] -translate-y-1/2 group-aria-[current=page]:block"
              >
                <path d="M7 3 H15 L19 17 Q11 22 3 17 Z" fill="var(--brass)" />
              </svg>
              {name}
              {fact && <span className="ml-auto text-sm font-normal text-mute">{fact}</span>}
            </NavLink>
          </li>
        ))}
      </ol>
    </nav>
  );
}
