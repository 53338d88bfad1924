import type { Role } from '@roothertz/common/access';
import type { RankingRequest } from '@roothertz/common/conditions';
import { act, screen, waitFor, within } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { describe, expect, it } from 'vitest';
import { exampleRequest } from '../../features/conditions/exampleRequest';
import { withValue } from '../../features/conditions/requestPath';
import { exampleRanking } from '../../test/exampleRanking';
import { sessionOf } from '../../test/factories';
import { fakeServer, json, problem } from '../../test/fakeServer';
import { rankedItem, rankingOf } from '../../test/rankings';
import { renderApp } from '../../test/renderApp';

/** A computed style goes through the rules of grid and controls each time, which takes seconds; none matters here. */
window.getComputedStyle = (element) => (element as HTMLElement).style;

const GEOPHONE = withValue(exampleRequest('non-inverting'), 'conditions.source.resistance', 375);
const named = {
  id: '4',
  name: 'River geophone',
  ...GEOPHONE,
  filter: {},
  target: {},
  partIds: ['2'],
  version: 2,
  updatedAt: '2026-01-05T10:00:00.000Z',
  updatedBy: null,
};

function open(address: string, answers: Parameters<typeof fakeServer>[0] = {}, role: Role = 'engineer') {
  const asked = fakeServer({
    'GET /api/auth/me': () => json(sessionOf(role)),
    'GET /api/conditions': () => json({ items: [named], total: 1 }),
    'POST /api/rankings/op-amps': (body) => json(exampleRanking(body as RankingRequest).answer),
    ...answers,
  });
  const router = renderApp(address);
  const ranked = () =>
    asked
      .filter(({ route }) => route === 'POST /api/rankings/op-amps')
      .map(({ body }) => body as RankingRequest);
  return { asked, router, ranked };
}

const answer = () => screen.findByText(/^VR-1108: /, { selector: 'h1 *' });

async function type(label: string, text: string) {
  const field = screen.getByLabelText(label);
  await userEvent.clear(field);
  await userEvent.type(field, `${text}{Enter}`);
}

