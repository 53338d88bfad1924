import { screen, waitFor, within } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { describe, expect, it } from 'vitest';
import { opAmp, resistor, sessionOf } from '../../test/factories';
import { fakeServer, json, problem } from '../../test/fakeServer';
import { renderApp } from '../../test/renderApp';

const SESSION = { 'GET /api/auth/me': () => json(sessionOf('librarian')) };
const OTHER = resistor({ id: '62', partNumber: 'TR-08-9K10' });

function listed(items: unknown[], total = items.length) {
  return () => json({ items, total });
}

describe('the lists of parts', () => {
  it('stand under a tab for each kind', async () => {
    const asked = fakeServer({
      ...SESSION,
      'GET /api/op-amps': listed([opAmp()]),
      'GET /api/resistors': listed([resistor(), OTHER]),
    });
    const router = renderApp('/parts');
    expect(await screen.findByText('1 part: 0 curated, 1 of your own')).toBeInTheDocument();
    const tabs = screen.getByRole('navigation', { name: 'Kinds of part' });
    expect(within(tabs).getByRole('link', { name: 'Op-amps' })).toHaveAttribute('aria-current', 'page');
    await userEvent.click(within(tabs).getByRole('link', { name: 'Resistors' }));
    expect(await screen.findByText('2 parts: 0 curated, 2 of your own')).toBeInTheDocument();
    expect(router.state.location.pathname).toBe('/parts/resistors');
    expect(screen.getByRole('link', { name: 'New resistor' })).toHaveAttribute(
      'href',
      '/parts/resistors/new',
    );
    expect(asked.map(({ route }) => route)).toEqual([
      'GET /api/auth/me',
      'GET /api/op-amps',
      'GET /api/resistors',
    ]);
  });

  it('ask the server for the filters of their kind', async () => {
    const asked = fakeServer({ ...SESSION, 'GET /api/resistors': listed([resistor()]) });
    renderApp(
      '/parts/resistors?technology=thick-film,wirewound&resistanceFrom=1000&inputType=jfet&sort=-noiseIndex',
    );
    await screen.findByText(/^1 part:/);
    const { searchParams } = asked.at(-1)!.url;
    expect(searchParams.getAll('technology')).toEqual(['wirewound', 'thick-film']);
    searchParams.delete('technology');
    expect(Object.fromEntries(searchParams)).toEqual({
      resistanceFrom: '1000',
      sort: '-noiseIndex',
      limit: '1000',
    });
  });

  it('are narrowed by values typed as one writes them, kept in the address', async () => {
    const asked = fakeServer({ ...SESSION, 'GET /api/resistors': listed([resistor()]) });
    const router = renderApp('/parts/resistors');
    await userEvent.type(await screen.findByLabelText('resistance from'), '4k7{Enter}');
    await userEvent.type(screen.getByLabelText('resistance to'), '0.01 MΩ{Enter}');
    await waitFor(() => expect(router.state.location.search).toBe('?resistanceFrom=4700&resistanceTo=10000'));
    await waitFor(() => expect(asked.at(-1)!.url.searchParams.get('resistanceTo')).toBe('10000'));
  });

  it('say that a window from much to little holds nothing', async () => {
    fakeServer({ ...SESSION, 'GET /api/resistors': listed([]) });
    renderApp('/parts/resistors?resistanceFrom=5000&resistanceTo=100');
    expect(await screen.findByText('no value lies between these')).toBeInTheDocument();
    await userEvent.click(await screen.findByRole('button', { name: 'show all parts' }));
    expect(screen.queryByText('no value lies between these')).not.toBeInTheDocument();
  });

  it('search what isn’t loaded on the server', async () => {
    const asked = fakeServer({
      ...SESSION,
      'GET /api/resistors': (_body, url) =>
        url.searchParams.has('search')
          ? json({ items: [OTHER], total: 1 })
          : json({ items: [resistor()], total: 7000 }),
    });
    renderApp('/parts/resistors');
    expect(await screen.findByText(/of which the first 1 are shown/)).toBeInTheDocument();
    await userEvent.click(screen.getByLabelText('Search parts'));
    await userEvent.paste('9k10');
    expect(await screen.findByText(/^1 part found among 7\s000 parts/)).toBeInTheDocument();
    expect(asked.at(-1)!.url.searchParams.get('search')).toBe('9k10');
  });

  it('say nothing is found only when the server has said so', async () => {
    fakeServer({
      ...SESSION,
      'GET /api/resistors': (_body, url) =>
        json({ items: url.searchParams.has('search') ? [] : [resistor()], total: 7000 }),
    });
    renderApp('/parts/resistors');
    await screen.findByText(/of which the first 1 are shown/);
    await userEvent.click(screen.getByLabelText('Search parts'));
    await userEvent.paste('zzzz');
    expect(screen.queryByText(/No part matches/)).not.toBeInTheDocument();
    expect(await screen.findByText(/No part matches/)).toBeInTheDocument();
  });

  it('say what the server refuses', async () => {
    fakeServer({
      ...SESSION,
      'GET /api/resistors': () => problem(400, 'request.invalid', { detail: 'limit: too many' }),
    });
    renderApp('/parts/resistors');
    expect(await screen.findByRole('alert')).toHaveTextContent('limit: too many');
  });
});

