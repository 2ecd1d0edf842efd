import { existsSync, readFileSync } from 'node:fs';
import { inRepository } from './paths.mjs';
import { runNpm } from './run.mjs';

/**
 * True when what npm last installed is what package-lock.json asks for. npm writes
 * its own lock file into node_modules at the end of each installation; packages for
 * other systems are optional and may be missing.
 */
export function isInstalled(wanted, installed) {
  return Object.entries(wanted.packages ?? {}).every(([path, asked]) => {
    if (path === '') return true;
    const found = installed?.packages?.[path];
    if (!found) return asked.optional === true || asked.devOptional === true;
    return found.version === asked.version && found.integrity === asked.integrity;
  });
}

/** Installs what package-lock.json asks for, unless it is there; throws when npm fails. */
export function install() {
  const lock = readJson(inRepository('package-lock.json'));
  const installed = readJson(inRepository('node_modules', '.package-lock.json'));
  if (lock && installed && isInstalled(lock, installed)) return;
  console.log('Installing packages (once; this takes a minute or two) …');
  const done = runNpm(['ci', '--include=dev', '--no-audit', '--no-fund']);
  if (!done) throw new Error('npm ci failed: see its messages above.');
}

function readJson(path) {
  return existsSync(path) ? JSON.parse(readFileSync(path, 'utf8')) : undefined;
}
