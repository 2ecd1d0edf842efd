import { resolve } from 'node:path';
import { z } from 'zod';
import { Fault } from './fault.ts';

const environment = z.object({
  /** 0 lets the system choose a free port. */
  PORT: z.coerce.number().int().min(0).max(65_535).default(4173),
  /** The loopback address by default: opening the hub to a network is a choice. */
  HOST: z.string().min(1).default('127.0.0.1'),
  /** Folder of the database and its backups. */
  STEELYARD_DATA: z.string().min(1).default('data'),
  /**
   * The address that people use when the hub stands behind a proxy. With https the
   * hub also asks browsers to use nothing else (HSTS).
   */
  STEELYARD_ORIGIN: z.url({ protocol: /^https?$/ }).optional(),
});

export interface Config {
  readonly port: number;
  readonly host: string;
  /** Absolute. */
  readonly dataFolder: string;
  readonly origin: string | undefined;
  /** People reach the hub by https. */
  readonly secure: boolean;
}

/**
 * Reads the environment once. An empty variable counts as not set.
 * @throws Fault `config.invalid` whose path is the variable's name.
 */
export function readConfig(env: Readonly<Record<string, string | undefined>>): Config {
  const set = Object.fromEntries(Object.entries(env).filter(([, value]) => value !== ''));
  const parsed = environment.safeParse(set);
  if (!parsed.success) throw invalid(parsed.error, env);
  const { PORT, HOST, STEELYARD_DATA, STEELYARD_ORIGIN } = parsed.data;
  return {
    port: PORT,
    host: HOST,
    dataFolder: resolve(STEELYARD_DATA),
    origin: STEELYARD_ORIGIN,
    secure: STEELYARD_ORIGIN?.startsWith('https:') ?? false,
  };
}

function invalid(error: z.ZodError, env: Readonly<Record<string, string | undefined>>): Fault {
  const path = error.issues[0]?.path.map(String) ?? [];
  const value = env[path[0] ?? ''] ?? '';
  return new Fault('config.invalid', 500, { value }, path);
}
