import type { RankingRequest, ResistorRankingRequest } from '@roothertz/common/conditions';
import { screen, waitFor, within } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { describe, expect, it } from 'vitest';
import type { RankingItem } from '../../api/ranking';
import type { StageRequest } from '../../api/stages';
import { exampleRanking } from '../../test/exampleRanking';
import { resistor, sessionOf } from '../../test/factories';
import { fakeServer, json } from '../../test/fakeServer';
import { rankingOf } from '../../test/rankings';
import { renderApp } from '../../test/renderApp';
import { rankedResistor, rankedStage, resistorRankingOf, stageRankingOf } from '../../test/stages';

/** A computed style goes through the rules of grid and controls each time, which takes seconds; none matters here. */
window.getComputedStyle = (element) => (element as HTMLElement).style;

const STAGES = 'POST /api/rankings/stages';
const RESISTORS = 'POST /api/rankings/resistors';
const MAP = 'POST /api/rankings/quietest-map';

function mapOf() {
  const [leader, second] = exampleRanking().items;
  return {
    resistances: [10, 1000, 100e3],
    frequencies: [10, 1000, 100e3],
    parts: [leader.part, second.part],
    winners: [
      [0, 0, 0],
      [0, 0, 1],
      [1, 1, -1],
    ],
    libraryRevision: '1.1',
  };
}

function open(address: string, answers: Parameters<typeof fakeServer>[0] = {}) {
  const asked = fakeServer({
    'GET /api/auth/me': () => json(sessionOf('engineer')),
    'GET /api/conditions': () => json({ items: [], total: 0 }),
    'POST /api/rankings/op-amps': (body) => json(exampleRanking(body as RankingRequest).answer),
    [STAGES]: (body) => {
      const request = body as StageRequest;
      const items = [rankedStage(request, 1, 'VR-1108'), rankedStage(request, 2, 'LQ-12')];
      return json(stageRankingOf(request, items));
    },
    [RESISTORS]: () => json(resistorRankingOf([rankedResistor(1, 'TR-08-1K00')])),
    [MAP]: () => json(mapOf()),
    ...answers,
  });
  const router = renderApp(address);
  const bodies = <Body,>(route: string) =>
    asked.filter((one) => one.route === route).map(({ body }) => body as Body);
  return { router, bodies };
}

const answer = (text: RegExp) => screen.findByText(text, { selector: 'h1 *' });

async function type(label: string, text: string) {
  const field = screen.getByLabelText(label);
  await userEvent.clear(field);
  await userEvent.type(field, `${text}{Enter}`);
}

describe('whole stages', () => {
  it('are ranked at the conditions when their view is chosen, which the address keeps', async () => {
    const { router, bodies } = open('/rank?stage=non-inverting&rs=4.7k&net=2k');
    await answer(/^VR-1108: /);
    await userEvent.click(screen.getByRole('radio', { name: 'Whole stages' }));
    expect(await answer(/^VR-1108 with 5\sΩ and 500\sΩ: [\d.]+\s.V rms$/)).toBeInTheDocument();
    expect(router.state.location.search).toBe('?stage=non-inverting&rs=4.7k&net=2k&view=stages');
    const [{ conditions }] = bodies<StageRequest>(STAGES);
    expect(conditions.source.resistance).toBe(4700);
    expect(conditions.stage).toMatchObject({
      gain: 100,
      gainTolerance: 0.01,
      network: { minimumTotal: 2000, maximumTotal: 100e3 },
    });
    const grid = screen.getByRole('region', { name: 'Whole stages' });
    expect(await within(grid).findAllByText('TN-500R')).toHaveLength(2);
    expect(screen.getByRole('region', { name: 'Noise budget of VR-1108' })).toBeInTheDocument();
  });

  it('are sought again when their own fields change, and keep them when the conditions do', async () => {
    const { router, bodies } = open('/rank?stage=non-inverting&view=stages');
    await answer(/^VR-1108 with/);
    await type('channels in parallel, at most', '4');
    await waitFor(() =>
      expect(bodies<StageRequest>(STAGES).at(-1)!.conditions.stage.parallelMaximum).toBe(4),
    );
    await type('gain', '50');
    await waitFor(() => expect(router.state.location.search).toContain('gain=50'));
    expect(router.state.location.search).toMatch(/view=stages&par=4/);
  });

  it('say at the field that the network’s limits contradict each other', async () => {
    open('/rank?stage=non-inverting&view=stages');
    await answer(/^VR-1108 with/);
    await type('network, at most', '100');
    expect(await screen.findByText(/not below what the output drives/)).toBeInTheDocument();
    expect(screen.getAllByText(/from before: mend “network, at most”/).length).toBeGreaterThan(0);
  });

  it('tell the nearest gain where no pair gives the wanted one', async () => {
    open('/rank?stage=non-inverting&view=stages', {
      [STAGES]: (body) =>
        json(stageRankingOf(body as StageRequest, [], { total: 0, pairs: 0, nearestGain: 103.2 })),
    });
    expect(await answer(/No resistor pair gives a gain of 100\./)).toBeInTheDocument();
    expect(screen.getByText(/a gain of 103\.2, 3\.2\s% off: widen the tolerance/)).toBeInTheDocument();
  });
});

