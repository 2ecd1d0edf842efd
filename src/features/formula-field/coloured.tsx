import type { Span } from '../../../shared/model/issue.ts';
import type { ColouredToken, TokenKind } from './tokens.ts';

export interface MarkedSpan extends Span {
  readonly severity: 'error' | 'warning';
}

/** Kinds are told apart by weight, slope and line as well as by colour. */
const STYLES: Readonly<Record<TokenKind, string>> = {
  parameter: 'text-gain',
  variable: 'text-brass',
  table: 'text-gain italic',
  covariate: 'text-brass italic',
  clock: 'italic',
  function: 'font-bold',
  word: 'font-bold',
  number: '',
  operator: 'text-mute',
  plain: '',
  unknown: '',
};

const UNDERLINES = {
  error: 'underline decoration-clay decoration-wavy decoration-2 underline-offset-4',
  warning: 'underline decoration-brass decoration-dotted decoration-2 underline-offset-4',
};

/** A formula's text, coloured by kinds, with lines under what is wrong. */
export function Coloured(props: {
  readonly tokens: readonly ColouredToken[];
  readonly marks: readonly MarkedSpan[];
}) {
  const { tokens, marks } = props;
  return tokens
    .flatMap((token) => cut(token, marks))
    .map(({ start, text, kind, mark }) => (
      <span
        key={start}
        data-kind={kind}
        data-mark={mark?.severity}
        className={`${STYLES[kind]} ${mark ? UNDERLINES[mark.severity] : ''}`}
      >
        {text}
      </span>
    ));
}

interface Piece extends ColouredToken {
  readonly mark: MarkedSpan | undefined;
}

/** The token in pieces that lie wholly inside or outside every mark. */
function cut({ text, kind, start }: ColouredToken, marks: readonly MarkedSpan[]): Piece[] {
  const end = start + text.length;
  const edges = marks.flatMap((mark) => [mark.start, mark.end]);
  const places = [...new Set([start, ...edges, end])].filter((at) => at >= start && at <= end);
  places.sort((a, b) => a - b);
  return places.slice(0, -1).map((from, index) => {
    const to = places[index + 1] ?? end;
    const mark = marks.find((one) => one.start <= from && one.end >= to);
    return { text: text.slice(from - start, to - start), kind, start: from, mark };
  });
}
