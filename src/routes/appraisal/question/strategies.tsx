import { useState } from 'react';
import { useTranslation } from 'react-i18next';
import { addStrategy } from '../../../../shared/model/edit/add-strategy.ts';
import { Swatch } from '../../../components/strategy-mark.tsx';
import { useEditing } from '../editing/context.tsx';
import { IssueLines } from '../editing/issue-lines.tsx';
import { ItemActions } from '../editing/item-actions.tsx';
import { placeOf } from '../use-sought.ts';
import { LabelAt, TextAt } from './fields.tsx';
import { Section } from './section.tsx';

/** The ways of treating the problem; one of them is what the others are weighed against. */
export function Strategies() {
  const { t } = useTranslation();
  const { document, edit } = useEditing();
  const [added, setAdded] = useState<string | null>(null);
  const add = () => {
    const label = t('framing.newStrategy', { number: document.strategies.length + 1 });
    const { edits, id } = addStrategy(document, { label });
    edit(edits, t('framing.added', { what: label }));
    setAdded(id);
  };
  return (
    <Section title={t('question.strategies')}>
      <p className="text-sm text-mute">{t('framing.strategiesHelp')}</p>
      <ul>
        {document.strategies.map((strategy, index) => (
          <Strategy
            key={strategy.id}
            strategy={strategy}
            index={index}
            isNew={strategy.id === added}
          />
        ))}
      </ul>
      <p>
        <button type="button" className="control" onClick={add}>
          {t('framing.addStrategy')}
        </button>
      </p>
    </Section>
  );
}

interface StrategyProps {
  readonly strategy: ReturnType<typeof useEditing>['document']['strategies'][number];
  readonly index: number;
  readonly isNew: boolean;
}

function Strategy({ strategy, index, isNew }: StrategyProps) {
  const { t } = useTranslation();
  const { document, change, issuesAt } = useEditing();
  const { id, label, description } = strategy;
  const at = ['strategies', { id }];
  return (
    <li
      id={placeOf(id)}
      tabIndex={-1}
      className="grid gap-2 border-t border-rule py-3 first:border-t-0 first:pt-0"
    >
      <div className="flex flex-wrap items-center gap-x-3 gap-y-1">
        <Swatch index={index} />
        <LabelAt
          at={[...at, 'label']}
          value={label}
          quiet
          label={t('framing.strategyName', { number: index + 1 })}
          autoFocus={isNew}
          className="flex-1 basis-48"
        />
        <label className="flex min-h-11 items-center gap-2 text-sm">
          <input
            type="radio"
            name="comparator"
            className="size-5 accent-brass"
            checked={document.question.comparator === id}
            onChange={() => change(['question', 'comparator'], id, t('framing.comparator'))}
          />
          {t('question.comparator')}
          <span className="sr-only">: {label}</span>
        </label>
        <ItemActions target={{ what: 'strategy', id }} label={label} />
      </div>
      <TextAt
        at={[...at, 'description']}
        value={description}
        optional
        lines={1}
        quiet
        label={t('framing.strategyBody', { label })}
      />
      <IssueLines issues={issuesAt(['strategies', index])} />
    </li>
  );
}
