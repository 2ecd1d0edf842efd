import { spawnSync } from 'node:child_process';
import { inRepository, ROOT } from './paths.mjs';

/** Runs a program with our own input and output; true when it ended well. */
export function run(program, args, env = {}) {
  const { status, error } = spawnSync(program, args, {
    cwd: ROOT,
    stdio: 'inherit',
    env: { ...process.env, ...env },
  });
  if (error) console.error(error.message);
  return status === 0;
}

/** Runs a script of an installed package with this Node. */
export function runPackage(script, args, env) {
  return run(process.execPath, [inRepository('node_modules', script), ...args], env);
}

/** Runs npm: the one that started us where there is one. */
export function runNpm(args) {
  const npm = process.env.npm_execpath;
  if (npm?.endsWith('.js')) return run(process.execPath, [npm, ...args]);
  return run(process.platform === 'win32' ? 'npm.cmd' : 'npm', args);
}
