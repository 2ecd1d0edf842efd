import type { Fault } from './fault.ts';

/** Why the hub could not start, and what to do about it, for whoever starts it. */
const WORDS: Readonly<Record<string, (fault: Fault) => string>> = {
  'config.invalid': ({ path, params }) =>
    `The environment variable ${path[0]} cannot be "${params.value}". Change it or leave it unset.`,
  'database.newer': () =>
    'The data folder was written by a newer version of Steelyard. Start that version, or choose another folder with STEELYARD_DATA.',
  'database.orphans': ({ params }) =>
    `Bringing the database up to date would leave ${params.rows} rows of ${params.table} without their parents. Nothing was changed.`,
  EADDRINUSE: () => 'The port is in use. Choose another one with PORT.',
  EACCES: () =>
    'The port or the data folder may not be used. Choose others with PORT and STEELYARD_DATA.',
};

/** Words for an error at the start; undefined when it is none that is known. */
export function startupWords(error: unknown): string | undefined {
  const code = (error as { code?: unknown } | null)?.code;
  return WORDS[String(code)]?.(error as Fault);
}
