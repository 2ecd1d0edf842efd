/**
 * What the functions of a formula become in the graph. A function that is not named
 * here is applied element by element with its plain meaning
 * (shared/formula/meaning.ts), so a new function works at once and can be made
 * faster later.
 */
import type { Graph, NodeId } from './graph.ts';
import { type BinaryOp, binaryMeaning, type UnaryOp, unaryMeaning } from './operations.ts';

export type Lower = (graph: Graph, args: readonly NodeId[]) => NodeId;

const unary =
  (name: UnaryOp): Lower =>
  (graph, [a]) =>
    graph.unary(name, a!);

const binary =
  (name: BinaryOp): Lower =>
  (graph, [a, b]) =>
    graph.binary(name, a!, b!);

const chained =
  (name: BinaryOp): Lower =>
  (graph, args) =>
    args.reduce((left, right) => graph.binary(name, left, right));

/** 1 - exp(x), exact for small x. */
const oneMinusExp = (graph: Graph, x: NodeId) => graph.unary('negate', graph.unary('expm1', x));

/** ln(1 - p), exact for small p. */
const lnOneMinus = (graph: Graph, p: NodeId) => graph.unary('log1p', graph.unary('negate', p));

const oneMinus = (graph: Graph, p: NodeId) => graph.binary('subtract', graph.constant(1), p);

/** Nothing has happened before the clock starts. */
const since = (graph: Graph, time: NodeId) => graph.binary('max', graph.constant(0), time);

const own: Record<string, Lower> = {
  if: (graph, [c, a, b]) => graph.select(c!, a!, b!),
  min: chained('min'),
  max: chained('max'),
  sum: chained('add'),
  product: chained('multiply'),
  clamp: (graph, [x, low, high]) => graph.binary('min', graph.binary('max', x!, low!), high!),
  chance: (graph, [rate, years]) =>
    oneMinusExp(graph, graph.unary('negate', graph.binary('multiply', rate!, years!))),
  hazard: (graph, [p, years]) =>
    graph.binary('divide', graph.unary('negate', lnOneMinus(graph, p!)), years!),
  rescale: (graph, [p, from, to]) =>
    oneMinusExp(
      graph,
      graph.binary('multiply', lnOneMinus(graph, p!), graph.binary('divide', to!, from!)),
    ),
  odds: (graph, [p]) => graph.binary('divide', p!, oneMinus(graph, p!)),
  log_odds: (graph, [p]) => graph.binary('subtract', graph.unary('ln', p!), lnOneMinus(graph, p!)),
  chance_of_log_odds: (graph, [x]) => {
    const odds = graph.unary('exp', graph.unary('negate', x!));
    return graph.binary('divide', graph.constant(1), graph.binary('add', graph.constant(1), odds));
  },
  times_risk: binary('multiply'),
  times_odds: (graph, [p, ratio]) => {
    const raised = graph.binary('multiply', p!, ratio!);
    return graph.binary('divide', raised, graph.binary('add', oneMinus(graph, p!), raised));
  },
  times_hazard: (graph, [p, ratio]) =>
    oneMinusExp(graph, graph.binary('multiply', ratio!, lnOneMinus(graph, p!))),
  competing: (graph, [rate, total, years]) =>
    graph.binary('multiply', rate!, graph.binary('exposure', total!, years!)),
  alive_exponential: (graph, [time, rate]) =>
    graph.unary('exp', graph.unary('negate', graph.binary('multiply', rate!, since(graph, time!)))),
  alive_weibull: (graph, [time, shape, scale]) => {
    const scaled = graph.binary(
      'power',
      graph.binary('divide', since(graph, time!), scale!),
      shape!,
    );
    return graph.unary('exp', graph.unary('negate', scaled));
  },
};

const everyUnary = Object.keys(unaryMeaning).map((name) => [name, unary(name as UnaryOp)] as const);
const everyBinary = Object.keys(binaryMeaning).map(
  (name) => [name, binary(name as BinaryOp)] as const,
);

/** By the function's or operator's word. */
export const LOWER: ReadonlyMap<string, Lower> = new Map([
  ...everyUnary,
  ...everyBinary,
  ...Object.entries(own),
]);
