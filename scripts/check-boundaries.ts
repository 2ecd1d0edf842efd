/**
 * Checks what the linter cannot: which folder may import which, no barrels, no chance
 * or clock in shared/, no text run as code. Prints one line a finding.
 */
import { fileURLToPath } from 'node:url';
import { barrelFindings } from './checks/barrels.ts';
import { boundaryFindings } from './checks/boundaries.ts';
import { purityFindings } from './checks/purity.ts';
import { readSources } from './checks/source-files.ts';

const root = fileURLToPath(new URL('..', import.meta.url));
const files = readSources(root, ['src', 'server', 'shared']);
const findings = files.flatMap((file) => [
  ...boundaryFindings(file),
  ...barrelFindings(file),
  ...purityFindings(file),
]);

for (const { code, path, line, detail } of findings) {
  console.error(`${path}:${line} ${code} ${detail}`);
}
console.log(`boundaries: ${files.length} files, ${findings.length} findings`);
process.exitCode = findings.length > 0 || files.length === 0 ? 1 : 0;
