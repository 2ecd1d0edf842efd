/** Full incremental analysis: a table where there is room, cards on a phone. */
import type { ReactNode } from 'react';
import { useTranslation } from 'react-i18next';
import type { IncrementalRow } from '../../../shared/analysis/incremental.ts';
import { Figure } from '../../components/figure.tsx';
import { Swatch } from '../../components/strategy-mark.tsx';
import { formatAmount, formatNumber, formatOutcome } from '../../i18n/format.ts';
import type { OutcomeWords } from '../../i18n/outcome-words.ts';
import type { Errors } from '../../store/answer.ts';
import type { Language } from '../../store/settings.ts';

/** A strategy's numbers before the last change. */
export interface FormerRow {
  readonly cost: number;
  readonly outcome: number;
  readonly icer: number | null;
  readonly nmb: number | null;
}

export interface IncrementalTableProps {
  /** In order of cost. */
  readonly rows: readonly IncrementalRow[];
  /** Primary outcome by strategy, in its own direction. */
  readonly outcomes: ReadonlyMap<string, number>;
  /** Monte Carlo standard errors by strategy, where the numbers are means of draws. */
  readonly errors: ReadonlyMap<string, Errors> | null;
  /** Net monetary benefit by strategy at the threshold in force. */
  readonly nmb: ReadonlyMap<string, number>;
  /** Strategies' names by id, in document order. */
  readonly names: ReadonlyMap<string, string>;
  /** Before the last change, by strategy; absent or null where nothing has changed. */
  readonly was?: ReadonlyMap<string, FormerRow> | null;
  readonly best: string;
  readonly symbol: string;
  readonly outcome: OutcomeWords;
  /** Takes a number of the base case apart. */
  readonly onExplain?: (strategy: string, measure: 'cost' | 'outcome') => void;
  readonly language: Language;
}

export function IncrementalTable(props: IncrementalTableProps) {
  return (
    <>
      <Table {...props} />
      <Cards {...props} />
      <Reasons {...props} />
    </>
  );
}

function Table(props: IncrementalTableProps) {
  const { t } = useTranslation();
  const { rows, symbol, outcome } = props;
  return (
    <table className="w-full border-collapse text-right max-sm:hidden">
      <thead className="text-sm text-mute">
        <tr>
          <Head first>{t('table.strategy')}</Head>
          <Head unit={symbol}>{t('table.cost')}</Head>
          <Head>{outcome.plural}</Head>
          <Head unit={t('table.per', { symbol, unit: outcome.per })}>{t('table.icer')}</Head>
          <Head unit={symbol}>{t('table.nmb')}</Head>
        </tr>
      </thead>
      <tbody>
        {rows.map((row) => (
          <tr
            key={row.id}
            className={row.id === props.best ? 'font-bold' : '[&_th]:font-normal'}
            data-strategy={row.id}
          >
            <th scope="row" className="border-b border-rule py-2.5 pr-2 text-left">
              <Name id={row.id} names={props.names} />
            </th>
            <Amount>
              <Cost {...props} row={row} />
            </Amount>
            <Amount>
              <Outcome {...props} row={row} />
            </Amount>
            <Amount>
              <Icer {...props} row={row} />
            </Amount>
            <Amount>
              <NetBenefit {...props} row={row} />
            </Amount>
          </tr>
        ))}
      </tbody>
    </table>
  );
}

function Head(props: { children: string; unit?: string; first?: boolean }) {
  const side = props.first ? 'text-left' : 'pl-3 text-right';
  return (
    <th scope="col" className={`border-b border-ink pb-1.5 align-bottom font-normal ${side}`}>
      {props.children}
      {props.unit && <span className="block">{props.unit}</span>}
    </th>
  );
}

function Amount({ children }: { children: ReactNode }) {
  return <td className="border-b border-rule py-2.5 pl-3 whitespace-nowrap">{children}</td>;
}

function Cards(props: IncrementalTableProps) {
  const { t } = useTranslation();
  const { rows, symbol, outcome } = props;
  return (
    <ul className="border-t border-ink sm:hidden">
      {rows.map((row) => (
        <li key={row.id} className="border-b border-rule py-3">
          <p className={row.id === props.best ? 'font-bold' : ''}>
            <Name id={row.id} names={props.names} />
          </p>
          <dl className="mt-1 grid grid-cols-[1fr_auto] gap-x-3">
            <Line term={t('table.costIn', { symbol })}>
              <Cost {...props} row={row} />
            </Line>
            <Line term={outcome.plural}>
              <Outcome {...props} row={row} />
            </Line>
            <Line term={t('table.icerIn', { symbol, unit: outcome.per })}>
              <Icer {...props} row={row} />
            </Line>
            <Line term={t('table.nmbIn', { symbol })}>
              <NetBenefit {...props} row={row} />
            </Line>
          </dl>
        </li>
      ))}
    </ul>
  );
}

function Line({ term, children }: { term: string; children: ReactNode }) {
  return (
    <>
      <dt className="text-mute">{term}</dt>
      <dd className="text-right">{children}</dd>
    </>
  );
}

function Name({ id, names }: { id: string; names: ReadonlyMap<string, string> }) {
  const index = [...names.keys()].indexOf(id);
  return (
    <span className="flex items-center gap-2">
      <Swatch index={index} />
      {names.get(id)}
    </span>
  );
}

