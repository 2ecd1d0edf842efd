import { useState } from 'react';
import { useTranslation } from 'react-i18next';
import { SelectField } from '../../../components/form/select-field.tsx';
import { TextField } from '../../../components/form/text-field.tsx';
import { useEditing } from '../editing/context.tsx';
import { NumberAt, SelectAt } from './fields.tsx';
import { Pair, Section } from './section.tsx';
import { YearlyRates } from './yearly-rates.tsx';

const COUNTINGS = ['start', 'end', 'trapezoid', 'simpson'] as const;
const MOMENTS = ['counted', 'cycleStart', 'cycleMiddle', 'cycleEnd'] as const;

/** How long the model runs, in what steps, and how time is counted. */
export function Time() {
  const { t } = useTranslation();
  const { document, change } = useEditing();
  const { horizon, counting, clockStart } = document.question;
  const countings = COUNTINGS.map((value) => ({ value, name: t(`question.countings.${value}`) }));
  return (
    <Section title={t('framing.timeTitle')}>
      <Pair>
        <NumberAt
          at={['question', 'horizon']}
          value={horizon}
          above={0}
          max={1_000}
          unit={t('framing.years')}
          label={t('question.horizon')}
        />
        <CycleLength />
        <SelectAt
          at={['question', 'counting']}
          value={counting}
          options={countings}
          label={t('question.counting')}
        />
        <TextField
          value={clockStart === undefined ? '' : String(clockStart)}
          label={t('framing.clockStart')}
          help={t('framing.clockStartHelp')}
          check={(text) => (/^\d{1,4}$/.test(text) ? null : t('form.whole'))}
          onValue={(text) => {
            const at = ['question', 'clockStart'];
            change(at, text === '' ? undefined : Number(text), t('framing.clockStart'));
          }}
        />
      </Pair>
    </Section>
  );
}

const LENGTHS = { year: 1, half: 1 / 2, quarter: 1 / 4, month: 1 / 12, week: 7 / 365.25 };
const NAMES = ['year', 'half', 'quarter', 'month', 'week', 'other'] as const;
type LengthName = (typeof NAMES)[number];

function CycleLength() {
  const { t } = useTranslation();
  const { document, change } = useEditing();
  const { cycleLength } = document.question;
  const [wantsOther, setWantsOther] = useState(false);
  const known = NAMES.find((name) => name !== 'other' && isNear(LENGTHS[name], cycleLength));
  const name = wantsOther ? 'other' : (known ?? 'other');
  const label = t('question.cycle');
  const choose = (next: LengthName) => {
    setWantsOther(next === 'other');
    if (next !== 'other') change(['question', 'cycleLength'], LENGTHS[next], label);
  };
  return (
    <div className="grid gap-2">
      <SelectField
        label={label}
        value={name}
        options={NAMES.map((value) => ({ value, name: t(`framing.lengths.${value}`) }))}
        onValue={choose}
        help={t('framing.cycleHelp')}
      />
      {name === 'other' && (
        <NumberAt
          at={['question', 'cycleLength']}
          value={cycleLength}
          above={0}
          max={100}
          unit={t('framing.years')}
          label={t('framing.otherLength')}
        />
      )}
    </div>
  );
}

function isNear(a: number, b: number): boolean {
  return Math.abs(a - b) < 1e-9;
}

/** Discount rates and the moment at which they are taken. */
export function Discounting() {
  const { t } = useTranslation();
  const { document, change } = useEditing();
  const { at: moment, wholeYears } = document.question.discounting;
  return (
    <Section title={t('framing.discountingTitle')}>
      <Pair>
        <Rate of="costs" label={t('framing.discountCosts')} />
        <Rate of="outcomes" label={t('framing.discountOutcomes')} />
      </Pair>
      <SelectAt
        at={['question', 'discounting', 'at']}
        value={moment ?? 'counted'}
        options={MOMENTS.map((value) => ({ value, name: t(`framing.moments.${value}`) }))}
        label={t('framing.moment')}
        className="max-w-96"
      />
      <label className="flex min-h-11 items-center gap-3">
        <input
          type="checkbox"
          className="size-5 accent-brass"
          checked={wholeYears ?? false}
          onChange={({ target }) =>
            change(
              ['question', 'discounting', 'wholeYears'],
              target.checked,
              t('framing.wholeYears'),
            )
          }
        />
        {t('framing.wholeYears')}
      </label>
    </Section>
  );
}

/** One rate a year, or one for each year of which the last holds on. */
function Rate({ of, label }: { of: 'costs' | 'outcomes'; label: string }) {
  const { t } = useTranslation();
  const { document, change } = useEditing();
  const rate = document.question.discounting[of];
  const at = ['question', 'discounting', of];
  const first = typeof rate === 'number' ? rate : (rate.byYear[0] ?? 0);
  const choose = (kind: 'one' | 'byYear') =>
    change(at, kind === 'one' ? first : { byYear: [first, first] }, label);
  return (
    <div className="grid gap-2">
      {typeof rate === 'number' ? (
        <NumberAt at={at} value={rate} percent above={-1} max={1} unit="%" label={label} />
      ) : (
        <YearlyRates
          rates={rate.byYear}
          label={label}
          set={(byYear) => change(at, { byYear }, label)}
        />
      )}
      <SelectField
        quiet
        label={t('framing.rateKind', { label })}
        value={typeof rate === 'number' ? 'one' : 'byYear'}
        options={[
          { value: 'one', name: t('framing.oneRate') },
          { value: 'byYear', name: t('framing.ratesByYear') },
        ]}
        onValue={choose}
      />
    </div>
  );
}
