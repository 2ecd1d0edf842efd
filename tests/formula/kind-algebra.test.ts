import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import {
  addKinds,
  divideKinds,
  inferred,
  multiplyKinds,
  NUMBER,
  powerKind,
} from '../../shared/formula/kind-algebra.ts';
import { KINDS, type Kind } from '../../shared/model/kinds.ts';

// What combines to what is common practice in the field, no source.
const kindOf = (result: ReturnType<typeof addKinds>) =>
  result === 'clash' ? 'clash' : result.kind;

describe('adding', () => {
  it.each<[Kind, Kind, Kind | 'clash']>([
    ['probability', 'probability', 'probability'],
    ['probability', 'number', 'probability'],
    ['ratio', 'number', 'ratio'],
    ['count', 'ratio', 'number'],
    ['money', 'costPerYear', 'costPerYear'],
    ['costPerYear', 'costPerCycle', 'clash'],
    ['costOnce', 'costPerYear', 'clash'],
    ['probability', 'rate', 'clash'],
    ['probability', 'money', 'clash'],
    ['utility', 'costPerYear', 'clash'],
    ['utility', 'disabilityWeight', 'clash'],
    ['rate', 'time', 'clash'],
    ['logOdds', 'time', 'logOdds'],
    ['logOdds', 'money', 'clash'],
    ['utility', 'probability', 'number'],
  ])('%s + %s is %s', (a, b, want) => {
    expect(kindOf(addKinds(inferred(a), inferred(b)))).toBe(want);
    expect(kindOf(addKinds(inferred(b), inferred(a)))).toBe(want);
  });

  it('lets pass what a bare number has scaled', () => {
    expect(kindOf(addKinds(inferred('costPerYear', true), inferred('costPerCycle')))).toBe('money');
    expect(kindOf(addKinds(inferred('rate', true), inferred('probability')))).toBe('number');
  });
});

describe('multiplying', () => {
  it.each<[Kind, Kind, Kind]>([
    ['probability', 'costOnce', 'costOnce'],
    ['probability', 'probability', 'probability'],
    ['ratio', 'rate', 'rate'],
    ['ratio', 'probability', 'probability'],
    ['rate', 'time', 'number'],
    ['rate', 'money', 'costPerYear'],
    ['perCycle', 'money', 'costPerCycle'],
    ['costPerYear', 'time', 'money'],
    ['money', 'count', 'money'],
    ['utility', 'utility', 'utility'],
    ['utility', 'time', 'number'],
    ['logOdds', 'time', 'logOdds'],
    ['money', 'money', 'number'],
  ])('%s * %s is %s', (a, b, want) => {
    expect(multiplyKinds(inferred(a), inferred(b))).toEqual(inferred(want));
    expect(multiplyKinds(inferred(b), inferred(a))).toEqual(inferred(want));
  });

  it('marks what a bare number has scaled', () => {
    expect(multiplyKinds(NUMBER, inferred('costPerYear'))).toEqual(inferred('costPerYear', true));
    expect(multiplyKinds(NUMBER, NUMBER)).toEqual(NUMBER);
  });
});

it.each<[Kind, Kind, Kind]>([
  ['rate', 'rate', 'ratio'],
  ['costPerYear', 'money', 'ratio'],
  ['money', 'time', 'costPerYear'],
  ['count', 'time', 'rate'],
  ['money', 'probability', 'money'],
  ['costPerYear', 'rate', 'money'],
  ['utility', 'time', 'number'],
  ['number', 'rate', 'number'],
])('%s / %s is %s', (a, b, want) => {
  expect(divideKinds(inferred(a), inferred(b))).toEqual(inferred(want));
});

it('keeps a probability or ratio under a power', () => {
  expect(powerKind(inferred('probability'))).toEqual(inferred('probability'));
  expect(powerKind(inferred('ratio'))).toEqual(inferred('ratio'));
  expect(powerKind(inferred('rate'))).toEqual(NUMBER);
});

it('never minds a number, and takes either side first', () => {
  const kind = fc.constantFrom(...KINDS);
  fc.assert(
    fc.property(kind, kind, (a, b) => {
      expect(addKinds(inferred(a), NUMBER)).not.toBe('clash');
      expect(addKinds(inferred(a), inferred(b))).toEqual(addKinds(inferred(b), inferred(a)));
      expect(multiplyKinds(inferred(a), inferred(b))).toEqual(
        multiplyKinds(inferred(b), inferred(a)),
      );
    }),
  );
});
