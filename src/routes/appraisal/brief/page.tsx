/** The one printed page: drafted from the model, in the reader's language or another. */
import type { i18n, TFunction } from 'i18next';
import { useMemo, useState } from 'react';
import { I18nextProvider, useTranslation } from 'react-i18next';
import type { BriefStanding } from '../../../../shared/export/brief/standing.ts';
import { writtenSentences } from '../../../../shared/export/brief/written.ts';
import { SelectField } from '../../../components/form/select-field.tsx';
import { TextField } from '../../../components/form/text-field.tsx';
import { IssueList } from '../../../components/issue-list.tsx';
import { usePageTitle } from '../../../components/page-title.ts';
import type { BriefReader } from '../../../i18n/brief-words.ts';
import { outcomeWords } from '../../../i18n/outcome-words.ts';
import { useSetting } from '../../../store/device-settings.ts';
import { LANGUAGES, type Language } from '../../../store/settings.ts';
import { type AppraisalContext, type Result, useAppraisalContext } from '../context.ts';
import { partsOf } from './parts.ts';
import { Sentences } from './sentences.tsx';
import { type Paper, Sheet } from './sheet.tsx';
import { useDrafted, useStanding } from './use-brief.ts';
import { useReportWords } from './use-report-words.ts';

export function Component() {
  const { t } = useTranslation();
  const context = useAppraisalContext();
  usePageTitle(t('brief.step'), context.document.question.title);
  return context.result ? <Page {...context} result={context.result} /> : <NoPage {...context} />;
}

/** A model that gives no answer has no page: what is broken is said instead. */
function NoPage({ document, issues }: AppraisalContext) {
  const { t } = useTranslation();
  const { standing, reasons } = useStanding({
    ...{ document, issues },
    ...{ drafted: null, result: null, written: [] },
  });
  const errors = issues.filter(({ severity }) => severity === 'error');
  if (standing !== 'broken' || errors.length === 0) return <Waiting />;
  return (
    <>
      <h1 className="mt-7 text-2xl">{t('brief.refused')}</h1>
      <ul className="mt-1 mb-4 max-w-prose text-mute">
        {reasonWords(reasons, t).map((reason) => (
          <li key={reason}>{reason}</li>
        ))}
      </ul>
      <IssueList issues={errors} document={document} />
    </>
  );
}

function Waiting() {
  const { t } = useTranslation();
  return (
    <>
      <h1 className="mt-7 text-2xl">{t('brief.title')}</h1>
      <p role="status" className="mt-2 text-mute">
        {t('brief.waiting')}
      </p>
    </>
  );
}

type PageProps = AppraisalContext & { readonly result: Result };

function Page(context: PageProps) {
  const { t } = useTranslation();
  const author = useSetting('author');
  const [language, setLanguage] = useState<Language>(context.language);
  const [paper, setPaper] = useState<Paper>(usualPaper);
  const [typed, setTyped] = useState<string | null>(null);
  const draftedBy = typed ?? author ?? '';
  const words = useReportWords(language);
  return (
    <>
      <div className="print:hidden">
        <h1 className="mt-7 text-2xl">{t('brief.title')}</h1>
        <p className="mt-1 max-w-prose text-mute">{t('brief.lead')}</p>
        <div className="mt-4 mb-6 flex flex-wrap items-end gap-4">
          <SelectField
            label={t('brief.language')}
            value={language}
            options={LANGUAGES.map((value) => ({ value, name: LANGUAGE_NAMES[value] }))}
            onValue={setLanguage}
          />
          <SelectField
            label={t('brief.paper')}
            value={paper}
            options={[
              { value: 'a4', name: 'A4' },
              { value: 'letter', name: t('brief.letter') },
            ]}
            onValue={setPaper}
          />
          <TextField
            label={t('brief.draftedBy')}
            value={draftedBy}
            maxLength={100}
            onValue={setTyped}
          />
          <button type="button" className="control-primary" onClick={() => window.print()}>
            {t('brief.print')}
          </button>
        </div>
      </div>
      {words && <InWords {...context} {...{ words, paper, draftedBy }} reportLanguage={language} />}
    </>
  );
}

/** Each language by its own name. */
const LANGUAGE_NAMES: Record<Language, string> = { en: 'English', fr: 'Français' };

/** Letter where the device is set to a country that uses it. */
function usualPaper(): Paper {
  return /-(US|CA|MX|PH)$/.test(navigator.language) ? 'letter' : 'a4';
}

interface InWordsProps extends PageProps {
  readonly words: i18n;
  readonly reportLanguage: Language;
  readonly paper: Paper;
  readonly draftedBy: string;
}

function InWords(props: InWordsProps) {
  const { document, issues, result, words, reportLanguage: language, paper, draftedBy } = props;
  const drafted = useDrafted(result);
  const [today] = useState(() => new Date());
  const written = useMemo(() => writtenSentences(document, language), [document, language]);
  const reader = useMemo<BriefReader>(() => {
    const { question } = result.document;
    const t = words.t;
    return { t, language, symbol: question.currency.symbol, outcome: outcomeWords(question, t) };
  }, [words, language, result.document]);
  const parts = useMemo(
    () => (drafted ? partsOf(drafted.brief, written, reader) : null),
    [drafted, written, reader],
  );
  const onPage = [...(parts?.values() ?? [])].flat().flatMap((each) => each.written ?? []);
  const { reasons } = useStanding({ document, issues, drafted, result, written: onPage });
  if (!drafted || !parts) return null;
  const date = new Intl.DateTimeFormat(language, { dateStyle: 'long' }).format(today);
  return (
    <>
      <I18nextProvider i18n={words}>
        <Sheet
          {...{ drafted, parts, reader, paper, draftedBy, date }}
          reasons={reasonWords(reasons, reader.t)}
        />
      </I18nextProvider>
      <Sentences parts={parts} language={language} />
    </>
  );
}

function reasonWords(reasons: BriefStanding['reasons'], t: TFunction): string[] {
  return reasons.map((reason) =>
    reason.code === 'standing.errors'
      ? t('brief.standing.errors', { count: reason.params.count })
      : t(`brief.${reason.code}`),
  );
}
