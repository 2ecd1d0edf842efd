import type { ComponentType } from 'react';
import { useTranslation } from 'react-i18next';
import { Navigate, NavLink, useParams } from 'react-router-dom';
import { usePageTitle } from '../../../components/page-title.ts';
import { EditingProvider } from '../editing/context.tsx';
import { useSession } from '../session-context.ts';
import { Covariates } from './covariates.tsx';
import { Movements } from './movements.tsx';
import { Payoffs } from './payoffs.tsx';
import { Scenarios } from './scenarios.tsx';
import { Start } from './start.tsx';
import { States } from './states.tsx';
import { Tables } from './tables.tsx';
import { Variables } from './variables.tsx';

const SECTIONS = {
  states: States,
  start: Start,
  movements: Movements,
  variables: Variables,
  payoffs: Payoffs,
  tables: Tables,
  covariates: Covariates,
  scenarios: Scenarios,
} as const satisfies Readonly<Record<string, ComponentType>>;
type SectionName = keyof typeof SECTIONS;
const NAMES = Object.keys(SECTIONS) as SectionName[];

/** The model, a part at a time, each with its own address. */
export function Component() {
  const { t } = useTranslation();
  const { document, issues, edit } = useSession();
  const { section } = useParams();
  const name = NAMES.find((each) => each === section);
  const part = t(`model.sections.${name ?? 'states'}`);
  usePageTitle(part, t('steps.model'), document.question.title);
  if (!name) return <Navigate to="../model/states" replace />;
  const Section = SECTIONS[name];
  return (
    <EditingProvider document={document} issues={issues} edit={edit}>
      <nav aria-label={t('model.parts')} className="mt-5 border-b border-rule">
        <ul className="-mb-px flex flex-wrap gap-x-5">
          {NAMES.map((each) => (
            <li key={each}>
              <NavLink
                to={`../model/${each}`}
                className="inline-flex min-h-11 items-center border-b-2 border-transparent text-mute hover:text-ink aria-[current=page]:border-brass aria-[current=page]:font-bold aria-[current=page]:text-ink"
              >
                {t(`model.sections.${each}`)}
              </NavLink>
            </li>
          ))}
        </ul>
      </nav>
      <Section />
    </EditingProvider>
  );
}
