import { useState } from 'react';
import { useTranslation } from 'react-i18next';
import type { Payoff } from '../../../../shared/model/document.ts';
import { addAmount } from '../../../../shared/model/edit/add-amount.ts';
import { addPayoff } from '../../../../shared/model/edit/add-payoff.ts';
import type { Place } from '../../../../shared/model/edit/edit.ts';
import { NumberField } from '../../../components/form/number-field.tsx';
import { SelectField } from '../../../components/form/select-field.tsx';
import { TextField } from '../../../components/form/text-field.tsx';
import { useEditing } from '../editing/context.tsx';
import { FormulaAt } from '../editing/formula-at.tsx';
import { IssueLines } from '../editing/issue-lines.tsx';
import { Act, ItemActions } from '../editing/item-actions.tsx';
import { StrategiesChosen } from '../editing/strategies-chosen.tsx';
import { useStateName } from './names.ts';
import { SectionHead } from './section-head.tsx';

const TYPES = ['state', 'movement', 'once', 'start'] as const;

/** What is paid and gained: for time in states, on moving, once, and at the start. */
export function Payoffs() {
  const { t } = useTranslation();
  const { document } = useEditing();
  return (
    <>
      <SectionHead
        title={t('model.payoffs.title', { count: document.payoffs.length })}
        lead={t('model.payoffs.lead')}
      />
      <NewPayoff />
      {(['cost', 'outcome'] as const).map((measure) => (
        <section key={measure} className="mt-6">
          <h2 className="border-b border-ink pb-1 text-lg">
            {t(`model.payoffs.measures.${measure}`)}
          </h2>
          <ul>
            {document.payoffs.map(
              (payoff, index) =>
                payoff.measure === measure && (
                  <li key={payoff.id} className="border-b border-rule py-4">
                    <PayoffEditor payoff={payoff} index={index} />
                  </li>
                ),
            )}
          </ul>
        </section>
      ))}
    </>
  );
}

function NewPayoff() {
  const { t } = useTranslation();
  const { document, edit } = useEditing();
  const [type, setType] = useState<Payoff['type']>('state');
  const add = (measure: Payoff['measure']) => {
    const label = t(`model.payoffs.newLabels.${measure}`);
    const category = measure === 'cost' ? label : document.question.outcome.unit;
    const { edits } = addPayoff(document, { label, category, measure, type });
    edit(edits, t('editing.acts.added', { what: label }));
  };
  return (
    <div className="mt-4 flex flex-wrap items-end gap-3">
      <SelectField<Payoff['type']>
        label={t('model.payoffs.newType')}
        className="w-72 max-w-full"
        value={type}
        options={TYPES.map((each) => ({ value: each, name: t(`model.payoffs.types.${each}`) }))}
        onValue={setType}
      />
      <button type="button" className="control-primary" onClick={() => add('cost')}>
        {t('model.payoffs.addCost')}
      </button>
      <button type="button" className="control" onClick={() => add('outcome')}>
        {t('model.payoffs.addOutcome')}
      </button>
    </div>
  );
}

interface PayoffProps<T extends Payoff['type'] = Payoff['type']> {
  readonly payoff: Extract<Payoff, { type: T }>;
  readonly index: number;
}

const placeOf = ({ id }: Payoff): Place => ['payoffs', { id }];

function PayoffEditor({ payoff, index }: PayoffProps) {
  const { t } = useTranslation();
  const { change, issuesAt } = useEditing();
  const { id, label, category, strategies, type } = payoff;
  const at = placeOf(payoff);
  const own = issuesAt(['payoffs', index]).filter(({ path }) => !path.includes('formula'));
  return (
    <div className="grid gap-x-6 gap-y-3 lg:grid-cols-[minmax(0,1fr)_minmax(0,1.6fr)]">
      <div className="grid content-start gap-3">
        <TextField
          label={t('editing.label')}
          required
          maxLength={300}
          value={label}
          onValue={(text) => change([...at, 'label'], text, label)}
        />
        <TextField
          label={t('model.payoffs.category')}
          required
          maxLength={300}
          value={category}
          onValue={(text) => change([...at, 'category'], text, label)}
        />
        <StrategiesChosen
          legend={t('model.payoffs.strategies')}
          value={strategies}
          onValue={(next) => change([...at, 'strategies'], next, label)}
        />
        <ItemActions target={{ what: 'payoff', id }} label={label} />
      </div>
      <div className="grid content-start gap-3">
        <p className="text-sm text-mute">{t(`model.payoffs.types.${type}`)}</p>
        <PayoffBody payoff={payoff} index={index} />
        <IssueLines issues={own} />
      </div>
    </div>
  );
}

function PayoffBody({ payoff, index }: PayoffProps) {
  switch (payoff.type) {
    case 'state':
      return <ByState payoff={payoff} index={index} />;
    case 'movement':
      return <OnMoving payoff={payoff} index={index} />;
    case 'once':
      return <Once payoff={payoff} index={index} />;
    case 'start':
      return <Amount payoff={payoff} index={index} />;
  }
}

