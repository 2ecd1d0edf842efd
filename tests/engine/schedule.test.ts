import { describe, expect, it } from 'vitest';
import { openAccounts } from '../../shared/engine/accounts.ts';
import { compile } from '../../shared/engine/compile.ts';
import { schedule } from '../../shared/engine/schedule.ts';
import type { ModelDocument } from '../../shared/model/document.ts';
import { tinyDocument } from '../fixtures/tiny-document.ts';

function programOf(dieFormula: string, profiles = 1, overrides: Partial<ModelDocument> = {}) {
  const tiny = tinyDocument();
  const document = {
    ...tiny,
    profiles: Array.from({ length: profiles }, (_, k) => ({
      id: `p${k}`,
      label: `Profile ${k}`,
      share: 1 / profiles,
      covariates: { start_age: 40 + k },
    })),
    variables: [{ ...tiny.variables[0]!, formula: dieFormula }],
    ...overrides,
  };
  const model = compile(document);
  const accounts = openAccounts(model, {
    tallies: 2,
    tallyOf: ({ measure }) => (measure === 'cost' ? 0 : 1),
    lifeYears: null,
  });
  return schedule(model, accounts, { width: 4, trace: false });
}

function places(formula: string, profiles = 1) {
  const program = programOf(formula, profiles);
  const count = (stage: { instructions: readonly unknown[] }) => stage.instructions.length > 0;
  return {
    tape: count(program.tape),
    profile: count(program.profile),
    profileTape: count(program.profileTape),
    cycle: program.strategies.some((strategy) => count(strategy.cycle)),
  };
}

describe('schedule', () => {
  it('computes what varies with nothing once a block', () => {
    const none = { tape: false, profile: false, profileTape: false, cycle: false };
    expect(places('p_die / 2')).toEqual(none);
  });

  it('computes what varies with the profile once a profile', () => {
    const want = { tape: false, profile: true, profileTape: false, cycle: false };
    expect(places('p_die * start_age / 100', 3)).toEqual(want);
  });

  it('keeps for all cycles what several cohorts need', () => {
    expect(places('p_die / (1 + time)', 1)).toMatchObject({ tape: true, cycle: false });
    expect(places('p_die * age / 100', 3)).toMatchObject({ profileTape: true, cycle: false });
  });

  it('computes cycle by cycle what serves one cohort', () => {
    const alone = programOf('p_die / (1 + time)', 1, {
      strategies: [{ id: 'usual', label: 'Usual care' }],
      payoffs: [tinyDocument().payoffs[1]!],
    });
    expect(alone.tape.instructions).toEqual([]);
    expect(alone.strategies[0]!.cycle.instructions.length).toBeGreaterThan(0);
  });

  it('does not follow the dead, who earn nothing', () => {
    for (const { followed } of programOf('p_die').strategies) expect([...followed]).toEqual([0]);
  });

  it('makes a column of what varies with the draw alone', () => {
    const { once } = programOf('p_die / 2');
    for (const { operation, wide } of once.instructions) {
      if (operation.op === 'binary') expect(wide).toBe(true);
    }
  });

  it('looks at each quantity once, though strategies share it', () => {
    const { once } = programOf('p_die / 2');
    const paths = once.checks.map(({ check }) => `${check.code} ${check.path.join('.')}`);
    expect(new Set(paths).size).toBe(paths.length);
  });

  it('gives no place twice while it is in use', () => {
    const program = programOf('p_die * age / 100', 3);
    for (const { operation, out, args } of [
      ...program.once.instructions,
      ...program.profileTape.instructions,
    ]) {
      if (operation.op === 'spread') expect(args[0]!.base).not.toBe(out.base);
      expect(out.base).toBeLessThan(program.size);
    }
  });
});