describe('whole stages by price', () => {
  const priceOf = (amount: string) => ({ amount, currency: 'EUR', total: amount, isStale: false });
  const withPrices = (body: unknown) => {
    const request = body as StageRequest;
    const dear = { ...rankedStage(request, 1, 'VR-1108'), unitPrice: priceOf('8.20') };
    const cheap = { ...rankedStage(request, 2, 'LQ-12'), unitPrice: priceOf('1.22'), channelsInParallel: 2 };
    const { rank: _rank, ...other } = { ...cheap, channelsInParallel: 1, unitPrice: priceOf('1.10') };
    return json(stageRankingOf(request, [dear, cheap], { frontier: [dear, other] }));
  };

  it('are sought within so many dB of the quietest, with the technologies chosen', async () => {
    const { router, bodies } = open('/rank?stage=non-inverting&view=stages', { [STAGES]: withPrices });
    await answer(/^VR-1108 with/);
    await userEvent.selectOptions(screen.getByLabelText('sorted by'), 'price');
    await answer(/^VR-1108 with .*: €8\.20/);
    await type('within', '2 dB');
    await userEvent.click(screen.getByRole('button', { name: /^technology of the resistors: any/ }));
    await userEvent.click(screen.getByRole('checkbox', { name: 'thin film' }));
    const last = () => bodies<StageRequest>(STAGES).at(-1)!;
    await userEvent.selectOptions(screen.getByLabelText('tolerance of the resistors at most'), '0.01');
    await waitFor(() =>
      expect(last().resistorFilter).toEqual({ technology: ['thin-film'], tolerance: 0.01 }),
    );
    expect(last()).toMatchObject({ sort: 'unitPrice', within: 2 });
    expect(router.state.location.search).toBe(
      '?stage=non-inverting&view=stages&by=unitPrice&within=2dB&tech=thin-film&tol=1%25',
    );
  });

  it('are drawn with their frontier, of which each stage can be selected', async () => {
    const { router } = open('/rank?stage=non-inverting&view=stages', { [STAGES]: withPrices });
    await answer(/^VR-1108 with/);
    await userEvent.click(screen.getByRole('tab', { name: 'Price' }));
    const chart = await screen.findByRole('application', { name: /^Noise against price/ });
    expect(screen.getByText(/^VR-1108 with .*: €8\.20 at 1, .* on the frontier$/)).toBeInTheDocument();
    chart.focus();
    await userEvent.keyboard('{ArrowLeft}');
    expect(screen.getByText(/^LQ-12 with .*: €1\.22 at 1, [^,]*$/)).toBeInTheDocument();
    await userEvent.keyboard('{ArrowLeft}{Enter}');
    await waitFor(() => expect(router.state.location.search).toContain('part=2.1.901.902'));
    const parts = screen.getByRole('region', { name: 'Parts of the stage with LQ-12' });
    expect(within(parts).getByRole('row', { name: /a stage\s+€1\.10/ })).toBeInTheDocument();
  });

  it('hand their network to the schematic, and back undoes it', async () => {
    const { router, bodies } = open('/rank?stage=non-inverting&view=stages&vout=5', { [STAGES]: withPrices });
    await answer(/^VR-1108 with/);
    await userEvent.click(
      await screen.findByRole('button', { name: 'Take this network into the schematic' }),
    );
    await answer(/^VR-1108: /);
    const { stage } = bodies<RankingRequest>('POST /api/rankings/op-amps').at(-1)!.conditions;
    const { noiseIndex } = resistor().resistor;
    expect(stage).toMatchObject({
      gain: 101,
      gainResistance: 5,
      outputVoltage: 5,
      gainNoiseIndex: noiseIndex,
    });
    await router.navigate(-1);
    expect(await answer(/^VR-1108 with/)).toBeInTheDocument();
  });

  it('say what the network taken gives instead of what was wanted, and are sought for that again', async () => {
    const { router, bodies } = open('/rank?stage=non-inverting&view=stages', { [STAGES]: withPrices });
    await userEvent.click(
      await screen.findByRole('button', { name: 'Take this network into the schematic' }),
    );
    expect(
      await screen.findByText(/^The resistors taken give a gain of 101; 100 was wanted\./),
    ).toBeVisible();
    await userEvent.click(screen.getByRole('button', { name: 'Seek whole stages for 100 again' }));
    await answer(/^VR-1108 with/);
    expect(bodies<StageRequest>(STAGES).at(-1)!.conditions.stage.gain).toBe(100);
    expect(router.state.location.search).not.toContain('want');
  });

  it('count the excess noise of their resistors in budget and levers', async () => {
    const { router, bodies } = open('/rank?stage=non-inverting&view=stages&vout=5', { [STAGES]: withPrices });
    await answer(/^VR-1108 with/);
    const levers = await screen.findByRole('region', { name: 'Levers for VR-1108' });
    expect(within(levers).queryByRole('button', { name: /^Lower the gain resistance/ })).toBeNull();
    await userEvent.click(
      within(levers).getByRole('button', { name: /^Halve the direct output voltage to 2\.5\sV/ }),
    );
    await waitFor(() =>
      expect(bodies<StageRequest>(STAGES).at(-1)!.conditions.stage.outputVoltage).toBe(2.5),
    );
    expect(router.state.location.search).toContain('vout=2.5');
  });
});

