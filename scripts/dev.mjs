/**
 * `npm run dev`: the hub and Vite's development server as one process on one port;
 * the app reloads as it changes, the hub starts anew.
 */
import { followNpm } from './lib/follow-npm.mjs';
import { install } from './lib/install.mjs';

install();
followNpm();
// tsx reads its own command line; in this process it gets our signals.
process.argv.splice(2, Number.POSITIVE_INFINITY, 'watch', 'server/dev.ts');
await import('tsx/cli');
