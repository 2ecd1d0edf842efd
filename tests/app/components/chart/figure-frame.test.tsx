import { fireEvent, render, screen } from '@testing-library/react';
import { describe, expect, it, vi } from 'vitest';
import { FigureFrame } from '../../../../src/components/chart/figure-frame.tsx';
import * as files from '../../../../src/components/save-file.ts';
import { withWords } from '../../setup.ts';

withWords();

const table = () => ({
  columns: [{ head: 'Draw' }, { head: 'Cost', write: (value: number) => value.toFixed(1) }],
  rows: Array.from({ length: 30 }, (_, i) => [i + 1, i + 0.25]),
});

function frame(chart = true) {
  render(
    <FigureFrame
      title="Costs vary"
      file="draws"
      source={{ name: 'hearts', invented: true }}
      table={table}
      mostRows={20}
      height={100}
      language="en"
    >
      {chart && <svg width="100" height="50" aria-hidden="true" />}
    </FigureFrame>,
  );
}

describe('a figure', () => {
  it('shows the same numbers as a table, one press away, and says how many it leaves out', () => {
    frame();
    expect(screen.queryByRole('table')).toBeNull();
    fireEvent.click(screen.getByRole('button', { name: 'Table' }));
    expect(screen.getAllByRole('row')).toHaveLength(21);
    expect(screen.getByRole('cell', { name: '19.3' })).toBeTruthy();
    expect(screen.getByText('The first 20 of 30 rows; the CSV has all of them.')).toBeTruthy();
  });

  it('saves all rows as CSV under a name that says what it is', () => {
    const save = vi.spyOn(files, 'saveFile').mockImplementation(() => {});
    frame();
    fireEvent.click(screen.getByRole('button', { name: 'CSV: Costs vary' }));
    const [name, text] = save.mock.calls[0] ?? [];
    expect(name).toBe('hearts-draws.csv');
    expect(text?.split('\r\n')).toHaveLength(32);
    expect(text).toContain('30,29.25');
  });

  it('saves a picture with its finding, and says that the data are invented', async () => {
    const save = vi.spyOn(files, 'saveBlob').mockImplementation(() => {});
    frame();
    fireEvent.click(screen.getByRole('button', { name: 'SVG: Costs vary' }));
    await vi.waitFor(() => expect(save).toHaveBeenCalledOnce());
    const [name, blob] = save.mock.calls[0] ?? [];
    expect(name).toBe('hearts-draws.svg');
    const text = await readBlob(blob as Blob);
    expect(text).toContain('Costs vary');
    expect(text).toContain('Invented data.');
  });

  it('that has no chart is a table, with no picture to save', () => {
    frame(false);
    expect(screen.getByRole('table')).toBeTruthy();
    expect(screen.queryByRole('button', { name: 'Chart' })).toBeNull();
    expect(screen.queryByRole('button', { name: /^PNG/ })).toBeNull();
  });
});

function readBlob(blob: Blob): Promise<string> {
  return new Promise((resolve) => {
    const reader = new FileReader();
    reader.onload = () => resolve(String(reader.result));
    reader.readAsText(blob);
  });
}