describe('noise against price', () => {
  it('selects an op-amp, and lists those without a price', async () => {
    const price = { amount: '3.20', currency: 'EUR' } as RankingItem['unitPrice'];
    const { router } = open('/rank?stage=non-inverting&part=2', {
      'POST /api/rankings/op-amps': (body) => {
        const { request, items } = exampleRanking(body as RankingRequest);
        const [first, second] = items;
        const priced = { ...first, unitPrice: price };
        return json(rankingOf(request, [priced, second], { frontier: [priced as never] }));
      },
    });
    await answer(/^VR-1108: /);
    await userEvent.click(screen.getByRole('tab', { name: 'Price' }));
    expect(await screen.findByText('What is selected has no price.')).toBeInTheDocument();
    expect(screen.getByText('Without a price: LQ-12.')).toBeInTheDocument();
    screen.getByRole('application', { name: /^Noise against price/ }).focus();
    await userEvent.keyboard('{ArrowRight}{Enter}');
    await waitFor(() => expect(router.state.location.search).toContain('part=1'));
    expect(await screen.findByText(/^VR-1108: €3\.20 at 1, .* on the frontier$/)).toBeInTheDocument();
  });

  it('says where prices come from where there are none', async () => {
    open('/rank?stage=non-inverting');
    await answer(/^VR-1108: /);
    await userEvent.click(screen.getByRole('tab', { name: 'Price' }));
    expect(await screen.findByText(/^Nothing that is ranked has a price\./)).toBeInTheDocument();
  });
});

describe('resistors', () => {
  it('are ranked for a place that the schematic’s resistors can fill', async () => {
    const { router, bodies } = open('/rank?stage=non-inverting&view=resistors&vr=2');
    await answer(/^TR-08-1K00: 100\snV rms$/);
    await userEvent.click(screen.getByRole('button', { name: 'as R f' }));
    await waitFor(() => expect(router.state.location.search).toContain('r=990'));
    const last = () => bodies<ResistorRankingRequest>(RESISTORS).at(-1)!.conditions;
    await waitFor(() =>
      expect(last()).toMatchObject({ resistance: 990, dcVoltage: 2, band: { upper: 20e3 } }),
    );
    expect(screen.getByRole('region', { name: 'Resistors' })).toBeInTheDocument();
    expect(screen.getByRole('link', { name: 'TR-08-1K00' })).toHaveAttribute('href', '/parts/resistors/61');
  });

  it('fold out those that are left out', async () => {
    const item = rankedResistor(2, 'TR-04-1K00');
    open('/rank?stage=non-inverting&view=resistors&vr=30', {
      [RESISTORS]: () =>
        json(
          resistorRankingOf([], {
            excluded: { total: 1, reasons: [{ reason: 'over-rating', count: 1 }] },
          }),
        ),
      'POST /api/rankings/resistors/exclusions': () =>
        json({
          items: [{ part: item.part, reason: 'over-rating', detail: 'would dissipate 900 mW' }],
          total: 1,
        }),
    });
    await answer(/No resistor is ranked/);
    await userEvent.click(screen.getByRole('button', { name: '1 part left out' }));
    expect(
      await screen.findByRole('row', { name: /TR-04-1K00.*would dissipate 900 mW/ }),
    ).toBeInTheDocument();
  });
});

