import { expect, it } from 'vitest';
import { isInstalled } from '../../../scripts/lib/install.mjs';

const LOCK = {
  packages: {
    '': { version: '0.1.0' },
    'node_modules/zod': { version: '4.6.7', integrity: 'sha512-a' },
    'node_modules/other-system': { version: '1.0.0', integrity: 'sha512-b', optional: true },
  },
};

function withPackages(packages: Record<string, { version: string; integrity: string }>) {
  return isInstalled(LOCK, { packages });
}

it('is installed when each package is there; those for other systems may be missing', () => {
  expect(withPackages({ 'node_modules/zod': { version: '4.6.7', integrity: 'sha512-a' } })).toBe(
    true,
  );
});

it.each([
  ['a package is missing', {}],
  ['a version differs', { 'node_modules/zod': { version: '4.6.6', integrity: 'sha512-a' } }],
  ['a content differs', { 'node_modules/zod': { version: '4.6.7', integrity: 'sha512-c' } }],
])('is not installed when %s', (_why, packages) => {
  expect(withPackages(packages)).toBe(false);
});
