import { act, screen } from '@testing-library/react';
import { expect, it } from 'vitest';
import type { Row } from '../../../../../shared/model/document.ts';
import { Movements } from '../../../../../src/routes/appraisal/model/movements.tsx';
import { States } from '../../../../../src/routes/appraisal/model/states.tsx';
import { tinyDocument } from '../../../../fixtures/tiny-document.ts';
import { withWords } from '../../../setup.ts';
import { fill, host, press } from '../editing/host.tsx';

withWords();

const settle = () => act(() => new Promise((done) => setTimeout(done, 5)));
const rowsOf = (hosted: ReturnType<typeof host>): readonly Row[] => {
  const { movements } = hosted.document();
  return movements.type === 'rows' ? movements.rows : [];
};

it('writes a cell, and says what is wrong in it', async () => {
  const hosted = host(tinyDocument(), <Movements />);
  fill('To Dead', 'die_nw');
  await settle();
  expect(rowsOf(hosted)[0]?.cells[0]?.formula).toBe('die_nw');
  expect(screen.getByText(/Did you mean die_now\?/)).toBeTruthy();
});

it('gives a strategy a row of its own, and one row to all again', async () => {
  const hosted = host(tinyDocument(), <Movements />);
  fill('A row of its own for', 'treatment');
  expect(rowsOf(hosted)).toHaveLength(2);
  fill('Strategy shown', 'treatment');
  fill('To Dead', 'die_now * 0.5');
  await settle();
  const own = rowsOf(hosted).find((row) => row.strategies?.includes('treatment'));
  expect(own?.cells[0]?.formula).toBe('die_now * 0.5');
  press('This row for all strategies');
  expect(rowsOf(hosted)).toHaveLength(1);
  expect(rowsOf(hosted)[0]?.strategies).toBeUndefined();
});

it('adds a state and a movement to it, which the diagram follows', () => {
  const hosted = host(
    tinyDocument(),
    <>
      <States />
      <Movements />
    </>,
  );
  press('Add a state');
  expect(hosted.document().states.map(({ label }) => label)).toEqual([
    'Alive',
    'New state',
    'Dead',
  ]);
  press(/Alive → New state/);
  expect(rowsOf(hosted)[0]?.cells).toHaveLength(2);
  expect(screen.getAllByText('From Alive').length).toBeGreaterThan(0);
});

it('changes between rows and survival curves', () => {
  const hosted = host(tinyDocument(), <Movements />);
  fill('Described by', 'survival');
  expect(hosted.document().movements).toMatchObject({ type: 'survival', last: 'dead' });
  expect(screen.getByLabelText('Share in Alive')).toBeTruthy();
});