describe('the rank page', () => {
  it('opens with the team’s first named conditions', async () => {
    const { router, ranked } = open('/rank');
    expect(await answer()).toBeInTheDocument();
    expect(router.state.location.search).toBe('?stage=non-inverting&rs=375&named=4&part=2');
    expect(ranked()[0].conditions.source.resistance).toBe(375);
    expect(screen.getByRole('heading', { name: 'River geophone' })).toBeInTheDocument();
    expect(screen.getByRole('button', { name: /^saved/ })).toBeInTheDocument();
  });

  it('ranks the conditions of its address and says so in figures', async () => {
    open('/rank?stage=non-inverting&rs=4k7&target=1m');
    const heading = (await answer()).closest('h1')!;
    expect(heading).toHaveTextContent(
      /VR-1108: [\d.]+\s[nµ]V rms, [\d.]+\sdB above what the source itself makes\.$/,
    );
    expect(screen.getByText(/2 parts meet the target of 1\.00\smV/)).toBeInTheDocument();
    const grid = screen.getByRole('region', { name: 'Ranking' });
    expect(await within(grid).findByText('LQ-12')).toBeInTheDocument();
    expect(within(grid).getByText(/source floor, 4\.7\skΩ at 25\s°C/)).toBeInTheDocument();
  });

  it('ranks again when a value of the schematic is changed, and back undoes it', async () => {
    const { router, ranked } = open('/rank?stage=non-inverting');
    await answer();
    await type('source resistance', '4k7');
    await waitFor(() => expect(ranked().at(-1)!.conditions.source.resistance).toBe(4700));
    expect(router.state.location.search).toBe('?stage=non-inverting&rs=4.7k');
    await router.navigate(-1);
    await waitFor(() => expect(screen.getByLabelText('source resistance')).toHaveValue('1 kΩ'));
  });

  it('keeps the ranking and says what to mend where values contradict each other', async () => {
    const { ranked } = open('/rank?stage=non-inverting');
    await answer();
    await type('upper band limit', '5');
    expect(await screen.findByText(/a frequency above the lower limit was expected/)).toBeInTheDocument();
    expect(screen.getAllByText(/ranking from before: mend “upper band limit”/).length).toBeGreaterThan(0);
    expect(screen.getByText('VR-1108', { selector: 'strong' })).toBeInTheDocument();
    expect(ranked()).toHaveLength(1);
  });

  it('keeps the ranking where a text can’t be read, until it is given up', async () => {
    open('/rank?stage=non-inverting');
    await answer();
    await type('source resistance', 'much');
    expect(await screen.findByText(/“much” is not a resistance/)).toBeInTheDocument();
    expect(screen.getByRole('region', { name: 'Ranking' })).toHaveAttribute('aria-busy', 'true');
    await userEvent.type(screen.getByLabelText('source resistance'), '{Escape}');
    await waitFor(() => expect(screen.queryByText(/is not a resistance/)).not.toBeInTheDocument());
    expect(screen.getByRole('region', { name: 'Ranking' })).toHaveAttribute('aria-busy', 'false');
  });

  it('ranks with the example’s value where the address can’t be read, and says so at the field', async () => {
    const { ranked } = open('/rank?stage=non-inverting&gain=lots');
    await answer();
    expect(ranked()[0].conditions.stage.gain).toBe(100);
    expect(screen.getByText(/the address said “lots”/)).toBeInTheDocument();
  });

  it('shows what the server refuses at the field and keeps the ranking', async () => {
    const errors = [{ field: 'conditions.stage.gain', message: 'gain: too much of it' }];
    open('/rank?stage=non-inverting', {
      'POST /api/rankings/op-amps': (body) => {
        const request = body as RankingRequest;
        if (request.conditions.stage.gain === 100) return json(exampleRanking(request).answer);
        return problem(422, 'conditions.invalid', { detail: 'These conditions can’t be met.', errors });
      },
    });
    await answer();
    await type('gain', '900');
    expect(await screen.findByText('gain: too much of it')).toBeInTheDocument();
    expect(screen.getByText('VR-1108', { selector: 'strong' })).toBeInTheDocument();
  });

  it('says that the ranking is the one from before while the server can’t be reached', async () => {
    open('/rank?stage=non-inverting', {
      'POST /api/rankings/op-amps': (body) => {
        const request = body as RankingRequest;
        if (request.conditions.stage.gain === 100) return json(exampleRanking(request).answer);
        return problem(503, 'server.unreachable', { detail: 'The database doesn’t answer.' });
      },
    });
    await answer();
    await type('gain', '900');
    expect(
      await screen.findByText('This is the ranking from before. The database doesn’t answer.', {
        selector: 'p',
      }),
    ).toBeInTheDocument();
  });

  it('takes a range that is typed for the band, ± for a supply, and undoes each in one step', async () => {
    const { router, ranked } = open('/rank?stage=non-inverting');
    await answer();
    await type('lower band limit', '1–500 kHz');
    await waitFor(() => expect(ranked().at(-1)?.conditions.band).toMatchObject({ lower: 1e3, upper: 500e3 }));
    await type('supply, lowest', '±15 V');
    await waitFor(() => expect(ranked().at(-1)?.filter?.supply).toEqual({ minimum: 30, maximum: 30 }));
    await type('supply, highest', '5-36 V');
    await waitFor(() => expect(ranked().at(-1)?.filter?.supply).toEqual({ minimum: 5, maximum: 36 }));
    await act(() => router.navigate(-3));
    expect(screen.getByLabelText('lower band limit')).toHaveValue('20 Hz');
  });

  it('says which limit leaves all parts out', async () => {
    const excluded = { total: 7, reasons: [{ reason: 'too-few-channels', count: 7 }] };
    open('/rank?stage=non-inverting&ch=9', {
      'POST /api/rankings/op-amps': (body) =>
        json({ ...rankingOf(body as RankingRequest, []), excluded, quietSet: { total: 0 } }),
    });
    expect(await screen.findByRole('heading', { name: 'No part is ranked.' })).toBeInTheDocument();
    expect(screen.getByText(/7 of them: too few channels\. Lower the channels\./)).toBeInTheDocument();
  });

  it('folds out the parts that are left out, with their reasons', async () => {
    const { part } = rankedItem(exampleRequest('non-inverting'), 9, 'SB-7');
    open('/rank?stage=non-inverting', {
      'POST /api/rankings/op-amps': (body) =>
        json({
          ...exampleRanking(body as RankingRequest).answer,
          excluded: { total: 1, reasons: [{ reason: 'too-slow', count: 1 }] },
        }),
      'POST /api/rankings/op-amps/exclusions': () =>
        json({ items: [{ part, reason: 'too-slow', detail: 'too slow: 38 kHz' }], total: 1 }),
    });
    const button = await screen.findByRole('button', { name: '1 part left out' });
    expect(button).toHaveAttribute('aria-expanded', 'false');
    await userEvent.click(button);
    expect(await screen.findByRole('row', { name: /SB-7.*too slow: 38 kHz/ })).toBeInTheDocument();
  });

  it('explains the selected part and keeps it selected when it ranks again', async () => {
    open('/rank?stage=non-inverting&part=2');
    await answer();
    expect(await screen.findByRole('region', { name: 'Noise budget of LQ-12' })).toHaveTextContent(
      /% of the noise/,
    );
    await type('gain', '50');
    await waitFor(() => expect(screen.getByLabelText('gain')).toHaveValue('50'));
    expect(screen.getByRole('region', { name: 'Noise budget of LQ-12' })).toBeInTheDocument();
    expect(
      screen.getByRole('img', { name: /Noise over source resistance: .*VR-1108, LQ-12/ }),
    ).toBeInTheDocument();
  });

  it('asks for the noise indices where there is a direct output voltage', async () => {
    const { router, ranked } = open('/rank?stage=non-inverting');
    await answer();
    expect(screen.queryByLabelText('noise index of the gain resistors')).toBeNull();
    await type('direct output voltage', '2.5 V');
    await type('noise index of the gain resistors', '-20 dB');
    await waitFor(() => expect(ranked().at(-1)!.conditions.stage.gainNoiseIndex).toBe(-20));
    expect(router.state.location.search).toBe('?stage=non-inverting&vout=2.5&nig=-20dB');
  });

  it('changes the stage and what the form asks for', async () => {
    const { ranked } = open('/rank?stage=non-inverting');
    await answer();
    await userEvent.click(screen.getByRole('radio', { name: 'Transimpedance' }));
    expect(await screen.findByLabelText('feedback capacitance')).toBeInTheDocument();
    await waitFor(() => expect(ranked().at(-1)!.conditions.stage.feedbackCapacitance).toBe('auto'));
    expect(screen.queryByLabelText('gain')).not.toBeInTheDocument();
  });
});

