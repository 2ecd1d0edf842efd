import { execFile } from 'node:child_process';
import { promisify } from 'node:util';

export interface CommandLineAnswer {
  strategies: { id: string; name: string; cost: number; outcome: number; nmb: number }[];
  psa: {
    strategies: { id: string; probabilityBest: number }[];
    evpi: { perPerson: number; standardError: number };
  };
}

/** What the command line says of an example at a threshold. */
export async function appraise(example: string, threshold: number): Promise<CommandLineAnswer> {
  const args = ['run', '--silent', 'appraise', '--'];
  const { stdout } = await promisify(execFile)(
    'npm',
    [...args, '--example', example, '--threshold', String(threshold)],
    { maxBuffer: 64 * 1024 * 1024 },
  );
  return JSON.parse(stdout);
}
