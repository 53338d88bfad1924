import { OP_AMP_CATALOGUE, PART_FIELDS, RESISTOR_CATALOGUE } from '@roothertz/common/parts';
import { screen, waitFor, within } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { describe, expect, it } from 'vitest';
import { opAmp, resistor, sessionOf } from '../../test/factories';
import { fakeServer, json, problem } from '../../test/fakeServer';
import { renderApp } from '../../test/renderApp';

const LIBRARIAN = { 'GET /api/auth/me': () => json(sessionOf('librarian')) };

function field(label: string): HTMLElement {
  return screen.getByLabelText(new RegExp(`^${label}( [A-Za-zΔ]+_?[A-Za-z]*)?$`));
}

async function fill(label: string, text: string) {
  await userEvent.clear(field(label));
  await userEvent.click(field(label));
  await userEvent.paste(text);
}

async function save(name: string) {
  await userEvent.click(screen.getByRole('button', { name }));
}

describe('the form of a new part', () => {
  it.each([
    ['Op-amp', '/parts/new', OP_AMP_CATALOGUE],
    ['Resistor', '/parts/resistors/new', RESISTOR_CATALOGUE],
  ] as const)('has a field for every entry of the catalogues: %s', async (name, address, catalogue) => {
    fakeServer(LIBRARIAN);
    renderApp(address);
    await screen.findByRole('form', { name });
    for (const { label } of [...PART_FIELDS, catalogue.choice, ...catalogue.parameters])
      expect(field(label)).toBeInTheDocument();
  });
});

describe('the form of a new resistor', () => {
  it('sends SI values, and null for what is unknown', async () => {
    const asked = fakeServer({
      ...LIBRARIAN,
      'POST /api/resistors': () => json(resistor(), 201),
      'GET /api/resistors/61': () => json(resistor()),
    });
    const router = renderApp('/parts/resistors/new');
    await screen.findByRole('form', { name: 'Resistor' });
    await fill('manufacturer', 'Tarn Micro');
    await fill('part number', 'TR-08-4K70');
    await fill('resistance', '4k7');
    await fill('tolerance', '0.1');
    await fill('temperature coefficient', '25 ppm/K');
    await save('Add to your library');
    await screen.findByRole('heading', { name: /TR-08-4K70/ });
    expect(router.state.location.pathname).toBe('/parts/resistors/61');
    expect(asked.find(({ route }) => route === 'POST /api/resistors')?.body).toMatchObject({
      partNumber: 'TR-08-4K70',
      resistor: {
        technology: null,
        resistance: 4700,
        tolerance: 0.1,
        temperatureCoefficient: 25e-6,
        noiseIndex: null,
      },
      origins: {},
    });
  });
});

