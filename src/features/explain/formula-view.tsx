/** A formula with its names and with their values put in, for one profile and one cycle. */
import { useId, useMemo, useState } from 'react';
import {
  type Explained,
  explainFormula,
  type KeyReading,
} from '../../../shared/analysis/explain/formula.ts';
import { withValues } from '../../../shared/analysis/explain/with-values.ts';
import { cycleCount } from '../../../shared/model/cycles.ts';
import { Figure } from '../../components/figure.tsx';
import { issuePlace } from '../../i18n/issue-words.ts';
import { Ask } from './ask.tsx';
import type { ViewProps } from './panel.tsx';
import { useExplainWords } from './words.ts';

const FIELD = 'min-h-9 rounded-md border border-rule-strong bg-raised px-2';

export function FormulaView({ document, subject, onAsk }: ViewProps<'formula'>) {
  const words = useExplainWords(document);
  const { t, exact } = words;
  const fields = useId();
  const { strategy, text, path } = subject;
  const [profile, setProfile] = useState(document.profiles[0]?.id ?? '');
  const [cycle, setCycle] = useState(subject.cycle ?? 0);
  const last = cycleCount(document.question);
  const explained = useMemo(
    () => explainFormula(document, text, { strategy, profile, cycle, tunnel: 0 }),
    [document, text, strategy, profile, cycle],
  );
  return (
    <>
      <h2 className="mb-1 text-lg">
        {t('explain.formula', { strategy: words.strategy(strategy) })}
      </h2>
      <p className="mb-3 text-sm break-words text-mute">{issuePlace(path, document)}</p>
      <p className="break-words">{text}</p>
      <p className="mt-1 break-words text-mute">= {withValues(text, explained, exact)}</p>
      <p className="mt-1 mb-4 text-lg font-bold">
        ={' '}
        <Figure name="explained-formula" value={explained.value}>
          {exact(explained.value)}
        </Figure>
      </p>
      <div className="mb-4 flex flex-wrap gap-3 text-sm">
        {document.profiles.length > 1 && (
          <label htmlFor={`${fields}-profile`} className="flex items-center gap-2">
            {t('more.profiles.profile')}
            <select
              id={`${fields}-profile`}
              className={`${FIELD} max-w-56`}
              value={profile}
              onChange={(event) => setProfile(event.target.value)}
            >
              {document.profiles.map(({ id, label }) => (
                <option key={id} value={id}>
                  {label}
                </option>
              ))}
            </select>
          </label>
        )}
        <label htmlFor={`${fields}-cycle`} className="flex items-center gap-2">
          {t('more.trace.cycle')}
          <input
            id={`${fields}-cycle`}
            className={`${FIELD} w-20`}
            type="number"
            min={0}
            max={last}
            value={cycle}
            onChange={(event) =>
              setCycle(Math.min(last, Math.max(0, Math.round(Number(event.target.value)))))
            }
          />
        </label>
      </div>
      <ul>
        {partsOf(explained).map((part) => (
          <Part key={part.written} part={part} {...{ strategy, cycle, words, onAsk }} />
        ))}
      </ul>
    </>
  );
}

type Named = Extract<Explained, { type: 'name' | 'lookup' }>;

/** Every name and table once, in the order of the text. */
function partsOf(explained: Explained): Named[] {
  const seen = new Map<string, Named>();
  const visit = (part: Explained) => {
    if (part.type === 'number') return;
    if (part.type !== 'call' && !seen.has(part.written)) seen.set(part.written, part);
    if (part.type !== 'name') part.args.forEach(visit);
  };
  visit(explained);
  return [...seen.values()];
}

interface PartProps extends Pick<ViewProps<'formula'>, 'onAsk'> {
  readonly part: Named;
  readonly strategy: string;
  readonly cycle: number;
  readonly words: ReturnType<typeof useExplainWords>;
}

function Part({ part, strategy, cycle, words, onAsk }: PartProps) {
  const { exact } = words;
  return (
    <li className="border-b border-rule py-2">
      <span className="flex flex-wrap justify-between gap-x-3">
        <code className="min-w-0 font-sans break-words">{part.written}</code>
        <b>{exact(part.value)}</b>
      </span>
      <span className="block text-sm text-mute">
        {part.type === 'lookup' ? (
          <Lookup part={part} words={words} />
        ) : (
          <Meaning part={part} {...{ strategy, cycle, words, onAsk }} />
        )}
      </span>
    </li>
  );
}

function Meaning(props: PartProps & { part: Extract<Named, { type: 'name' }> }) {
  const { part, strategy, cycle, words, onAsk } = props;
  const { t } = words;
  const { meaning } = part;
  switch (meaning.what) {
    case 'parameter':
      return (
        <>
          <Ask onClick={() => onAsk({ what: 'parameter', parameter: meaning.parameter.id })}>
            {meaning.parameter.label}
          </Ask>
          <span className="block">
            {meaning.parameter.unit}
            {meaning.parameter.unit && ' · '}
            {meaning.parameter.source.citation}
          </span>
        </>
      );
    case 'variable':
      return (
        <Ask onClick={() => onAsk({ what: 'formula', strategy, cycle, ...meaning.site })}>
          {meaning.variable.label}
        </Ask>
      );
    case 'covariate':
      return t('explain.covariate', { label: meaning.label });
    case 'clock':
      return t(`explain.clock.${meaning.clock}`);
  }
}

function Lookup(props: { part: Extract<Named, { type: 'lookup' }>; words: PartProps['words'] }) {
  const { part, words } = props;
  const { t } = words;
  return (
    <>
      {part.table.label}
      {part.keys.map((key) => (
        <span key={key.label} className="block">
          {t(key.next === null ? 'explain.read' : 'explain.readBetween', readingOf(key, words))}
        </span>
      ))}
      {part.table.source && <span className="block">{part.table.source.citation}</span>}
    </>
  );
}

function readingOf({ label, asked, point, next }: KeyReading, { exact }: PartProps['words']) {
  return { label, asked: exact(asked), point: exact(point), next: exact(next ?? point) };
}