function Amount({ payoff, index }: PayoffProps<'movement' | 'once' | 'start'>) {
  const { t } = useTranslation();
  return (
    <FormulaAt
      label={t('model.payoffs.amount')}
      formula={payoff.formula}
      at={[...placeOf(payoff), 'formula']}
      path={['payoffs', index, 'formula']}
      what={payoff.label}
      strategies={payoff.strategies}
    />
  );
}

function ByState({ payoff, index }: PayoffProps<'state'>) {
  const { t } = useTranslation();
  const { document, change, edit } = useEditing();
  const nameOf = useStateName();
  const at = placeOf(payoff);
  const free = document.states.filter(
    ({ id }) => !payoff.amounts.some(({ state }) => state === id),
  );
  const what = payoff.label;
  return (
    <>
      <SelectField<'year' | 'cycle'>
        label={t('model.payoffs.per')}
        className="max-w-60"
        value={payoff.per}
        options={[
          { value: 'year', name: t('model.payoffs.pers.year') },
          { value: 'cycle', name: t('model.payoffs.pers.cycle') },
        ]}
        onValue={(per) => change([...at, 'per'], per, what)}
      />
      <ul className="grid gap-2">
        {payoff.amounts.map(({ id, state, formula }, place) => (
          <li key={id} className="flex items-start gap-1">
            <div className="min-w-0 flex-1">
              <FormulaAt
                label={nameOf(state)}
                formula={formula}
                at={[...at, 'amounts', { id }, 'formula']}
                path={['payoffs', index, 'amounts', place, 'formula']}
                what={`${what}: ${nameOf(state)}`}
                strategies={payoff.strategies}
              />
            </div>
            {payoff.amounts.length > 1 && (
              <Act
                name={t('editing.remove', { label: `${what}: ${nameOf(state)}` })}
                onClick={() =>
                  edit(
                    [{ type: 'remove', at: [...at, 'amounts'], id }],
                    t('editing.acts.changed', { what }),
                  )
                }
              >
                <path d="M4 4 L12 12 M12 4 L4 12" />
              </Act>
            )}
          </li>
        ))}
      </ul>
      {free.length > 0 && (
        <SelectField
          label={t('model.payoffs.addState')}
          className="max-w-60"
          value=""
          options={[
            { value: '', name: t('editing.choose') },
            ...free.map(({ id, label }) => ({ value: id, name: label })),
          ]}
          onValue={(state) => {
            if (state === '') return;
            const { edits } = addAmount(document, payoff.id, { state });
            edit(edits, t('editing.acts.changed', { what }));
          }}
        />
      )}
    </>
  );
}

function OnMoving({ payoff, index }: PayoffProps<'movement'>) {
  const { t } = useTranslation();
  const { document, change } = useEditing();
  const at = placeOf(payoff);
  return (
    <>
      <div className="grid gap-3 sm:grid-cols-2">
        {(['from', 'to'] as const).map((end) => (
          <SelectField
            key={end}
            label={t(`model.payoffs.${end}`)}
            value={payoff[end] ?? ''}
            options={[
              { value: '', name: t('model.payoffs.anyOther') },
              ...document.states.map(({ id, label }) => ({ value: id, name: label })),
            ]}
            onValue={(state) =>
              change([...at, end], state === '' ? undefined : state, payoff.label)
            }
          />
        ))}
      </div>
      <Amount payoff={payoff} index={index} />
    </>
  );
}

function Once({ payoff, index }: PayoffProps<'once'>) {
  const { t } = useTranslation();
  const { document, change } = useEditing();
  const at = placeOf(payoff);
  const living = document.states.filter(({ dead }) => !dead).map(({ id }) => id);
  const chosen = payoff.states ?? living;
  const turn = (id: string) => {
    const ids = document.states.map((state) => state.id);
    const next = ids.filter((each) => chosen.includes(each) !== (each === id));
    const isAll = next.length === living.length && living.every((each) => next.includes(each));
    change([...at, 'states'], isAll ? undefined : next, payoff.label);
  };
  return (
    <>
      <NumberField
        label={t('model.payoffs.cycle')}
        className="w-44"
        whole
        min={0}
        value={payoff.cycle}
        onValue={(cycle) => change([...at, 'cycle'], cycle, payoff.label)}
      />
      <fieldset>
        <legend className="text-sm text-mute">{t('model.payoffs.whoIn')}</legend>
        <div className="flex flex-wrap gap-x-4">
          {document.states.map(({ id, label }) => (
            <label key={id} className="flex min-h-10 items-center gap-2">
              <input
                type="checkbox"
                className="size-4 accent-brass"
                checked={chosen.includes(id)}
                onChange={() => turn(id)}
              />
              {label}
            </label>
          ))}
        </div>
      </fieldset>
      <Amount payoff={payoff} index={index} />
    </>
  );
}
