import { existsSync, mkdtempSync, rmSync } from 'node:fs';
import { createServer } from 'node:http';
import type { AddressInfo } from 'node:net';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { fileURLToPath } from 'node:url';
import { createApp } from '../../../server/app.ts';
import { openDatabase } from '../../../server/db.ts';

export const DIST = fileURLToPath(new URL('../../../dist', import.meta.url));

export interface Site {
  readonly origin: string;
  /** Serves another build from now on. */
  deploy(dist: string): void;
  /** Ends it at once, with all that is connected: the network is gone. */
  close(): Promise<void>;
}

/** The real hub with a data folder of its own, serving the built app on a free port. */
export async function startSite(dist = DIST): Promise<Site> {
  if (!existsSync(join(dist, 'index.html'))) {
    throw new Error('The app is not built: run "npm run build" first ("npm test" does so itself).');
  }
  const folder = mkdtempSync(join(tmpdir(), 'steelyard-e2e-'));
  const database = openDatabase(folder);
  let app = createApp({ database, dist });
  const server = createServer((request, response) => app(request, response));
  await new Promise<void>((resolve) => server.listen(0, '127.0.0.1', resolve));
  let open = true;
  return {
    origin: `http://localhost:${(server.address() as AddressInfo).port}`,
    deploy(next) {
      app = createApp({ database, dist: next });
    },
    async close() {
      if (!open) return;
      open = false;
      server.closeAllConnections();
      await new Promise((resolve) => server.close(resolve));
      database.close();
      rmSync(folder, { recursive: true, force: true });
    },
  };
}