describe('levers', () => {
  it('have a sentence each, and are tried by a click that back undoes', async () => {
    const { router, bodies } = open('/rank?stage=non-inverting&part=2');
    await answer(/^VR-1108: /);
    const levers = await screen.findByRole('region', { name: 'Levers for LQ-12' });
    const halve = within(levers).getByRole('button', { name: /^Halve the band to 10\skHz\s?−[\d.]+\sdB$/ });
    expect(halve).toHaveAccessibleDescription(/^White noise power goes with the bandwidth/);
    await userEvent.click(halve);
    const upper = () => bodies<RankingRequest>('POST /api/rankings/op-amps').at(-1)!.conditions.band.upper;
    await waitFor(() => expect(upper()).toBe(10e3));
    expect(router.state.location.search).toContain('f2=10k');
    await router.navigate(-1);
    await waitFor(() => expect(screen.getByLabelText('upper band limit')).toHaveValue('20 kHz'));
  });

  it('only tell of a transformer or of channels in parallel, and select the quieter part', async () => {
    const { router } = open('/rank?stage=non-inverting&part=2');
    await answer(/^VR-1108: /);
    const levers = await screen.findByRole('region', { name: 'Levers for LQ-12' });
    const before = router.state.location.search;
    const parallel = within(levers).getByRole('button', { name: /in parallel/ });
    expect(parallel).toHaveAttribute('aria-disabled', 'true');
    await userEvent.click(parallel);
    expect(router.state.location.search).toBe(before);
    await userEvent.click(within(levers).getByRole('button', { name: /^Take VR-1108/ }));
    expect(await screen.findByRole('region', { name: 'Levers for VR-1108' })).toBeInTheDocument();
  });

  it('name the library of a quieter part that has the number of the selected one', async () => {
    open('/rank?stage=non-inverting&part=2', {
      'POST /api/rankings/op-amps': (body) => {
        const { answer: ranking } = exampleRanking(body as RankingRequest);
        const [leader, second] = ranking.items;
        const twin = { ...leader, part: { ...leader.part, partNumber: 'LQ-12', library: 'team' as const } };
        return json({
          ...ranking,
          items: [twin, { ...second, part: { ...second.part, library: 'curated' } }],
        });
      },
    });
    const levers = await screen.findByRole('region', { name: 'Levers for LQ-12' });
    expect(within(levers).getByRole('button', { name: /^Take LQ-12 \(own\)/ })).toBeInTheDocument();
  });
});

describe('the quietest map', () => {
  it('is looked at with the arrow keys, and Enter moves the conditions there', async () => {
    const { router, bodies } = open('/rank?stage=non-inverting');
    await answer(/^VR-1108: /);
    await userEvent.click(screen.getByRole('tab', { name: 'Quietest map' }));
    const map = await screen.findByRole('application', { name: /^Quietest map/ });
    expect(screen.getByText(/^Present conditions, 1\skΩ, 1\skHz: VR-1108/)).toBeInTheDocument();
    map.focus();
    await userEvent.keyboard('{ArrowRight}{ArrowDown}');
    expect(screen.getByText(/^100\skΩ, 10\sHz: LQ-12/)).toBeInTheDocument();
    await userEvent.keyboard('{Enter}');
    await waitFor(() => expect(router.state.location.search).toContain('rs=100k'));
    expect(router.state.location.search).toMatch(/f1=316m.*f2=316.*fref=10/);
    expect(await screen.findByText(/^Present conditions, 100\skΩ, 10\sHz: LQ-12/)).toBeInTheDocument();
    expect(bodies(MAP)).toHaveLength(1);
  });

  it('lists its parts with their share', async () => {
    open('/rank?stage=non-inverting');
    await answer(/^VR-1108: /);
    await userEvent.click(screen.getByRole('tab', { name: 'Quietest map' }));
    const legend = await screen.findByRole('list', { name: 'Parts of the map' });
    expect(
      within(legend)
        .getAllByRole('listitem')
        .map(({ textContent }) => textContent),
    ).toEqual(['VR-1108 56\u2009%', 'LQ-12 33\u2009%']);
  });
});
