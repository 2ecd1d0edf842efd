import { useTranslation } from 'react-i18next';
import { usePageTitle } from '../../../components/page-title.ts';
import { EditingProvider } from '../editing/context.tsx';
import { useSession } from '../session-context.ts';
import { Decision } from './decision.tsx';
import { Money, Thresholds } from './money.tsx';
import { Outcome } from './outcome.tsx';
import { Covariates, Profiles } from './profiles.tsx';
import { About, Beneficiaries, Draws, ReferenceCase } from './rules.tsx';
import { Strategies } from './strategies.tsx';
import { Discounting, Time } from './time.tsx';

/** The decision question: everything that has to be settled before evidence is gathered. */
export function Component() {
  const { t } = useTranslation();
  const { document, issues, edit, readOnly } = useSession();
  const { title, decision } = document.question;
  usePageTitle(t('steps.question'), title);
  return (
    <EditingProvider document={document} issues={issues} edit={edit}>
      <h1 className="mt-7 mb-6 max-w-[36em] text-2xl leading-tight">
        {decision || t('framing.heading')}
      </h1>
      <fieldset disabled={readOnly} className="min-w-0">
        <Decision />
        <Strategies />
        <Time />
        <Outcome />
        <Money />
        <Thresholds />
        <Discounting />
        <Profiles />
        <Covariates />
        <ReferenceCase />
        <Beneficiaries />
        <Draws />
        <About />
      </fieldset>
    </EditingProvider>
  );
}
