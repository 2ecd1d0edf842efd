/** The command as people run it, in a process of its own. */
import { spawnSync } from 'node:child_process';
import { mkdtempSync, readFileSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { tinyDocument } from '../fixtures/tiny-document.ts';
import golden from '../golden/cohort.json' with { type: 'json' };

let folder: string;
beforeAll(() => {
  folder = mkdtempSync(join(tmpdir(), 'steelyard-'));
});
afterAll(() => rmSync(folder, { recursive: true }));

function command(...args: string[]) {
  const { status, stdout, stderr } = spawnSync(
    process.execPath,
    ['--import', 'tsx', 'shared/cli/appraise.ts', ...args],
    { encoding: 'utf8' },
  );
  return { status, stderr, json: stdout.startsWith('{') ? JSON.parse(stdout) : null, stdout };
}

function fileOf(text: string): string {
  const path = join(folder, 'model.json');
  writeFileSync(path, text);
  return path;
}

describe('appraise', () => {
  it('reproduces the published HIV model', { timeout: 60_000 }, () => {
    // Chancellor et al. 1997, as worked in Briggs, Claxton and Sculpher 2006: 44,663 and 7.99,
    // 50,602 and 8.94, 6,276 (from memory); full figures by R, tests/golden/cohort.json.
    const { json, stderr } = command('--example', 'hiv-combination-therapy', '--samples', '0');
    expect(stderr).toBe('');
    const [mono, combination] = json.strategies;
    const want = golden.published_example.results.find(({ convention }) => convention === 'end')!;
    expect(mono.cost).toBeCloseTo(want.mono.cost, 6);
    expect(mono.outcome).toBeCloseTo(want.mono.ly, 10);
    expect(combination.cost).toBeCloseTo(want.combination.cost, 6);
    expect(combination.outcome).toBeCloseTo(want.combination.ly, 10);
    expect(combination.icer).toBeCloseTo(want.icer, 6);
    expect(Math.round(combination.icer)).toBe(6276);
    expect(json.psa).toBeUndefined();
  });

  it("runs a model file of one's own, with trace and draws", { timeout: 60_000 }, () => {
    const path = fileOf(JSON.stringify(tinyDocument()));
    const csv = join(folder, 'draws.csv');
    const { json, stderr } = command(
      path,
      '--samples',
      '20',
      '--seed',
      '2',
      '--trace',
      '--draws',
      csv,
    );
    expect(stderr).toBe('');
    expect(json.settings).toMatchObject({ samples: 20, seed: 2, plan: 'plain', threshold: 1500 });
    expect(json.settings.states).toEqual(['alive', 'dead']);
    expect(json.strategies[0].trace).toHaveLength(11);
    expect(json.psa.samples).toBe(20);
    expect(json.digest).toMatch(/^[0-9a-f]{64}$/);
    const lines = readFileSync(csv, 'utf8').trimEnd().split('\n');
    expect(lines).toHaveLength(21);
    const costs = lines.slice(1).map((line) => Number(line.split(',')[5]));
    const mean = costs.reduce((sum, cost) => sum + cost, 0) / 20;
    expect(mean).toBeCloseTo(json.psa.strategies[1].cost, 8);
  });

  it('answers a broken document with coded messages and exit code 2', { timeout: 120_000 }, () => {
    const tiny = tinyDocument();
    const remainder = {
      ...tiny,
      variables: [{ ...tiny.variables[0], formula: 'times_risk(p_die, 20)' }],
    };
    const cyclic = { ...tiny, variables: [{ ...tiny.variables[0], formula: 'die_now + 1' }] };
    const cases: [string, RegExp][] = [
      [JSON.stringify(tiny).slice(0, 400), /document\.notJson/],
      [JSON.stringify({ ...tiny, strategies: 'none' }), /document\./],
      [JSON.stringify(remainder), /run\.(probability|remainder)Outside/],
      [JSON.stringify(cyclic), /formula\.\w*[cC]ycl/],
    ];
    for (const [text, message] of cases) {
      const { status, stderr, stdout } = command(fileOf(text));
      expect(status).toBe(2);
      expect(stderr).toMatch(message);
      expect(stdout).toBe('');
      expect(stderr).not.toMatch(/\bat .*\.ts:\d+/);
    }
  });

  it('says what is wrong with the command itself', { timeout: 60_000 }, () => {
    expect(command('nowhere.json')).toMatchObject({
      status: 2,
      stderr: expect.stringMatching(/command\.noSuchFile/),
    });
    expect(command('--samples')).toMatchObject({
      status: 2,
      stderr: expect.stringMatching(/Usage/),
    });
    expect(command('--help')).toMatchObject({ status: 0 });
  });
});
