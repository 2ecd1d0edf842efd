import { fireEvent, screen, within } from '@testing-library/react';
import { describe, expect, it } from 'vitest';
import { Register } from '../../../../../src/routes/appraisal/evidence/register.tsx';
import { tinyDocument } from '../../../../fixtures/tiny-document.ts';
import { withWords } from '../../../setup.ts';
import { fill, host, press } from '../editing/host.tsx';

withWords();

describe('the register', () => {
  it('adds a parameter, opened to be filled in', () => {
    const { document } = host(tinyDocument(), <Register />);
    press('Add a parameter');
    fill('Name', 'Cost of a visit');
    fill('Value', '12.5');
    expect(document().parameters.at(-1)).toMatchObject({ label: 'Cost of a visit', value: 12.5 });
  });

  it('renames a symbol in the formulas that use it, and refuses one that is taken', () => {
    const { document } = host(tinyDocument(), <Register />);
    press('Probability of dying in a year');
    fill('Symbol', 'rr_die');
    expect(document().parameters[0]?.symbol).toBe('p_die');
    fill('Symbol', 'p_death');
    expect(document().parameters[0]?.symbol).toBe('p_death');
    expect(document().variables[0]?.formula).toMatchObject({ otherwise: 'p_death' });
  });

  it('fills a distribution and the value from events and their number', () => {
    const { document, acts } = host(tinyDocument(), <Register />);
    press('Probability of dying in a year');
    fill('Events', '3');
    fill('Among', '40');
    press('Fill them in');
    expect(document().parameters[0]).toMatchObject({
      value: 0.075,
      distribution: { type: 'beta', alpha: 3, beta: 37 },
    });
    expect(acts).toEqual(['Fit Probability of dying in a year']);
  });

  it('draws the density with its mean and interval', () => {
    host(tinyDocument(), <Register />);
    press('Cost of treatment for a year');
    // 95% interval of gamma (25, scale 4): R, qgamma(c(.025, .975), 25, scale = 4), from memory
    // 64.71 and 142.84.
    const picture = screen.getByRole('img', { name: /Mean 100, 95% interval/ });
    expect(picture.getAttribute('aria-label')).toMatch(/64\.7\d? to 142\.8/);
  });

  it('changes the family, keeping about the mean and the spread there were', () => {
    const { document } = host(tinyDocument(), <Register />);
    press('Cost of treatment for a year');
    fill('Uncertainty', 'normal');
    expect(document().parameters[2]?.distribution).toEqual({ type: 'normal', mean: 100, sd: 20 });
  });

  it('finds by text and by filter', () => {
    host(tinyDocument(), <Register />);
    fill('Find a parameter', 'relative');
    expect(screen.getAllByRole('listitem')).toHaveLength(1);
    fill('Find a parameter', '');
    fill('Show', 'fixed');
    expect(screen.getByRole('button', { name: 'Utility of being alive' })).toBeTruthy();
  });
});

describe('deleting what is used', () => {
  it('says where, and can put the value in its place', () => {
    const { document } = host(tinyDocument(), <Register />);
    press('Delete Probability of dying in a year');
    const dialog = screen.getByRole('dialog');
    expect(within(dialog).getByText(/Variable: Probability of dying in a cycle/)).toBeTruthy();
    expect(document().parameters).toHaveLength(4);
    fireEvent.click(within(dialog).getByText('Put its value in place and delete it'));
    expect(document().parameters.some(({ id }) => id === 'p_die')).toBe(false);
    expect(document().variables[0]?.formula).toMatchObject({ otherwise: '0.1' });
  });

  it('can be left', () => {
    const { document } = host(tinyDocument(), <Register />);
    press('Delete Utility of being alive');
    fireEvent.click(screen.getByText('Keep it'));
    expect(screen.queryByRole('dialog')).toBeNull();
    expect(document()).toEqual(tinyDocument());
  });
});
