import { createServer, type Server } from 'node:http';
import type { AddressInfo } from 'node:net';
import { fileURLToPath } from 'node:url';
import { createApp } from './app.ts';
import { type Config, readConfig } from './config.ts';
import { type Database, openDatabase } from './db.ts';
import type { Fault } from './fault.ts';
import { VERSION } from './version.ts';

const DIST = fileURLToPath(new URL('../dist', import.meta.url));
/** Milliseconds that open requests are given to end. */
const PATIENCE = 5_000;

try {
  run(readConfig(process.env));
} catch (error) {
  sayAndLeave(error);
}

function run(config: Config): void {
  const database = openDatabase(config.dataFolder);
  const server = createServer(createApp({ database, dist: DIST, secure: config.secure }));
  server.on('error', (error) => {
    database.close();
    sayAndLeave(error);
  });
  server.listen(config.port, config.host, () => announce(config, server, database));
  for (const signal of ['SIGTERM', 'SIGINT'] as const) {
    process.once(signal, () => stop(server, database));
  }
}

function announce(config: Config, server: Server, database: Database): void {
  const { port } = server.address() as AddressInfo;
  const loopback = ['127.0.0.1', '::1', 'localhost', '0.0.0.0', '::'].includes(config.host);
  const address = config.origin ?? `http://${loopback ? 'localhost' : config.host}:${port}`;
  console.log(`Steelyard ${VERSION} is ready on ${address}`);
  console.log(`Data: ${database.file}`);
  console.log('Stop with Ctrl+C.');
}

/** Takes no new requests, lets the open ones end, then closes the database. */
function stop(server: Server, database: Database): void {
  console.log('Stopping.');
  const force = setTimeout(() => server.closeAllConnections(), PATIENCE);
  server.close(() => {
    clearTimeout(force);
    database.close();
    process.exit(0);
  });
  server.closeIdleConnections();
}

const WORDS: Readonly<Record<string, (fault: Fault) => string>> = {
  'config.invalid': ({ path, params }) =>
    `The environment variable ${path[0]} cannot be "${params.value}". Change it or leave it unset.`,
  'database.newer': () =>
    'The data folder was written by a newer version of Steelyard. Start that version, or choose another folder with STEELYARD_DATA.',
  'database.orphans': ({ params }) =>
    `Bringing the database up to date would leave ${params.rows} rows of ${params.table} without their parents. Nothing was changed.`,
  EADDRINUSE: () => 'The port is in use. Choose another one with PORT.',
  EACCES: () =>
    'The port or the data folder may not be used. Choose others with PORT, STEELYARD_DATA.',
};

function sayAndLeave(error: unknown): void {
  const code = (error as { code?: unknown } | null)?.code;
  const words = WORDS[String(code)];
  console.error(words ? words(error as Fault) : error);
  process.exit(1);
}
