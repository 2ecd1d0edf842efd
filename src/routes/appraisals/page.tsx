import { useTranslation } from 'react-i18next';
import { Link } from 'react-router-dom';
import { usePageTitle } from '../../components/page-title.ts';
import { type ExampleFacts, listExamples } from '../../store/examples.ts';
import { PlainPage } from '../plain-page.tsx';
import { Begin } from './begin.tsx';
import { OwnAppraisals } from './own-appraisals.tsx';

const EXAMPLES = listExamples();

export function Component() {
  const { t } = useTranslation();
  usePageTitle(t('appraisals.title'));
  return (
    <PlainPage help="appraisals">
      <h1 className="mt-8 text-3xl">{t('appraisals.title')}</h1>
      <p className="mt-2 max-w-[44em] text-lg text-mute">{t('appraisals.lead')}</p>
      <OwnAppraisals />
      <section aria-labelledby="examples-title" className="mt-10">
        <h2 id="examples-title" className="border-b border-ink pb-1.5 text-lg">
          {t('appraisals.examples')}
        </h2>
        {EXAMPLES.length === 0 ? (
          <p className="mt-3 text-mute">{t('appraisals.none')}</p>
        ) : (
          <ul>
            {EXAMPLES.map((example) => (
              <Example key={example.slug} {...example} />
            ))}
          </ul>
        )}
      </section>
      <Begin />
      <footer className="mt-12 max-w-[70em] border-t border-rule pt-3 text-sm text-mute">
        <p>{t('caution')}</p>
      </footer>
    </PlainPage>
  );
}

function Example({ slug, title, decision, invented, strategies }: ExampleFacts) {
  const { t } = useTranslation();
  return (
    <li className="relative border-b border-rule py-4 hover:bg-raised sm:grid sm:grid-cols-[1fr_auto] sm:gap-x-8">
      <div className="min-w-0">
        <h3 className="text-lg">
          <Link
            to={`/appraisals/${slug}/results`}
            className="underline decoration-rule-strong underline-offset-4 after:absolute after:inset-0 hover:decoration-ink"
          >
            {title}
          </Link>
        </h3>
        <p className="mt-1 max-w-[44em] text-mute">{decision}</p>
      </div>
      <p className="mt-2 flex flex-wrap items-baseline gap-x-4 text-sm text-mute sm:mt-1 sm:flex-col sm:items-end">
        <span className={invented ? 'text-brass' : 'text-gain'}>
          {t(invented ? 'appraisals.invented' : 'appraisals.published')}
        </span>
        <span>{t('appraisals.strategies', { count: strategies })}</span>
      </p>
    </li>
  );
}
