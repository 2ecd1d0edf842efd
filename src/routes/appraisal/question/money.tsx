import { useState } from 'react';
import { useTranslation } from 'react-i18next';
import { addThreshold } from '../../../../shared/model/edit/add-threshold.ts';
import { outcomeWords } from '../../../i18n/outcome-words.ts';
import { useEditing } from '../editing/context.tsx';
import { IssueLines } from '../editing/issue-lines.tsx';
import { ItemActions } from '../editing/item-actions.tsx';
import { LabelAt, NumberAt, TextAt } from './fields.tsx';
import { Pair, Section } from './section.tsx';

/** Currency, the year of its prices, and what a unit of health may cost. */
export function Money() {
  const { t } = useTranslation();
  const { code, symbol, priceYear } = useEditing().document.question.currency;
  const at = ['question', 'currency'];
  return (
    <Section title={t('question.currency')}>
      <div className="grid items-start gap-4 sm:grid-cols-3">
        <TextAt
          at={[...at, 'code']}
          value={code}
          required
          maxLength={3}
          label={t('framing.code')}
          help={t('framing.codeHelp')}
          check={(text) => (/^[A-Z]{3}$/.test(text) ? null : t('framing.codeUnfit'))}
        />
        <TextAt
          at={[...at, 'symbol']}
          value={symbol}
          required
          maxLength={8}
          label={t('framing.symbol')}
        />
        <NumberAt
          at={[...at, 'priceYear']}
          value={priceYear}
          whole
          min={1900}
          max={2200}
          label={t('framing.priceYear')}
        />
      </div>
    </Section>
  );
}

export function Thresholds() {
  const { t } = useTranslation();
  const { document, edit, issuesAt } = useEditing();
  const { question } = document;
  const [added, setAdded] = useState<string | null>(null);
  const add = () => {
    const label = t('framing.newThreshold', { number: question.thresholds.length + 1 });
    const { edits, id } = addThreshold(document, {
      label,
      value: question.thresholds.at(-1)?.value ?? 0,
    });
    edit(edits, t('framing.added', { what: label }));
    setAdded(id);
  };
  return (
    <Section title={t('question.thresholds')}>
      <p className="text-sm text-mute">{t('framing.thresholdsHelp')}</p>
      <ul>
        {question.thresholds.map((threshold, index) => (
          <Threshold key={threshold.id} index={index} isNew={threshold.id === added} />
        ))}
      </ul>
      <IssueLines issues={issuesAt(['question', 'thresholds'])} />
      <p>
        <button type="button" className="control" onClick={add}>
          {t('framing.addThreshold')}
        </button>
      </p>
    </Section>
  );
}

function Threshold({ index, isNew }: { index: number; isNew: boolean }) {
  const { t } = useTranslation();
  const { document, change } = useEditing();
  const { question } = document;
  const threshold = question.thresholds[index];
  if (!threshold) return null;
  const { id, label, value, source } = threshold;
  const at = ['question', 'thresholds', { id }];
  const inForce = question.thresholdInForce ?? question.thresholds[0]?.id;
  const { per } = outcomeWords(question, t);
  return (
    <li className="grid gap-2 border-t border-rule py-3 first:border-t-0 first:pt-0">
      <Pair>
        <LabelAt
          at={[...at, 'label']}
          value={label}
          label={t('framing.thresholdName')}
          autoFocus={isNew}
        />
        <NumberAt
          at={[...at, 'value']}
          value={value}
          min={0}
          unit={t('table.per', { symbol: question.currency.symbol, unit: per })}
          label={t('framing.thresholdValue')}
        />
      </Pair>
      <TextAt
        at={[...at, 'source']}
        value={source}
        optional
        lines={1}
        label={t('framing.source')}
      />
      <div className="flex flex-wrap items-center gap-x-4">
        <label className="flex min-h-11 items-center gap-2 text-sm">
          <input
            type="radio"
            name="threshold-in-force"
            className="size-5 accent-brass"
            checked={inForce === id}
            onChange={() => change(['question', 'thresholdInForce'], id, t('framing.inForce'))}
          />
          {t('framing.inForce')}
          <span className="sr-only">: {label}</span>
        </label>
        <ItemActions target={{ what: 'threshold', id }} label={label} />
      </div>
    </li>
  );
}
