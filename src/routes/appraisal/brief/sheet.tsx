/** The page itself: what is on it, in the order in which a committee reads it. */
import type { ReactNode } from 'react';
import { useTranslation } from 'react-i18next';
import { type BriefReader, sentenceWords, thresholdWords } from '../../../i18n/brief-words.ts';
import { OptionsTable } from './options-table.tsx';
import { type PageParts, type PartName, textOf } from './parts.ts';
import { QrCode } from './qr-code.tsx';
import type { Drafted } from './use-brief.ts';
import { useFit } from './use-fit.ts';
import { Watermark } from './watermark.tsx';
import { Weighed } from './weighed.tsx';

export type Paper = 'a4' | 'letter';

interface SheetProps {
  readonly drafted: Drafted;
  readonly parts: PageParts;
  readonly reader: BriefReader;
  readonly paper: Paper;
  /** Why the page is only provisional; none where it is ready. */
  readonly reasons: readonly string[];
  readonly draftedBy: string;
  readonly date: string;
}

export function Sheet(props: SheetProps) {
  const { drafted, parts, reader, paper, reasons } = props;
  const { t } = useTranslation();
  const [sheet, fits] = useFit();
  const part = { parts };
  return (
    <>
      {!fits && (
        <p role="alert" className="mb-4 max-w-prose text-clay">
          {t('brief.tooLong')}
        </p>
      )}
      <section
        ref={sheet}
        aria-label={t('brief.sheet')}
        lang={reader.language}
        data-paper={paper}
        data-fits={fits}
        className="sheet"
      >
        {reasons.length > 0 && <Watermark words={t('brief.provisional')} />}
        <Head {...props} />
        <div className="sheet-answer">
          {(parts.get('answer') ?? []).map((sentence) => (
            <p key={sentence.key}>{textOf(sentence)}</p>
          ))}
        </div>
        <OptionsTable brief={drafted.brief} reader={reader} />
        <Weighed {...drafted} reader={reader} />
        <div className="sheet-columns">
          <Part {...part} name="howSure" />
          <Part {...part} name="whatWouldChange" />
          <Part {...part} name="research" />
        </div>
        <Part {...part} name="restsOn" list>
          <Basis {...props} />
        </Part>
        <div className="sheet-reasons">
          <h3>{t('brief.parts.reasons')}</h3>
          <p>{t('brief.parts.reasonsFor')}</p>
        </div>
        <Foot {...props} />
      </section>
    </>
  );
}

/** The decision asked, for whom, and which version of the model answers. */
function Head({ drafted, reader, date, reasons }: SheetProps) {
  const { t } = useTranslation();
  const { question, digests, invented } = drafted.brief;
  return (
    <header>
      <p className="sheet-line">
        <span>
          {question.title} · {t('brief.head.brief')}
          {invented && <strong> · {t('brief.head.invented')}</strong>}
        </span>
        <span>{t('brief.head.version', { date, version: shortDigest(digests.document) })}</span>
      </p>
      {reasons.length > 0 && (
        <p className="sheet-provisional">
          <strong>{t('brief.provisional')}.</strong> {reasons.join(' ')}
        </p>
      )}
      <div className="sheet-question">
        <div>
          <h2>{question.decision ?? question.title}</h2>
          <p className="sheet-small">
            {t('brief.head.for', { population: question.population, setting: question.setting })}{' '}
            {thresholdSource(drafted, reader)}
          </p>
        </div>
        <div className="sheet-code">
          <QrCode text={codeText(drafted)} label={t('brief.foot.check')} />
        </div>
      </div>
    </header>
  );
}

interface PartProps {
  readonly parts: PageParts;
  readonly name: PartName;
  readonly list?: boolean;
  readonly children?: ReactNode;
}

/** Nothing where there is nothing to say. */
function Part({ parts, name, list = false, children }: PartProps) {
  const { t } = useTranslation();
  const sentences = parts.get(name) ?? [];
  if (sentences.length === 0) return null;
  return (
    <section>
      <h3>{t(`brief.parts.${name}`)}</h3>
      {list ? (
        <ul>
          {sentences.map((sentence) => (
            <li key={sentence.key}>{textOf(sentence)}</li>
          ))}
          {children}
        </ul>
      ) : (
        sentences.map((sentence) => <p key={sentence.key}>{textOf(sentence)}</p>)
      )}
    </section>
  );
}

/** What the unit of health means. */
function Basis({ drafted }: SheetProps) {
  const { t } = useTranslation();
  const { measure } = drafted.brief.outcome;
  return measure === 'natural' ? null : <li>{t(`brief.gloss.${measure}`)}</li>;
}

/** Who drafted it, the caution, and what the numbers can be checked by. */
function Foot({ drafted, reader, draftedBy }: SheetProps) {
  const { t } = useTranslation();
  const { brief } = drafted;
  const { document, results, engine } = brief.digests;
  return (
    <footer data-document={document} data-results={results}>
      <p className="sheet-line">
        <span>
          {t('brief.draftedBy')}{' '}
          {draftedBy === '' ? <span className="sheet-signature" /> : <strong>{draftedBy}</strong>}
        </span>
        <span>
          {t('brief.foot.document', { digest: shortDigest(document) })} ·{' '}
          {t('brief.foot.results', { digest: shortDigest(results) })} ·{' '}
          {t('brief.foot.engine', { version: engine })}
        </span>
      </p>
      <p>
        {brief.invented && <strong>{t('provenance.invented')} </strong>}
        {sentenceWords(brief.caution, reader)} {t('brief.foot.check')}
      </p>
    </footer>
  );
}

/** What the square holds: text, and no address to go to. */
function codeText({ brief }: Drafted): string {
  const { document, results, engine } = brief.digests;
  return [
    'Steelyard',
    `document ${document}`,
    `results ${results}`,
    `engine ${engine}`,
    `threshold ${brief.threshold.value}`,
  ].join('\n');
}

function thresholdSource({ brief }: Drafted, reader: BriefReader): string {
  const { t } = reader;
  const { value, label, source } = brief.threshold;
  const threshold = thresholdWords(value, reader);
  if (label === null) return t('brief.foot.thresholdFree', { threshold });
  const told = t('brief.foot.threshold', { threshold, label });
  return source ? `${told} ${t('brief.foot.source', { source: withoutStop(source) })}` : told;
}

/** The document's own words get one full stop, not two. */
function withoutStop(text: string): string {
  return text.replace(/\.\s*$/, '');
}

/** The first digits, in fours, enough to tell one version from another by eye. */
function shortDigest(digest: string): string {
  return digest.slice(0, 12).replace(/(.{4})(?=.)/g, '$1\u00A0');
}