type CellProps = IncrementalTableProps & { readonly row: IncrementalRow };

function Cost(cell: CellProps) {
  const { t } = useTranslation();
  const { row, rows, errors, was, language } = cell;
  const decimals = columnDecimals(rows.map(({ cost }) => cost));
  return (
    <Figure name="cost" value={row.cost}>
      <Explained {...cell} measure="cost" term={t('table.cost')}>
        {formatNumber(row.cost, language, { decimals })}
      </Explained>
      <PlusMinus error={errors?.get(row.id)?.cost} decimals={decimals} language={language} />
      <Was
        now={row.cost}
        before={was?.get(row.id)?.cost}
        write={(value) => formatNumber(value, language, { decimals })}
      />
    </Figure>
  );
}

function Outcome(cell: CellProps) {
  const { row, outcomes, errors, outcome, was, language } = cell;
  const value = outcomes.get(row.id) ?? 0;
  return (
    <Figure name="outcome" value={value}>
      <Explained {...cell} measure="outcome" term={outcome.plural}>
        {formatOutcome(value, language)}
      </Explained>
      <PlusMinus error={errors?.get(row.id)?.health} decimals={3} language={language} />
      <Was
        now={value}
        before={was?.get(row.id)?.outcome}
        write={(before) => formatOutcome(before, language)}
      />
    </Figure>
  );
}

type ExplainedProps = CellProps & {
  readonly measure: 'cost' | 'outcome';
  readonly term: string;
  readonly children: string;
};

/** A number of the base case leads to what it is made of; a mean of draws does not. */
function Explained({ row, names, errors, onExplain, measure, term, children }: ExplainedProps) {
  const { t } = useTranslation();
  if (!onExplain || errors) return children;
  return (
    <button
      type="button"
      title={t('explain.openNamed', { what: `${term}, ${names.get(row.id)}` })}
      className="min-h-6 underline decoration-rule-strong decoration-dotted underline-offset-4 hover:decoration-current hover:decoration-solid"
      onClick={() => onExplain(row.id, measure)}
    >
      {children}
    </button>
  );
}

interface PlusMinusProps {
  readonly error: number | null | undefined;
  readonly decimals: number;
  readonly language: Language;
}

function PlusMinus({ error, decimals, language }: PlusMinusProps) {
  if (!error) return null;
  // Rounded up: an error of 0 would say too much.
  const shown = Math.max(error, 10 ** -decimals);
  return (
    <span className="ml-1 text-sm font-normal text-mute">
      ± {formatNumber(shown, language, { decimals })}
    </span>
  );
}

/** A ratio where there is one; otherwise the word for why there is none. */
function Icer({ row, names, was, language }: CellProps) {
  const { t } = useTranslation();
  if (row.icer !== null) {
    return (
      <Figure name="icer" value={row.icer}>
        {formatAmount(row.icer, language)}
        <Was
          now={row.icer}
          before={was?.get(row.id)?.icer}
          write={(before) => formatAmount(before, language)}
        />
      </Figure>
    );
  }
  const other = row.tiedWith === null ? '' : names.get(row.tiedWith);
  return (
    <span className="text-sm font-normal whitespace-normal text-mute">
      {t(`table.noIcer.${row.noIcer ?? 'reference'}`, { other })}
    </span>
  );
}

function NetBenefit({ row, nmb, was, language }: CellProps) {
  const value = nmb.get(row.id) ?? 0;
  const decimals = columnDecimals([...nmb.values()]);
  return (
    <Figure name="nmb" value={value}>
      {formatNumber(value, language, { decimals })}
      <Was
        now={value}
        before={was?.get(row.id)?.nmb}
        write={(before) => formatNumber(before, language, { decimals })}
      />
    </Figure>
  );
}

interface WasProps {
  readonly now: number;
  readonly before: number | null | undefined;
  readonly write: (value: number) => string;
}

/** What it was, where that reads otherwise than what it is. */
function Was({ now, before, write }: WasProps) {
  const { t } = useTranslation();
  if (before === null || before === undefined || write(before) === write(now)) return null;
  return (
    <span className="block text-sm font-normal text-brass">
      {t('strip.was', { before: write(before) })}
    </span>
  );
}

/** One number of decimals for the whole column, so that its figures line up. */
function columnDecimals(values: readonly number[]): number {
  const largest = Math.max(...values.map(Math.abs));
  return largest >= 100 ? 0 : 2;
}

/** Who rules out whom, in a sentence each. */
function Reasons({ rows, names }: IncrementalTableProps) {
  const { t } = useTranslation();
  const sentences = rows.flatMap((row) => {
    const strategy = names.get(row.id);
    if (row.status === 'dominated' && row.dominatedBy !== null) {
      return [t('table.dominatedBy', { strategy, other: names.get(row.dominatedBy) })];
    }
    if (row.extendedlyDominatedBy === null) return [];
    const [cheaper, dearer] = row.extendedlyDominatedBy.map((id) => names.get(id));
    return [t('table.extendedlyDominatedBy', { strategy, cheaper, dearer })];
  });
  return sentences.map((sentence) => (
    <p key={sentence} className="mt-2 text-sm text-mute">
      {sentence}
    </p>
  ));
}
