/**
 * `npm start`, on a fresh clone too: installs, builds, migrates and serves. What is
 * already done is not done again. Plain Node: nothing is installed when it begins.
 */
import { build } from './lib/build.mjs';
import { followNpm } from './lib/follow-npm.mjs';
import { install } from './lib/install.mjs';

try {
  install();
  build();
} catch (error) {
  console.error(error.message);
  process.exit(1);
}
followNpm();
const { register } = await import('tsx/esm/api');
register();
await import('../server/main.ts');
