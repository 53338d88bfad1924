import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import type { OperatingConditions, PartFilter } from '../../src/conditions/index.js';
import {
  evaluateStage,
  EXCLUSION_REASONS,
  findExcluded,
  ORIGIN_SPREAD,
  rankAmplifiers,
  RANKING_SORTS,
  type ExcludedPart,
  type NoiseParameter,
  type PartPlace,
  type RankingQuery,
} from '../../src/noise/index.js';
import type { Amplifier } from '../../src/parts/index.js';
import { anyStage, libraryParts, seeded } from '../support/arbitraries.js';
import { libraryOf, type LibraryPart } from '../support/stages.js';

const libraries = fc.array(fc.array(libraryParts, { maxLength: 25 }), { minLength: 1, maxLength: 3 });
const selective = anyStage.map((conditions) => ({ ...conditions, bandwidthMargin: 1 }));
const ALL = { filter: {}, target: {}, descending: false, limit: 1000, offset: 0 };
/** Parts that are ranked together share quadratures of their own, good to 0.1 %. */
const TOLERANCE = 1e-3;

const rank = (parts: LibraryPart[][], query: Pick<RankingQuery, 'conditions'> & Partial<RankingQuery>) =>
  rankAmplifiers({ ...ALL, sort: 'inputNoiseRms', ...query }, parts.map(libraryOf));

const place = ({ library, row }: PartPlace) => `${library}/${row}`;
const near = (a: number, b: number) => Math.abs(a - b) <= TOLERANCE * Math.max(Math.abs(a), Math.abs(b));

describe('a ranking of any libraries', () => {
  it('holds each part with the figures that its stage has alone', () => {
    fc.assert(
      fc.property(anyStage, libraries, (conditions, parts) => {
        for (const { figures, library, row } of rank(parts, { conditions }).items) {
          const alone = evaluateStage(conditions, parts[library][row].amplifier);
          expect(figures.cautions).toEqual(alone.cautions);
          expect(figures.signalGain).toBeCloseTo(alone.signalGain, 9);
          for (const sort of RANKING_SORTS) {
            if (alone[sort] === null) expect(figures[sort]).toBeNull();
            else if (sort === 'noiseFigure' || sort === 'aboveFloor')
              expect(Math.abs(figures[sort]! - alone[sort])).toBeLessThan(0.01);
            else expect(near(figures[sort]!, alone[sort]), sort).toBe(true);
          }
        }
      }),
      seeded(120),
    );
  });

  it.each(RANKING_SORTS)('by %s ascends, or descends, and has parts without the figure last', (sort) => {
    fc.assert(
      fc.property(anyStage, libraries, fc.boolean(), (conditions, parts, descending) => {
        const { items } = rank(parts, { conditions, sort, descending });
        expect(items.map((item) => item.rank)).toEqual(items.map((_, index) => index + 1));
        const keys = items.map(({ figures }) => figures[sort]);
        for (let i = 1; i < keys.length; i++) {
          const [before, after] = [keys[i - 1], keys[i]];
          if (after === null) continue;
          expect(before).not.toBeNull();
          const slack = 1e-9 * Math.abs(after) + 1e-12;
          if (descending) expect(before! + slack).toBeGreaterThanOrEqual(after);
          else expect(before! - slack).toBeLessThanOrEqual(after);
        }
      }),
      seeded(15),
    );
  });

  it('comes in pages that join without a gap or an overlap', () => {
    const sizes = fc.integer({ min: 1, max: 9 });
    const sorts = fc.constantFrom(...RANKING_SORTS);
    fc.assert(
      fc.property(
        anyStage,
        libraries,
        sizes,
        sorts,
        fc.boolean(),
        (conditions, parts, limit, sort, descending) => {
          const query = { conditions, sort, descending };
          const whole = rank(parts, query);
          const joined = [];
          for (let offset = 0; offset < whole.total; offset += limit)
            joined.push(...rank(parts, { ...query, limit, offset }).items);
          expect(joined).toEqual(whole.items);
        },
      ),
      seeded(25),
    );
  });

  it('ranks or excludes each part once, but for those that aren’t sought', () => {
    const filters: fc.Arbitrary<PartFilter> = fc.record(
      {
        search: fc.constantFrom('', 'low', 'ALDER noise', 'none such'),
        lifecycle: fc.constant(['active' as const]),
        inputType: fc.constantFrom(['bipolar' as const], ['jfet' as const, 'cmos' as const]),
        channels: fc.integer({ min: 1, max: 4 }),
        supply: fc.constantFrom({ minimum: 5, maximum: 5 }, { minimum: 3, maximum: 12 }),
      },
      { requiredKeys: [] },
    );
    fc.assert(
      fc.property(selective, libraries, filters, (conditions, parts, filter) => {
        const { items, excluded, total } = rank(parts, { conditions, filter });
        const left = findExcluded({ conditions, filter }, parts.map(libraryOf), ALL);
        const sought = parts.flatMap((library, index) =>
          library.flatMap(({ name }, row) =>
            (filter.search ?? '')
              .toLowerCase()
              .split(' ')
              .every((word) => name!.includes(word))
              ? [place({ library: index, row })]
              : [],
          ),
        );
        expect([...items, ...left.items].map(place).sort()).toEqual(sought.sort());
        expect(excluded).toEqual({ total: left.items.length, reasons: countedReasons(left.items) });
        expect(left.total).toBe(left.items.length);
        expect(total).toBe(items.length);
      }),
      seeded(60),
    );
  });
});