describe('the completeness of the parts', () => {
  const part = opAmp();
  const little = opAmp({ amplifier: { ...part.amplifier, currentNoise: null, supplyCurrent: null } });
  const counts = {
    total: 2,
    complete: 1,
    missing: [
      { parameter: 'currentNoise', count: 1 },
      { parameter: 'supplyCurrent', count: 1 },
      { parameter: 'gainBandwidth', count: 0 },
    ],
  };

  function open(address: string, role: Parameters<typeof sessionOf>[0] = 'librarian') {
    const asked = fakeServer({
      'GET /api/auth/me': () => json(sessionOf(role)),
      'GET /api/op-amps': listed([little]),
      'GET /api/op-amps/completeness': () => json(counts),
      'GET /api/op-amps/41': () =>
        json({ ...little, version: 9, amplifier: { ...little.amplifier, currentNoise: 2.2e-12 } }),
      'PATCH /api/op-amps/41': () =>
        json({ ...little, version: 4, amplifier: { ...little.amplifier, currentNoise: 2.2e-12 } }),
    });
    return { asked, router: renderApp(address) };
  }

  it('is counted by parameter, and one of them narrows the list', async () => {
    const { asked, router } = open('/parts/completeness?library=team');
    expect(await screen.findByText('2 parts, 1 complete')).toBeInTheDocument();
    const lacks = screen.getByRole('group', { name: 'What parts lack' });
    expect(
      within(lacks)
        .getAllByRole('button')
        .map(({ textContent }) => textContent),
    ).toEqual(['current noise 1', 'supply current 1']);
    expect(await screen.findByText(/75\s%/)).toBeInTheDocument();
    await userEvent.click(within(lacks).getByRole('button', { name: 'current noise 1' }));
    expect(router.state.location.search).toBe('?library=team&missing=currentNoise');
    expect(await screen.findByText(/at high source resistance/)).toBeInTheDocument();
    await waitFor(() => expect(asked.at(-1)!.url.searchParams.getAll('missing')).toEqual(['currentNoise']));
  });

  it('is completed in the row, which stays where it is', async () => {
    const { asked } = open('/parts/completeness?library=team&missing=currentNoise');
    await userEvent.type(await screen.findByLabelText('current noise of VR-1108'), '2.2 pA/√Hz{Enter}');
    expect(await screen.findByText(/97\s%/)).toBeInTheDocument();
    const { body } = asked.find(({ route }) => route === 'PATCH /api/op-amps/41')!;
    expect(body).toMatchObject({ version: 3, amplifier: { currentNoise: 2.2e-12, supplyCurrent: null } });
    expect(screen.getByLabelText('current noise of VR-1108')).toHaveValue('2.2 pA/√Hz');
    await userEvent.click(screen.getByRole('button', { name: 'State supply current of VR-1108' }));
    expect(screen.getByLabelText('supply current of VR-1108')).toHaveFocus();
  });

  it('is taken back by Undo, on what the part is by then', async () => {
    const { asked } = open('/parts/completeness?library=team&missing=currentNoise');
    await userEvent.type(await screen.findByLabelText('current noise of VR-1108'), '2.2 pA/√Hz{Enter}');
    await screen.findByText('current noise of VR-1108 is stated');
    await userEvent.click(screen.getByRole('button', { name: 'Undo' }));
    const sent = () => asked.filter(({ route }) => route === 'PATCH /api/op-amps/41').map(({ body }) => body);
    await waitFor(() => expect(sent()).toHaveLength(2));
    expect(sent()[1]).toMatchObject({ version: 9, amplifier: { currentNoise: null } });
  });

  it('is read by an engineer', async () => {
    open('/parts/completeness?library=team', 'engineer');
    expect(await screen.findByText('current noise')).toBeInTheDocument();
    expect(screen.queryByRole('button', { name: /^State/ })).not.toBeInTheDocument();
  });
});

