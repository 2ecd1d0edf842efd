import { render, screen } from '@testing-library/react';
import { expect, it } from 'vitest';
import { lever } from '../../../../shared/analysis/lever.ts';
import { StaticBeam } from '../../../../src/features/beam/static-beam.tsx';
import { withWords } from '../../setup.ts';

withWords();

// Two strategies 100 apart in cost and 0.1 in health: level at 1,000, by the law of the lever.
const pair = { strategy: 'b', against: 'a', incrementalCost: 100, incrementalHealth: 0.1 };
const segments = [
  { strategy: 'a', tied: [], from: 0, to: 1_000 },
  { strategy: 'b', tied: [], from: 1_000, to: 3_000 },
];

function show(threshold: number) {
  const { container } = render(
    <StaticBeam
      scale={{ max: 3_000, step: 50 }}
      threshold={threshold}
      segments={segments}
      ranges={segments}
      notches={[]}
      lever={lever(pair, threshold)}
      pair={pair}
      names={new Map([...'ab'].map((id) => [id, id.toUpperCase()]))}
      wordFor={(amount) => `KM ${amount} per QALY`}
      moneyFor={(amount) => `KM ${amount}`}
      language="en"
      label="B against A"
      width={800}
    />,
  );
  const arm = container.querySelector<SVGGElement>('g[style*="rotate"]')?.style.transform ?? '';
  return { container, angle: Number(/rotate\((.*)deg\)/.exec(arm)?.[1]) };
}

it('is a picture with a name, and nothing to move', () => {
  const { container } = show(1_500);
  expect(screen.getByRole('img', { name: 'B against A' })).toBeTruthy();
  expect(screen.queryByRole('slider')).toBeNull();
  expect(container.textContent).toContain('level at 1,000');
  expect(container.textContent).toContain('KM 1500 per QALY');
});

it('leans as the lever does', () => {
  expect(show(1_500).angle).toBeGreaterThan(0);
  expect(show(1_000).angle).toBe(0);
  expect(show(500).angle).toBeLessThan(0);
});

it('holds its words however far the poise goes down', () => {
  const { container } = show(3_000);
  const height = Number(container.querySelector('svg')?.getAttribute('viewBox')?.split(' ')[3]);
  const foot = Number([...container.querySelectorAll('text')].at(-1)?.getAttribute('y'));
  expect(foot).toBeLessThan(height);
});
