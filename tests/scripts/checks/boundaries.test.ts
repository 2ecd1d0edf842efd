import { expect, it } from 'vitest';
import { boundaryFindings } from '../../../scripts/checks/boundaries.ts';

function codes(path: string, text: string): string[] {
  return boundaryFindings({ path, text }).map((one) => one.code);
}

it.each([
  ['src/routes/list.tsx', `import { app } from '../../server/app.ts';`, 'boundary.top'],
  ['server/app.ts', `import '../src/main.tsx';`, 'boundary.top'],
  ['server/app.ts', `import { fresh } from '../tests/setup/fresh.ts';`, 'boundary.top'],
  ['shared/model/merge.ts', `import type { App } from '../../src/app.tsx';`, 'boundary.top'],
  ['shared/model/merge.ts', `import version from '../../package.json';`, 'boundary.top'],
  ['shared/model/merge.ts', `export { parse } from '../formula/parse.ts';`, 'boundary.shared'],
  ['shared/formula/parse.ts', `const x = await import('../engine/graph.ts');`, 'boundary.shared'],
  ['shared/engine/graph.ts', `import { icers } from '../analysis/icers.ts';`, 'boundary.shared'],
  ['shared/analysis/psa.ts', `import { toR } from '../export/r.ts';`, 'boundary.shared'],
  ['shared/sync/protocol.ts', `import { Graph } from '../engine/graph.ts';`, 'boundary.shared'],
  ['shared/model/merge.ts', `import { readFileSync } from 'node:fs';`, 'boundary.node'],
  ['shared/model/merge.ts', `import { readFile } from 'fs/promises';`, 'boundary.node'],
  ['src/main.tsx', `import path from 'node:path';`, 'boundary.node'],
  ['shared/analysis/psa.ts', `import { useState } from 'react';`, 'boundary.package'],
  ['shared/engine/graph.ts', `import { eq } from 'drizzle-orm';`, 'boundary.package'],
  ['src/features/beam/beam.tsx', `import { Strip } from '../strip/strip.tsx';`, 'boundary.feature'],
  [
    'src/features/beam/beam.tsx',
    `new Worker(new URL('../strip/worker.ts', import.meta.url), { type: 'module' });`,
    'boundary.feature',
  ],
])('catches a breach planted in %s: %s', (path, text, code) => {
  expect(codes(path, text)).toEqual([code]);
});

it.each([
  ['src/routes/list.tsx', `import { icers } from '../../shared/analysis/icers.ts';`],
  ['src/routes/list.tsx', `import { Beam } from '../features/beam/beam.tsx';`],
  ['src/features/beam/beam.tsx', `import { angle } from './angle.ts';`],
  ['server/db.ts', `import { hub } from '../shared/db/hub.ts'; import fs from 'node:fs';`],
  ['server/version.ts', `import data from '../package.json' with { type: 'json' };`],
  ['server/main.ts', `const dist = new URL('../dist', import.meta.url);`],
  ['shared/export/r.ts', `import { psa } from '../analysis/psa.ts';`],
  ['shared/db/hub.ts', `import { text } from 'drizzle-orm/sqlite-core';`],
  ['shared/cli/appraise.ts', `import fs from 'node:fs'; import '../export/r.ts';`],
  ['shared/model/document.ts', `import { z } from 'zod'; // from '../../src/main.tsx'`],
  ['tests/hub/app.test.ts', `import '../../server/app.ts'; import '../../src/main.tsx';`],
])('lets an allowed import of %s pass: %s', (path, text) => {
  expect(codes(path, text)).toEqual([]);
});

it('says on which line the import stands', () => {
  const text = `import { z } from 'zod';\n\nimport fs from 'node:fs';\n`;
  expect(boundaryFindings({ path: 'shared/model/x.ts', text })).toEqual([
    { code: 'boundary.node', path: 'shared/model/x.ts', line: 3, detail: 'node:fs' },
  ]);
});
