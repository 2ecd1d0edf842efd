import { createServer, type Server } from 'node:http';
import type { AddressInfo } from 'node:net';
import { fileURLToPath } from 'node:url';
import { createApp } from './app.ts';
import { type Config, readConfig } from './config.ts';
import { type Database, openDatabase } from './db.ts';
import { startupWords } from './startup-words.ts';
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

function sayAndLeave(error: unknown): void {
  console.error(startupWords(error) ?? error);
  process.exit(1);
}
