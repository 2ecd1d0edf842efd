/**
 *   diagramLayout(states, moves, first, width): DiagramLayout
 *
 * States and movements laid out by themselves: the living in layers from top to bottom, by
 * how many moves they are from where most start; the dead in a column of their own on the right.
 * Pure geometry, in px.
 */
import type { State } from '../../../../shared/model/document.ts';
import type { Move } from './moves.ts';

export interface Box {
  readonly id: string;
  /** Of the middle. */
  readonly x: number;
  readonly y: number;
}

export interface DiagramLayout {
  readonly boxes: readonly Box[];
  readonly arrows: readonly { readonly from: string; readonly to: string; readonly path: string }[];
  readonly boxWidth: number;
  readonly height: number;
}

export const BOX_HEIGHT = 48;
const LAYER = 96;
const GAP = 32;
const EDGE = 6;

export function diagramLayout(
  states: readonly State[],
  moves: readonly Move[],
  first: readonly string[],
  width: number,
): DiagramLayout {
  const living = states.filter(({ dead }) => !dead);
  const dead = states.filter((state) => state.dead);
  const layers = layersOf(living, moves, first);
  const widest = Math.max(1, ...layers.map((layer) => layer.length));
  const columns = widest + (dead.length > 0 ? 1 : 0);
  const boxWidth = Math.min(160, Math.floor((width - 2 * EDGE - GAP * (columns - 1)) / columns));
  const across = dead.length > 0 ? width - boxWidth - GAP : width;
  const rows = Math.max(layers.length, dead.length, 1);
  const height = (rows - 1) * LAYER + BOX_HEIGHT + 2 * EDGE;
  const middle = (row: number) => EDGE + BOX_HEIGHT / 2 + row * LAYER;
  const boxes = [
    ...layers.flatMap((layer, row) =>
      layer.map((id, place): Box => {
        return { id, x: (across * (place + 0.5)) / layer.length, y: middle(row) };
      }),
    ),
    ...dead.map(({ id }, place): Box => {
      const row = ((place + 0.5) * rows) / dead.length - 0.5;
      return { id, x: width - EDGE - boxWidth / 2, y: middle(row) };
    }),
  ];
  return { boxes, boxWidth, height, arrows: arrowsOf(boxes, moves, boxWidth) };
}

/** Ids by their distance in moves from the start; who cannot be reached comes last, each by itself. */
function layersOf(
  living: readonly State[],
  moves: readonly Move[],
  first: readonly string[],
): string[][] {
  const left = new Set(living.map(({ id }) => id));
  const layers: string[][] = [];
  let layer = living.filter(({ id }) => first.includes(id)).map(({ id }) => id);
  while (layer.length > 0) {
    layers.push(layer);
    for (const id of layer) left.delete(id);
    const here = new Set(layer);
    const next = new Set(moves.filter(({ from }) => here.has(from)).map(({ to }) => to));
    layer = living.filter(({ id }) => left.has(id) && next.has(id)).map(({ id }) => id);
  }
  return [...layers, ...[...left].map((id) => [id])];
}

function arrowsOf(boxes: readonly Box[], moves: readonly Move[], boxWidth: number) {
  const byId = new Map(boxes.map((box) => [box.id, box]));
  return moves.flatMap(({ from, to }) => {
    const [a, b] = [byId.get(from), byId.get(to)];
    return a && b ? [{ from, to, path: arrow(a, b, boxWidth) }] : [];
  });
}

/** Bent to its right, so that there and back lie apart, and more the further it goes. */
function arrow(a: Box, b: Box, boxWidth: number): string {
  const [dx, dy] = [b.x - a.x, b.y - a.y];
  const length = Math.hypot(dx, dy) || 1;
  const passed = Math.max(0, Math.round(Math.abs(dy) / LAYER) - 1);
  const bend = 14 + passed * (boxWidth / 2 + 18) * (Math.abs(dx) < boxWidth / 2 ? 1 : 0.2);
  const control = {
    x: (a.x + b.x) / 2 - (dy / length) * bend,
    y: (a.y + b.y) / 2 + (dx / length) * bend,
  };
  const start = border(a, control, boxWidth, 0);
  const end = border(b, control, boxWidth, 4);
  return `M${start} Q${round(control.x)} ${round(control.y)} ${end}`;
}

/** Where the line from a box's middle to a point leaves the box, and a little further. */
function border(box: Box, to: { x: number; y: number }, boxWidth: number, gap: number): string {
  const [dx, dy] = [to.x - box.x, to.y - box.y];
  const scale = Math.min(
    dx === 0 ? Number.POSITIVE_INFINITY : boxWidth / 2 / Math.abs(dx),
    dy === 0 ? Number.POSITIVE_INFINITY : BOX_HEIGHT / 2 / Math.abs(dy),
  );
  const further = scale + gap / (Math.hypot(dx, dy) || 1);
  return `${round(box.x + dx * further)} ${round(box.y + dy * further)}`;
}

const round = (number: number) => Math.round(number * 10) / 10;
