import { readFileSync } from 'node:fs';

const file = new URL('../package.json', import.meta.url);

/** The application's version, from package.json. */
export const VERSION: string = JSON.parse(readFileSync(file, 'utf8')).version;
