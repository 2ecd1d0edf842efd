import { expect, it } from 'vitest';
import { barrelFindings } from '../../../scripts/checks/barrels.ts';

function isBarrel(text: string): boolean {
  return barrelFindings({ path: 'shared/model/index.ts', text }).length > 0;
}

it.each([
  `export * from './a.ts';`,
  `export { a } from './a.ts';\nexport type { B } from './b.ts';`,
  `import { a } from './a.ts';\nexport { a };`,
])('finds a file that only hands on: %s', (text) => {
  expect(isBarrel(text)).toBe(true);
});

it.each([
  `export const a = 1;`,
  `import { a } from './a.ts';\na();`,
  `export { a } from './a.ts';\nexport const b = 2;`,
  `import './styles.css';`,
])('lets a file with code of its own pass: %s', (text) => {
  expect(isBarrel(text)).toBe(false);
});
