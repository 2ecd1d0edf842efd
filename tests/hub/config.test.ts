import { isAbsolute } from 'node:path';
import { expect, it } from 'vitest';
import { readConfig } from '../../server/config.ts';
import type { Fault } from '../../server/fault.ts';
import { startupWords } from '../../server/startup-words.ts';

function faultOf(env: Record<string, string>): Fault {
  try {
    readConfig(env);
  } catch (error) {
    return error as Fault;
  }
  throw new Error('expected a fault');
}

it('has defaults that need no setting: this device only, port 4173, folder data', () => {
  const config = readConfig({});
  expect(config).toMatchObject({ port: 4173, host: '127.0.0.1', secure: false });
  expect(isAbsolute(config.dataFolder)).toBe(true);
  expect(config.dataFolder).toMatch(/data$/);
});

it('takes an empty variable as one that is not set', () => {
  expect(readConfig({ PORT: '', HOST: '' })).toMatchObject({ port: 4173, host: '127.0.0.1' });
});

it('is secure when people reach it by https', () => {
  expect(readConfig({ STEELYARD_ORIGIN: 'https://hub.example' }).secure).toBe(true);
  expect(readConfig({ STEELYARD_ORIGIN: 'http://hub.example' }).secure).toBe(false);
});

it.each([
  ['PORT', 'abc'],
  ['PORT', '70000'],
  ['PORT', '80.5'],
  ['PORT', '-1'],
  ['STEELYARD_ORIGIN', 'not an address'],
  ['STEELYARD_ORIGIN', 'ftp://hub.example'],
])('names the variable %s when it cannot be %s', (name, value) => {
  const fault = faultOf({ [name]: value });
  expect(fault).toMatchObject({ code: 'config.invalid', path: [name], params: { value } });
  expect(startupWords(fault)).toContain(name);
});
