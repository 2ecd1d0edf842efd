import { useTranslation } from 'react-i18next';
import type { Question } from '../../../../shared/model/document.ts';
import { SelectField } from '../../../components/form/select-field.tsx';
import { useEditing } from '../editing/context.tsx';
import { LabelAt, SelectAt } from './fields.tsx';
import { Pair, Section } from './section.tsx';

const MEASURES = ['qaly', 'lifeYears', 'daly', 'natural'] as const;
const DIRECTIONS = ['moreIsBetter', 'fewerIsBetter'] as const;

/** What health is counted in, and which way is better. */
export function Outcome() {
  const { t } = useTranslation();
  const { document, edit } = useEditing();
  const { outcome } = document.question;
  const at = ['question', 'outcome'];
  const label = t('framing.measure');
  const choose = (measure: Question['outcome']['measure']) => {
    const names =
      measure === 'natural'
        ? {}
        : {
            unit: t(`outcome.${measure}.plural`),
            unitSingular: t(`outcome.${measure}.singular`),
            direction: measure === 'daly' ? 'fewerIsBetter' : 'moreIsBetter',
          };
    const fields = Object.entries({ measure, ...names });
    edit(
      fields.map(([field, value]) => ({ type: 'set', at: [...at, field], value })),
      t('editing.acts.changed', { what: label }),
    );
  };
  return (
    <Section title={t('question.outcome')}>
      <Pair>
        <SelectField
          label={label}
          value={outcome.measure}
          options={MEASURES.map((value) => ({ value, name: t(`framing.measures.${value}`) }))}
          onValue={choose}
        />
        <SelectAt
          at={[...at, 'direction']}
          value={outcome.direction}
          options={DIRECTIONS.map((value) => ({ value, name: t(`framing.directions.${value}`) }))}
          label={t('framing.direction')}
        />
        {outcome.measure === 'natural' && (
          <>
            <LabelAt at={[...at, 'unit']} value={outcome.unit} label={t('framing.unit')} />
            <LabelAt
              at={[...at, 'unitSingular']}
              value={outcome.unitSingular}
              label={t('framing.unitSingular')}
            />
          </>
        )}
      </Pair>
    </Section>
  );
}