describe('parts that may be one', () => {
  const PAIR = {
    likelihood: 0.85,
    reasons: ['look-alike'],
    one: opAmp({ partNumber: 'VR-1108', package: 'SOIC-8' }),
    other: opAmp({ id: '42', partNumber: 'VR-11O8', package: 'DIP-8', version: 5 }),
  };

  function open() {
    const asked = fakeServer({
      ...SESSION,
      'GET /api/op-amps/duplicates': listed([PAIR]),
      'POST /api/duplicates/keep-both': () => new Response(null, { status: 204 }),
      'PATCH /api/op-amps': () => json({ items: [{ ...PAIR.other, version: 6 }], total: 1 }),
    });
    renderApp('/parts/duplicates');
    return asked;
  }

  it('stand side by side with what differs', async () => {
    open();
    expect(await screen.findByText('1 pair of parts that may be one')).toBeInTheDocument();
    const pair = screen.getByRole('article', { name: 'VR-1108 and VR-11O8' });
    expect(pair).toHaveTextContent('likely one part: part numbers that read alike');
    const rows = within(pair)
      .getAllByRole('row')
      .map((row) => row.textContent);
    expect(rows.slice(1)).toEqual(['part numberVR-1108VR-11O8', 'packageSOIC-8DIP-8']);
  });

  it('are kept both, or one of them is retired', async () => {
    const asked = open();
    await userEvent.click(await screen.findByRole('button', { name: 'Keep both' }));
    expect(await screen.findByText('VR-1108 and VR-11O8 are both kept')).toBeInTheDocument();
    expect(asked.find(({ route }) => route === 'POST /api/duplicates/keep-both')!.body).toEqual({
      oneId: '41',
      otherId: '42',
    });
    await userEvent.click(screen.getByRole('button', { name: 'Retire VR-11O8' }));
    expect(await screen.findByText('VR-11O8 is retired')).toBeInTheDocument();
    expect(asked.find(({ route }) => route === 'PATCH /api/op-amps')!.body).toEqual({
      parts: [{ id: '42', version: 5, lifecycle: 'obsolete', approval: 'not-approved' }],
    });
  });
});

