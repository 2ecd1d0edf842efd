/**
 * `npm run dev`: the hub and Vite's development server as one process on one port;
 * the app reloads as it changes, the hub starts anew.
 */
import { install } from './lib/install.mjs';
import { runPackage } from './lib/run.mjs';

install();
const watched = ['watch', '--include', 'shared/db/**', 'server/dev.ts'];
process.exitCode = runPackage('tsx/dist/cli.mjs', watched) ? 0 : 1;
