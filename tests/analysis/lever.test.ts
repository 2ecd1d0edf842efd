import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { frontierRows, incremental } from '../../shared/analysis/incremental.ts';
import { defaultPair, lever } from '../../shared/analysis/lever.ts';
import { netMonetaryBenefit } from '../../shared/analysis/net-benefit.ts';
import { options, RUNS } from './arbitrary.ts';

const at = (incrementalCost: number, incrementalHealth: number, threshold: number) =>
  lever({ incrementalCost, incrementalHealth }, threshold);

describe('lever', () => {
  it('lies level at the ICER and tips to the poise above it', () => {
    expect(at(300, 2, 150)).toEqual({
      levelAt: 150,
      hook: 'load',
      poise: 'gain',
      word: 'level',
      tilt: 0,
    });
    expect(at(300, 2, 151).word).toBe('tipsToPoise');
    expect(at(300, 2, 149).word).toBe('tipsToHook');
    expect(at(300, 2, 0).tilt).toBe(-0.5);
    expect(at(300, 2, 300).tilt).toBe(0.5);
  });

  it('is lifted by savings: level where they pay for the health lost', () => {
    expect(at(-300, -2, 150)).toMatchObject({ levelAt: 150, hook: 'lift', word: 'level' });
    expect(at(-300, -2, 100)).toMatchObject({ poise: 'loss', word: 'tipsToPoise' });
    expect(at(-300, -2, 200).word).toBe('tipsToHook');
  });

  it.each([
    [300, -2, 'cannotLevel', null],
    [300, 0, 'cannotLevel', null],
    [-300, 2, 'alwaysTipsToPoise', null],
    [-300, 0, 'alwaysTipsToPoise', null],
    [0, 0, 'noDifference', null],
    [0, 2, 'tipsToPoise', 0],
    [0, -2, 'tipsToHook', 0],
  ])('cost %d and health %d: %s', (cost, health, word, levelAt) => {
    expect(at(cost, health, 100)).toMatchObject({ word, levelAt });
  });

  it('has the sign of net benefit, rises with it and stays within -1 and 1', () => {
    const amount = fc.integer({ min: -1000, max: 1000 });
    const threshold = fc.integer({ min: 0, max: 1000 });
    fc.assert(
      fc.property(amount, amount, threshold, threshold, (cost, health, one, other) => {
        const tilts = [one, other].map((poise) => at(cost, health, poise).tilt);
        const nmbs = [one, other].map((poise) => netMonetaryBenefit({ cost, health }, poise));
        tilts.forEach((tilt, i) => {
          expect(Math.sign(tilt)).toBe(Math.sign(nmbs[i] as number) + 0);
          expect(Math.abs(tilt)).toBeLessThan(1);
        });
        const order = (pair: number[]) => Math.sign((pair[1] as number) - (pair[0] as number));
        expect(order(tilts)).toBe(order(nmbs));
      }),
      RUNS,
    );
  });
});

describe('defaultPair', () => {
  const rows = incremental([
    { id: 'a', cost: 0, health: 0 },
    { id: 'b', cost: 100, health: 1 },
    { id: 'twin', cost: 100, health: 1 },
    { id: 'c', cost: 400, health: 2 },
  ]);

  it('weighs against the next cheaper on the frontier, the cheapest against the next', () => {
    expect(defaultPair(rows, 'c')).toEqual({
      strategy: 'c',
      against: 'b',
      incrementalCost: 300,
      incrementalHealth: 1,
    });
    expect(defaultPair(rows, 'twin')).toMatchObject({ strategy: 'twin', against: 'a' });
    expect(defaultPair(rows, 'a')).toMatchObject({ against: 'b', incrementalCost: -100 });
  });

  it('weighs one that is alone on the frontier against the first of the others', () => {
    const alone = incremental([
      { id: 'a', cost: 0, health: 2 },
      { id: 'b', cost: 5, health: 1 },
    ]);
    expect(defaultPair(alone, 'a')).toMatchObject({ against: 'b' });
    expect(defaultPair(incremental([{ id: 'a', cost: 0, health: 2 }]), 'a')).toBeNull();
    expect(defaultPair(alone, 'missing')).toBeNull();
  });

  it('lies level where the colour of the edge changes', () => {
    fc.assert(
      fc.property(options, (list) => {
        const found = incremental(list);
        for (const row of frontierRows(found).slice(1)) {
          const pair = defaultPair(found, row.id) as NonNullable<ReturnType<typeof defaultPair>>;
          const threshold = row.icer as number;
          expect(lever(pair, threshold)).toMatchObject({ levelAt: threshold, tilt: 0 });
        }
      }),
      RUNS,
    );
  });
});