describe('the chosen parts', () => {
  const CURATED = opAmp({ id: '43', partNumber: 'KM-21', library: 'curated' });
  const PARTS = [opAmp(), opAmp({ id: '42', partNumber: 'VR-1109', version: 5 }), CURATED];
  const changed = (parts: { id: string; version: number }[]) =>
    json({ items: parts.map(({ id, version }) => ({ ...opAmp(), id, version: version + 1 })), total: 2 });

  async function chooseAll(answer: (body: unknown) => Response) {
    const asked = fakeServer({
      ...SESSION,
      'GET /api/op-amps': listed(PARTS),
      'PATCH /api/op-amps': answer,
    });
    renderApp('/parts');
    await userEvent.click(await screen.findByRole('checkbox', { name: 'Choose all parts listed' }));
    const bar = await screen.findByRole('region', { name: 'Chosen parts' });
    return { asked, bar };
  }

  it('are retired in one act whose outcome is said first, and come back by Undo', async () => {
    const { asked, bar } = await chooseAll((body) =>
      changed((body as { parts: { id: string; version: number }[] }).parts),
    );
    await userEvent.click(within(bar).getByRole('button', { name: 'Retire' }));
    expect(bar).toHaveTextContent(
      'Retires 2 of 3 parts: obsolete and not approved; 1 curated one can’t be changed.',
    );
    await userEvent.click(within(bar).getByRole('button', { name: 'Retire 2 parts' }));
    expect(await screen.findByText('2 parts are retired')).toBeInTheDocument();
    const sent = () => asked.filter(({ route }) => route === 'PATCH /api/op-amps').map(({ body }) => body);
    const retired = { lifecycle: 'obsolete', approval: 'not-approved' };
    expect(sent()).toEqual([
      {
        parts: [
          { id: '41', version: 3, ...retired },
          { id: '42', version: 5, ...retired },
        ],
      },
    ]);
    await userEvent.click(screen.getByRole('button', { name: 'Undo' }));
    await waitFor(() => expect(sent()).toHaveLength(2));
    const before = { lifecycle: 'active', approval: 'approved' };
    expect(sent()[1]).toEqual({
      parts: [
        { id: '41', version: 4, ...before },
        { id: '42', version: 6, ...before },
      ],
    });
  });

  it('are all that match, where the list holds only the first of them', async () => {
    const outcome = { chosen: 7083, changed: 7000, unchanged: 80, curated: 3, libraryRevision: 12 };
    const asked = fakeServer({
      ...SESSION,
      'GET /api/resistors': listed([resistor(), OTHER], 7083),
      'GET /api/resistors/standings': () => json(outcome),
      'POST /api/resistors/standings': () => json({ id: '5', changed: 7000 }),
      'POST /api/resistors/standings/5/undo': () => json({ takenBack: 6999, kept: 1 }),
    });
    renderApp('/parts/resistors?technology=thick-film');
    await userEvent.click(await screen.findByRole('checkbox', { name: 'Choose all parts listed' }));
    await userEvent.click(await screen.findByRole('button', { name: /^Choose all 7\s083 that match$/ }));
    const bar = screen.getByRole('region', { name: 'Chosen parts' });
    expect(bar).toHaveTextContent(/All 7\s083 parts that match chosen/);
    await userEvent.click(within(bar).getByRole('button', { name: 'Retire' }));
    await userEvent.click(await within(bar).findByRole('button', { name: /^Retire 7\s000 parts$/ }));
    expect(await screen.findByText(/^7\s000 parts are retired$/)).toBeInTheDocument();
    const change = asked.find(({ route }) => route === 'POST /api/resistors/standings')!;
    expect(change.url.searchParams.toString()).toBe('technology=thick-film');
    expect(change.body).toEqual({ libraryRevision: 12, lifecycle: 'obsolete', approval: 'not-approved' });
    await userEvent.click(screen.getByRole('button', { name: 'Undo' }));
    expect(await screen.findByText('1 part changed since and stayed')).toBeInTheDocument();
  });

  it('stay chosen where somebody changed one meanwhile, and it is named', async () => {
    const message = 'VR-1109: somebody has changed this part meanwhile';
    const { bar } = await chooseAll(() =>
      problem(409, 'part.stale', { detail: 'Changed meanwhile.', errors: [{ field: 'parts[1]', message }] }),
    );
    await userEvent.click(within(bar).getByRole('button', { name: 'Retire' }));
    await userEvent.click(within(bar).getByRole('button', { name: 'Retire 2 parts' }));
    expect(await within(bar).findByRole('alert')).toHaveTextContent(message);
    expect(bar).toHaveTextContent('3 parts chosen');
  });

  it('aren’t there for an engineer', async () => {
    fakeServer({ 'GET /api/auth/me': () => json(sessionOf('engineer')), 'GET /api/op-amps': listed(PARTS) });
    renderApp('/parts');
    await screen.findByText(/^3 parts:/);
    expect(screen.queryByRole('checkbox')).not.toBeInTheDocument();
  });
});
