import { useId, useMemo, useState } from 'react';
import { useTranslation } from 'react-i18next';
import { SelectField } from '../../../components/form/select-field.tsx';
import { textWidth } from '../../../components/text-width.ts';
import { useWidth } from '../../../components/use-width.ts';
import { useEditing } from '../editing/context.tsx';
import { BOX_HEIGHT, diagramLayout } from './diagram-layout.ts';
import { movesOf } from './moves.ts';
import { useStateName } from './names.ts';

interface DiagramProps {
  /** Whose movements are drawn: null for any. Without it the reader chooses here. */
  readonly strategy?: string | null;
}

/** States and who goes where, laid out by itself; the same as a list for those who cannot see it. */
export function Diagram({ strategy: given }: DiagramProps) {
  const { t } = useTranslation();
  const { document } = useEditing();
  const [chosen, setChosen] = useState('');
  const [box, width] = useWidth<HTMLDivElement>(380);
  const nameOf = useStateName();
  const head = useId();
  const known = document.strategies.some(({ id }) => id === chosen) ? chosen : null;
  const strategy = given === undefined ? known : given;
  const moves = useMemo(() => movesOf(document, strategy), [document, strategy]);
  const layout = useMemo(() => {
    const first = [document.start.remainder];
    return diagramLayout(document.states, moves, first, Math.max(width, 240));
  }, [document, moves, width]);
  return (
    <figure className="min-w-0" aria-labelledby={`${head}-title`}>
      <figcaption id={`${head}-title`} className="font-bold">
        {t('model.diagram.title')}
      </figcaption>
      {given === undefined && document.strategies.length > 1 && (
        <SelectField
          label={t('model.movements.show')}
          className="mt-2 max-w-72"
          value={strategy ?? ''}
          options={[
            { value: '', name: t('model.movements.everyStrategy') },
            ...document.strategies.map(({ id, label }) => ({ value: id, name: label })),
          ]}
          onValue={setChosen}
        />
      )}
      <div ref={box} className="mt-3">
        <svg width={Math.max(width, 240)} height={layout.height} aria-hidden="true">
          <defs>
            <marker
              id={`${head}-tip`}
              viewBox="0 0 8 8"
              refX="6"
              refY="4"
              markerWidth="7"
              markerHeight="7"
              orient="auto-start-reverse"
            >
              <path d="M0 0 L8 4 L0 8 Z" fill="var(--ink)" />
            </marker>
          </defs>
          {layout.arrows.map(({ from, to, path }) => (
            <path
              key={`${from} ${to}`}
              d={path}
              fill="none"
              stroke="var(--ink)"
              strokeWidth="1.5"
              markerEnd={`url(#${head}-tip)`}
            />
          ))}
          {layout.boxes.map(({ id, x, y }) => (
            <StateBox key={id} id={id} x={x} y={y} width={layout.boxWidth} />
          ))}
        </svg>
      </div>
      <details className="mt-1">
        <summary className="flex min-h-10 items-center text-sm text-mute underline">
          {t('model.diagram.list', { count: moves.length })}
        </summary>
        <ul className="grid gap-1 text-sm">
          {moves.map(({ from, to, formulas }) => (
            <li key={`${from} ${to}`} className="break-words">
              {t('model.movements.move', { from: nameOf(from), to: nameOf(to) })}
              {formulas.length > 0 && <span className="text-mute"> ({formulas.join('; ')})</span>}
            </li>
          ))}
        </ul>
      </details>
    </figure>
  );
}

interface StateBoxProps {
  readonly id: string;
  readonly x: number;
  readonly y: number;
  readonly width: number;
}

/** Those who live in a plain box, the dead in a dark one, timed states with a double line. */
function StateBox({ id, x, y, width }: StateBoxProps) {
  const { document } = useEditing();
  const state = document.states.find((each) => each.id === id);
  if (!state) return null;
  const lines = wrapped(state.label || id, width - 12);
  const [left, top] = [x - width / 2, y - BOX_HEIGHT / 2];
  const ink = state.dead ? 'var(--paper)' : 'var(--ink)';
  return (
    <g>
      <rect
        x={left}
        y={top}
        width={width}
        height={BOX_HEIGHT}
        rx="6"
        fill={state.dead ? 'var(--ink)' : 'var(--raised)'}
        stroke="var(--ink)"
        strokeWidth={state.type === 'absorbing' ? 2.5 : 1.5}
      />
      {state.type === 'timed' && (
        <rect
          x={left + 3}
          y={top + 3}
          width={width - 6}
          height={BOX_HEIGHT - 6}
          rx="4"
          fill="none"
          stroke="var(--ink)"
        />
      )}
      {lines.map((line, index) => (
        <text
          key={line}
          x={x}
          y={y + 5 + (index - (lines.length - 1) / 2) * 17}
          fontSize="14"
          textAnchor="middle"
          style={{ fill: ink }}
        >
          {line}
        </text>
      ))}
    </g>
  );
}

/** At most two lines, the second cut where it is too long. */
function wrapped(label: string, room: number): string[] {
  const lines: string[] = [''];
  for (const word of label.split(/\s+/)) {
    const last = lines.at(-1) ?? '';
    const longer = last === '' ? word : `${last} ${word}`;
    if (last === '' || textWidth(longer) <= room) lines[lines.length - 1] = longer;
    else lines.push(word);
  }
  const kept = lines.slice(0, 2).map((line) => cut(line, room));
  if (lines.length > 2) kept[1] = cut(`${kept[1]}…`, room);
  return kept;
}

function cut(line: string, room: number): string {
  let short = line;
  while (short.length > 1 && textWidth(short) > room)
    short = `${short.replace(/…$/, '').slice(0, -1)}…`;
  return short;
}
