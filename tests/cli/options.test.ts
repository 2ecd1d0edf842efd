import { describe, expect, it } from 'vitest';
import { parseOptions } from '../../shared/cli/options.ts';

const codes = (...args: string[]) => parseOptions(args).issues.map(({ code }) => code);

describe('parseOptions', () => {
  it('reads a file and every option', () => {
    const { options } = parseOptions(
      'm.json --samples 50 --seed 7 --plan lhs --threshold 12.5 --scenario s --trace --draws d.csv'.split(
        ' ',
      ),
    );
    expect(options).toEqual({
      file: 'm.json',
      example: null,
      scenario: 's',
      samples: 50,
      seed: 7,
      plan: 'lhs',
      threshold: 12.5,
      trace: true,
      draws: 'd.csv',
      help: false,
    });
  });

  it('takes exactly one document', () => {
    expect(codes()).toEqual(['command.oneDocument']);
    expect(codes('a.json', 'b.json')).toEqual(['command.oneDocument']);
    expect(codes('a.json', '--example', 'x')).toEqual(['command.oneDocument']);
    expect(codes('--example', 'x')).toEqual([]);
    expect(codes('--help')).toEqual([]);
  });

  it('refuses what is no sensible number', () => {
    for (const bad of ['-1', '1.5', 'many', '', '1e9']) {
      expect(codes('a.json', `--samples=${bad}`)).toEqual(['command.badNumber']);
    }
    expect(codes('a.json', '--seed=4294967296')).toEqual(['command.badNumber']);
    expect(codes('a.json', '--threshold=-5')).toEqual(['command.badNumber']);
    expect(codes('a.json', '--threshold=NaN')).toEqual(['command.badNumber']);
  });

  it('refuses unknown plans and options', () => {
    expect(codes('a.json', '--plan', 'halton')).toEqual(['command.badPlan']);
    expect(codes('a.json', '--colour')).toEqual(['command.unknownOption']);
  });
});