describe('the form of a new op-amp', () => {
  it('sends SI values, and null for what is unknown', async () => {
    const asked = fakeServer({
      ...LIBRARIAN,
      'POST /api/op-amps': () => json(opAmp({ id: '50' }), 201),
      'GET /api/op-amps/50': () => json(opAmp({ id: '50' })),
    });
    renderApp('/parts/new');
    await screen.findByRole('form', { name: 'Op-amp' });
    await fill('manufacturer', ' Vireo ');
    await fill('part number', 'VR-1');
    await fill('voltage noise', '3n3');
    await fill('gain–bandwidth product', '40 MHz');
    await save('Add to your library');
    await screen.findByRole('heading', { name: /VR-1108/ });
    const body = asked.find(({ route }) => route === 'POST /api/op-amps')?.body;
    expect(body).toMatchObject({
      manufacturer: ' Vireo ',
      partNumber: 'VR-1',
      lifecycle: 'active',
      amplifier: {
        voltageNoise: 3.3e-9,
        gainBandwidth: 40e6,
        currentNoise: null,
        voltageNoiseCorner: null,
        inputType: null,
        channels: 1,
      },
      origins: {},
    });
  });

  it('names what is missing and sends nothing', async () => {
    const asked = fakeServer(LIBRARIAN);
    renderApp('/parts/new');
    await screen.findByRole('form', { name: 'Op-amp' });
    await save('Add to your library');
    expect(await screen.findByText('part number: a text was expected')).toBeInTheDocument();
    expect(screen.getByText('voltage noise: a value is needed')).toBeInTheDocument();
    expect(asked.map(({ route }) => route)).toEqual(['GET /api/auth/me']);
  });

  it('isn’t sent while a figure can’t be read', async () => {
    const asked = fakeServer(LIBRARIAN);
    renderApp('/parts/new');
    await screen.findByRole('form', { name: 'Op-amp' });
    await fill('manufacturer', 'Vireo');
    await fill('part number', 'VR-1');
    await fill('voltage noise', '1 nV/√Hz');
    await fill('supply current', 'much');
    await save('Add to your library');
    expect(await screen.findByText(/a current/)).toBeInTheDocument();
    expect(asked.map(({ route }) => route)).toEqual(['GET /api/auth/me']);
  });

  it('refuses limits that contradict each other, at the field', async () => {
    fakeServer(LIBRARIAN);
    renderApp('/parts/new');
    await screen.findByRole('form', { name: 'Op-amp' });
    await fill('manufacturer', 'Vireo');
    await fill('part number', 'VR-1');
    await fill('voltage noise', '1 nV/√Hz');
    await fill('supply minimum', '12 V');
    await fill('supply maximum', '5 V');
    await save('Add to your library');
    expect(await screen.findByText(/a voltage not below the supply minimum/)).toBeInTheDocument();
  });

  it('shows what the server refuses at the field', async () => {
    const errors = [{ field: 'partNumber', message: 'Vireo VR-1 is in your library already' }];
    fakeServer({ ...LIBRARIAN, 'POST /api/op-amps': () => problem(409, 'part.duplicate', { errors }) });
    renderApp('/parts/new');
    await screen.findByRole('form', { name: 'Op-amp' });
    await fill('manufacturer', 'Vireo');
    await fill('part number', 'VR-1');
    await fill('voltage noise', '1 nV/√Hz');
    await save('Add to your library');
    const item = await screen.findByText('Vireo VR-1 is in your library already');
    expect(field('part number')).toHaveAttribute('aria-describedby', item.closest('[id]')?.id);
  });
});

describe('editing a part', () => {
  it('shows what changed meanwhile and saves the chosen values on top of it', async () => {
    const base = opAmp();
    const theirs = opAmp({
      version: 4,
      approval: 'restricted',
      amplifier: { ...base.amplifier, gainBandwidth: 55e6 },
    });
    let stored = base;
    const asked = fakeServer({
      ...LIBRARIAN,
      'GET /api/op-amps/41': () => json(stored),
      'PATCH /api/op-amps/41': (body) =>
        (body as { version: number }).version === 4 ? json(theirs) : problem(409, 'part.stale'),
    });
    renderApp('/parts/41/edit');
    await screen.findByRole('form', { name: 'Op-amp' });
    stored = theirs;
    await fill('gain–bandwidth product', '60 MHz');
    await save('Save');
    const choices = await screen.findByRole('alertdialog');
    const bandwidth = within(choices).getByRole('radiogroup', { name: 'gain–bandwidth product' });
    expect(within(bandwidth).getByRole('radio', { name: 'Keep mine: 60 MHz' })).toBeChecked();
    const approval = within(choices).getByRole('radiogroup', { name: 'approval' });
    expect(within(approval).getByRole('radio', { name: 'Take theirs: restricted' })).toBeChecked();
    await userEvent.click(within(approval).getByRole('radio', { name: 'Keep mine: approved' }));
    await save('Save with these values');
    await waitFor(() => expect(asked.filter(({ route }) => route.startsWith('PATCH'))).toHaveLength(2));
    expect(asked.findLast(({ route }) => route.startsWith('PATCH'))?.body).toMatchObject({
      version: 4,
      approval: 'approved',
      amplifier: { gainBandwidth: 60e6, voltageNoise: 1.1e-9 },
    });
  });

  it('asks before unsaved changes are left', async () => {
    fakeServer({ ...LIBRARIAN, 'GET /api/op-amps/41': () => json(opAmp()) });
    const router = renderApp('/parts/41/edit');
    await screen.findByRole('form', { name: 'Op-amp' });
    await fill('package', 'DIP-8');
    await userEvent.click(screen.getByRole('link', { name: 'Don’t save' }));
    await userEvent.click(await screen.findByRole('button', { name: 'Stay here' }));
    expect(router.state.location.pathname).toBe('/parts/41/edit');
    expect(field('package')).toHaveValue('DIP-8');
    await userEvent.click(screen.getByRole('link', { name: 'Don’t save' }));
    await userEvent.click(await screen.findByRole('button', { name: 'Leave, lose the changes' }));
    await screen.findByLabelText('Parameters');
  });
});
