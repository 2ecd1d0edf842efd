/** Every sentence of the page, to be put in one's own words. */
import { useState } from 'react';
import { useTranslation } from 'react-i18next';
import {
  modelDigest,
  type WrittenSentence,
  withSentence,
} from '../../../../shared/export/brief/written.ts';
import { INPUT } from '../../../components/form/field.tsx';
import type { Language } from '../../../store/settings.ts';
import { useSession } from '../session-context.ts';
import { type PageParts, type PageSentence, textOf } from './parts.ts';

interface SentencesProps {
  readonly parts: PageParts;
  /** Of the page. */
  readonly language: Language;
}

export function Sentences({ parts, language }: SentencesProps) {
  const { t } = useTranslation();
  const { document, readOnly, edit } = useSession();
  const digest = modelDigest(document);
  const keep = (key: string, written: WrittenSentence | null) => {
    const brief = withSentence(document, language, key, written);
    edit([{ type: 'set', at: ['brief'], value: brief as never }], t('brief.edit.label'));
  };
  return (
    <section aria-labelledby="sentences-title" className="mt-10 max-w-[60em] print:hidden">
      <h2 id="sentences-title" className="text-lg">
        {t('brief.edit.title')}
      </h2>
      <p className="mt-1 mb-4 text-mute">
        {readOnly ? t('brief.edit.readOnly') : t('brief.edit.body')}
      </p>
      {[...parts].map(([part, sentences]) => (
        <div key={part} className="mb-6">
          <h3 className="mb-2">{t(`brief.parts.${part}`)}</h3>
          {sentences.map((sentence, index) => (
            <SentenceField
              // A draft that changes under the field is shown.
              key={`${language} ${sentence.key} ${textOf(sentence)}`}
              sentence={sentence}
              label={t('brief.edit.field', {
                number: index + 1,
                part: t(`brief.parts.${part}`),
              })}
              language={language}
              readOnly={readOnly}
              isStale={sentence.written !== null && sentence.written.writtenFor !== digest}
              onText={(text) =>
                keep(sentence.key, text === null ? null : { text, writtenFor: digest })
              }
            />
          ))}
        </div>
      ))}
    </section>
  );
}

interface SentenceFieldProps {
  readonly sentence: PageSentence;
  readonly label: string;
  readonly language: Language;
  readonly readOnly: boolean;
  readonly isStale: boolean;
  /** What is written in the draft's place; null takes the draft. */
  readonly onText: (text: string | null) => void;
}

/** As long as a sentence of the document may be. */
const LONGEST = 2_000;

function SentenceField(props: SentenceFieldProps) {
  const { sentence, label, language, readOnly, isStale, onText } = props;
  const { t } = useTranslation();
  const { drafted, written } = sentence;
  const stands = textOf(sentence);
  const [text, setText] = useState(stands);
  const leave = () => {
    const own = text.trim();
    if (own === stands) return;
    if (own === '' || own === drafted) setText(drafted);
    if (own === '' || own === drafted) onText(null);
    else onText(own);
  };
  return (
    <div className="mb-3">
      <textarea
        aria-label={label}
        lang={language}
        className={INPUT}
        rows={2}
        maxLength={LONGEST}
        disabled={readOnly}
        value={text}
        onChange={(event) => setText(event.target.value)}
        onBlur={leave}
      />
      {isStale && <p className="text-sm text-clay">{t('brief.edit.stale', { draft: drafted })}</p>}
      {written && !readOnly && (
        <p className="mt-1 flex flex-wrap gap-2">
          {isStale && (
            <button
              type="button"
              className="control px-3 text-sm"
              onClick={() => onText(written.text)}
            >
              {t('brief.edit.stands')}
            </button>
          )}
          <button type="button" className="control px-3 text-sm" onClick={() => onText(null)}>
            {t('brief.edit.again')}
          </button>
        </p>
      )}
    </div>
  );
}