/** How often each reason stands among excluded parts, the most frequent one first. */
function countedReasons(excluded: readonly ExcludedPart[]) {
  return EXCLUSION_REASONS.map((reason) => ({
    reason,
    count: excluded.filter((part) => part.reason === reason).length,
  }))
    .filter(({ count }) => count > 0)
    .sort((a, b) => b.count - a.count);
}

/** One sigma of a part's total below and above it, from the changes of its stage's power, parameter by parameter. */
function spreadOf(conditions: OperatingConditions, { amplifier, origins = {} }: LibraryPart) {
  const figures = evaluateStage(conditions, amplifier);
  const power = (changes: Partial<Amplifier>) =>
    evaluateStage(conditions, { ...amplifier, ...changes }).outputNoiseRms ** 2;
  const total = figures.outputNoiseRms ** 2;
  const { amplifierVoltage, amplifierCurrentSource, amplifierCurrentFeedback } = figures.contributions;
  const atOutput = (...rms: number[]) => (Math.hypot(...rms) * figures.signalGain) ** 2;
  const shares: Record<NoiseParameter, number> = {
    voltageNoise: atOutput(amplifierVoltage),
    voltageNoiseCorner: (total - power({ voltageNoiseCorner: 0 })) / 2,
    currentNoise: atOutput(amplifierCurrentSource, amplifierCurrentFeedback),
    currentNoiseCorner: (total - power({ currentNoiseCorner: 0 })) / 2,
  };
  const sigma = (side: 'below' | 'above') =>
    (figures.inputNoiseRms *
      Math.hypot(
        ...Object.entries(shares).map(
          ([key, share]) => share * ORIGIN_SPREAD[origins[key as NoiseParameter] ?? 'typical'][side],
        ),
      )) /
    total;
  return { rms: figures.inputNoiseRms, below: sigma('below'), above: sigma('above') };
}

describe('the quiet set of any libraries', () => {
  const quietPlaces = (parts: LibraryPart[][], conditions: OperatingConditions) =>
    rank(parts, { conditions }).items.filter(({ quietSet }) => quietSet);

  it('holds the leader, and as many parts as it says', () => {
    fc.assert(
      fc.property(anyStage, libraries, (conditions, parts) => {
        const ranking = rank(parts, { conditions });
        if (ranking.total > 0) expect(ranking.items[0].quietSet).toBe(true);
        const quiet = ranking.items.filter(({ quietSet }) => quietSet);
        expect(rank(parts, { conditions, limit: 1 }).quietSetTotal).toBe(quiet.length);
        expect(ranking.quietSetTotal).toBe(quiet.length);
      }),
      seeded(120),
    );
  });

  it('is what its definition makes: T − T_best ≤ √(σ_below² + σ_above,best²)', () => {
    let inside = 0;
    let outside = 0;
    fc.assert(
      fc.property(anyStage, libraries, (conditions, parts) => {
        const { items } = rank(parts, { conditions });
        fc.pre(items.length > 0);
        const spreads = items.map(({ library, row }) => spreadOf(conditions, parts[library][row]));
        const best = spreads.reduce((least, spread) => (spread.rms < least.rms ? spread : least));
        items.forEach(({ quietSet }, k) => {
          const reach = Math.hypot(spreads[k].below, best.above);
          const margin = reach - (spreads[k].rms - best.rms);
          if (Math.abs(margin) < 3 * TOLERANCE * spreads[k].rms) return;
          expect(quietSet).toBe(margin > 0);
          if (quietSet) inside++;
          else outside++;
        });
      }),
      seeded(120),
    );
    expect(Math.min(inside, outside)).toBeGreaterThan(100);
  });

  it('never loses a part whose figures become less certain', () => {
    const measured = libraries.map((parts) =>
      parts.map((library) =>
        library.map((part): LibraryPart => ({
          ...part,
          origins: {
            voltageNoise: 'measured',
            voltageNoiseCorner: 'measured',
            currentNoise: 'measured',
            currentNoiseCorner: 'measured',
          },
        })),
      ),
    );
    const parameters = fc.constantFrom<NoiseParameter>(
      'voltageNoise',
      'voltageNoiseCorner',
      'currentNoise',
      'currentNoiseCorner',
    );
    fc.assert(
      fc.property(anyStage, measured, parameters, fc.nat(), (conditions, parts, parameter, choice) => {
        const quiet = quietPlaces(parts, conditions);
        fc.pre(quiet.length > 0);
        const { library, row } = quiet[choice % quiet.length];
        const widened = structuredClone(parts);
        widened[library][row].origins![parameter] = 'typical';
        expect(quietPlaces(widened, conditions).map(place)).toContain(place({ library, row }));
      }),
      seeded(120),
    );
  });
});
