import { screen, within } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { describe, expect, it } from 'vitest';
import type { StoredResistor } from '../../api/resistors';
import { resistor, sessionOf } from '../../test/factories';
import { fakeServer, json, problem } from '../../test/fakeServer';
import { renderApp } from '../../test/renderApp';

function open(part: StoredResistor) {
  fakeServer({
    'GET /api/auth/me': () => json(sessionOf('librarian')),
    'GET /api/resistors/61': () => json(part),
    'GET /api/parts/61/offers': () => json({ current: [], history: [] }),
  });
  renderApp('/parts/resistors/61');
}

function withFigures(figures: Partial<StoredResistor['resistor']>) {
  return resistor({ resistor: { ...resistor().resistor, ...figures } });
}

function cellsOf(table: HTMLElement, label: string): (string | null)[] {
  const row = within(table).getByRole('row', { name: new RegExp(`^${label}`) });
  return within(row)
    .getAllByRole('cell')
    .map(({ textContent }) => textContent);
}

describe('a resistor’s page', () => {
  it('says what it is and where its figures come from', async () => {
    open(resistor());
    expect(await screen.findByText(/^4\.7 kΩ ±1 % · thick film · 0805/)).toBeInTheDocument();
    const index = within(screen.getByLabelText('Parameters')).getByText('noise index NI').closest('div')!;
    expect(index).toHaveTextContent('−10 dBmeasured');
    expect(screen.getByRole('link', { name: 'Edit' })).toHaveAttribute('href', '/parts/resistors/61/edit');
  });

  it('derives thermal and excess noise', async () => {
    open(resistor());
    const derived = await screen.findByLabelText('Derived figures');
    expect(derived).toHaveTextContent(/thermal noise density at 25 °C8\.80\snV\/√Hz/);
    expect(derived).toHaveTextContent(/excess noise per volt and decade316\snV\/V/);
    const table = screen.getByRole('table');
    expect(cellsOf(table, 'excess noise')).toEqual(['316\u2009nV', '3.16\u2009µV']);
    expect(cellsOf(table, 'total above thermal')).toEqual(['11.86\u2009dB', '31.43\u2009dB']);
  });

  it('shows no noise at a voltage that it doesn’t stand', async () => {
    open(withFigures({ resistance: 100 }));
    const table = await screen.findByRole('table');
    expect(cellsOf(table, 'excess noise')[1]).toBe('–');
    expect(cellsOf(table, 'dissipation')).toEqual(['10.0\u2009mW', '1.00\u2009W, over its rating']);
  });

  it('says what an unknown noise index means', async () => {
    open(withFigures({ noiseIndex: null }));
    expect(cellsOf(await screen.findByRole('table'), 'total above thermal')).toEqual(['unknown', 'unknown']);
    expect(screen.getByLabelText('Cautions')).toHaveTextContent('The noise index is unknown');
    expect(screen.getByRole('status')).toHaveTextContent('no excess noise can be drawn');
  });

  it('follows the direct voltage that is typed', async () => {
    open(resistor());
    const voltage = await screen.findByLabelText('direct voltage');
    expect(screen.getByRole('img', { name: /thermal, excess at 1\sV/ })).toBeInTheDocument();
    await userEvent.clear(voltage);
    await userEvent.type(voltage, '2V5{Enter}');
    expect(screen.getByRole('img', { name: /thermal, excess at 2\.5\sV/ })).toBeInTheDocument();
    await userEvent.clear(voltage);
    await userEvent.type(voltage, '100{Enter}');
    expect(screen.getByRole('status')).toHaveTextContent(
      /dissipate 2\.13\sW, more than its rating of 125\smW/,
    );
  });

  it('leads back to the resistors where there is none', async () => {
    fakeServer({
      'GET /api/auth/me': () => json(sessionOf('engineer')),
      'GET /api/resistors/9': () => problem(404, 'part.not-found'),
    });
    renderApp('/parts/resistors/9');
    expect(await screen.findByRole('link', { name: 'See all resistors' })).toHaveAttribute(
      'href',
      '/parts/resistors',
    );
  });
});