describe('named conditions', () => {
  async function choose(action: string) {
    await userEvent.click(screen.getByRole('button', { name: /named conditions$/ }));
    await userEvent.click(await screen.findByRole('menuitem', { name: action }));
  }

  it('are marked as changed, and saved with the version that was read', async () => {
    const { asked } = open('/rank?stage=non-inverting&rs=400&named=4', {
      'PATCH /api/conditions/4': () => json({ ...named, version: 3 }),
    });
    await answer();
    expect(await screen.findByRole('button', { name: /^changed/ })).toBeInTheDocument();
    await choose('Save the changes');
    await waitFor(() => expect(asked.some(({ route }) => route === 'PATCH /api/conditions/4')).toBe(true));
    const patch = asked.find(({ route }) => route === 'PATCH /api/conditions/4')!;
    expect(patch.body).toMatchObject({
      version: 2,
      filter: {},
      conditions: { source: { resistance: 400 } },
      partIds: ['1'],
    });
  });

  it('are marked as changed where another part is chosen at them', async () => {
    open('/rank?stage=non-inverting&rs=375&named=4&part=1');
    await answer();
    await choose('Back to what is saved');
    expect(await screen.findByRole('button', { name: /^saved/ })).toBeInTheDocument();
    expect(await screen.findByRole('region', { name: 'Noise budget of LQ-12' })).toBeInTheDocument();
  });

  it('are saved under another name', async () => {
    const { router } = open('/rank?stage=non-inverting', {
      'POST /api/conditions': (body) => json({ ...named, ...(body as object), id: '9' }, 201),
    });
    await answer();
    await choose('Save as…');
    await userEvent.type(screen.getByLabelText('Name of the conditions'), 'Borehole{Enter}');
    await waitFor(() => expect(router.state.location.search).toBe('?stage=non-inverting&named=9'));
  });

  it.each([
    [402, 'access.plan', /plan holds no more named conditions/],
    [409, 'conditions.duplicate', /of this name already/],
  ])('say in words why the server refuses with %d', async (status, code, words) => {
    open('/rank?stage=non-inverting', { 'POST /api/conditions': () => problem(status, code) });
    await answer();
    await choose('Save as…');
    await userEvent.type(screen.getByLabelText('Name of the conditions'), 'Borehole{Enter}');
    expect(await screen.findByRole('alert')).toHaveTextContent(words);
  });

  it('say that somebody else changed them', async () => {
    open('/rank?stage=non-inverting&rs=400&named=4', {
      'PATCH /api/conditions/4': () => problem(409, 'conditions.stale'),
    });
    await answer();
    await screen.findByRole('button', { name: /^changed/ });
    await choose('Save the changes');
    expect(await screen.findByText(/Somebody else changed these conditions/)).toBeInTheDocument();
  });

  it('come back when their deletion is undone', async () => {
    const { asked } = open('/rank?stage=non-inverting&rs=375&named=4', {
      'DELETE /api/conditions/4': () => new Response(null, { status: 204 }),
      'POST /api/conditions': (body) => json({ ...named, ...(body as object), id: '9' }, 201),
    });
    await answer();
    await screen.findByRole('button', { name: /^saved/ });
    await choose('Delete');
    await userEvent.click(await screen.findByRole('button', { name: 'Undo' }));
    await waitFor(() =>
      expect(asked.find(({ route }) => route === 'POST /api/conditions')?.body).toMatchObject({
        name: 'River geophone',
        conditions: { source: { resistance: 375 } },
      }),
    );
  });

  it('can be chosen but not saved by who may not', async () => {
    open('/rank?stage=non-inverting', {}, 'purchasing');
    await answer();
    await userEvent.click(screen.getByRole('button', { name: /named conditions$/ }));
    expect(await screen.findByRole('menuitem', { name: 'River geophone' })).toBeInTheDocument();
    expect(screen.queryByRole('menuitem', { name: 'Save as…' })).not.toBeInTheDocument();
  });
});
