import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { amplifierWith, libraryOf } from '../../../test/support/stages.js';
import { prepareBlockBounds } from './blockBound.js';
import { Blocks, type Block } from './blocks.js';
import { CandidateGroup } from './candidateGroup.js';
import { Candidate, noiseOf } from './candidates.js';
import { leastInSeries } from './leastInSeries.js';
import type { Network, SoughtConditions } from './stageSearch.js';

/** Spread evenly along the logarithm. */
const logarithmic = (from: number, to: number) =>
  fc
    .double({ min: Math.log(from), max: Math.log(to), noNaN: true })
    .map((logarithm) => Math.min(to, Math.max(from, Math.exp(logarithm))));
const reactance = (from: number, to: number) => fc.option(logarithmic(from, to), { freq: 2, nil: 0 });

const cases = fc.record({
  topology: fc.constantFrom('non-inverting', 'inverting', 'inverting', 'difference', 'instrumentation'),
  gain: logarithmic(1.3, 1000),
  source: fc.record({
    resistance: logarithmic(1, 1e6),
    inductance: reactance(1e-5, 10),
    capacitance: reactance(1e-12, 1e-7),
  }),
  upper: logarithmic(10, 1e6),
  lowPassOrder: fc.constantFrom(0, 0, 1, 2),
  outputVoltage: fc.constantFrom(undefined, 5),
  /** GBW over upper · gain */
  speed: logarithmic(0.1, 1e4),
  inputCapacitance: fc.constantFrom(0, 3e-12, 1e-10),
  voltageNoise: logarithmic(1e-9, 6e-8),
  currentNoise: logarithmic(1e-16, 5e-12),
  networks: fc.array(
    fc.record({ offGain: fc.double({ min: 0.99, max: 1.01, noNaN: true }), resistance: logarithmic(1, 1e5) }),
    { minLength: 9, maxLength: 24 },
  ),
});
type Case = typeof cases extends fc.Arbitrary<infer Value> ? Value : never;

function searchOf({ topology, gain, source, upper, lowPassOrder, outputVoltage }: Case): SoughtConditions {
  const network = { minimumTotal: 500, maximumTotal: 1e6 };
  return {
    source,
    ambientTemperature: 298.15,
    band: { lower: upper / 1000, upper, lowPassOrder },
    stage: { topology, gain, gainTolerance: 0.01, network, parallelMaximum: 1, outputVoltage },
    referenceFrequency: upper / 20,
    bandwidthMargin: 0,
    amplifierTemperatureModel: 'none',
  } as SoughtConditions;
}

function networksOf({ gain, networks, outputVoltage }: Case) {
  return networks.map(({ offGain, resistance }, n) => ({
    gain: gain * offGain,
    gainResistor: n,
    feedbackResistor: n,
    gainResistance: resistance,
    feedbackResistance: 0,
    price: n,
    ...(outputVoltage && { gainNoiseIndex: (n % 5) * 8 - 30, feedbackNoiseIndex: (n % 3) * 10 - 20 }),
  }));
}

function amplifierOf({ speed, gain, upper, inputCapacitance, voltageNoise, currentNoise }: Case) {
  const gainBandwidth = speed * gain * upper;
  return amplifierWith({ gainBandwidth, inputCapacitance, voltageNoise, currentNoise });
}

function withParts(blocks: Blocks, block: Block): Block[] {
  const halves = blocks.halves(block);
  return [block, ...(halves ?? []).flatMap((half) => withParts(blocks, half))];
}

describe('the bounds of networks', () => {
  it('lie below the noise of every network of a block, one by one and for many op-amps at once', () => {
    let near = 0;
    fc.assert(
      fc.property(cases, (one) => {
        const sought = searchOf(one);
        const library = libraryOf([{ amplifier: amplifierOf(one) }]);
        const blocks = new Blocks(networksOf(one), leastInSeries(sought));
        const candidate = new Candidate(library, 0, 0, 1, 0, 0);
        const noise = (network: Network) => noiseOf(sought, candidate, network);
        const boundOf = prepareBlockBounds(sought, (_, network) => noise(network));
        for (const block of withParts(blocks, blocks.whole())) {
          const least = Math.min(...block.networks.map(noise));
          const bound = boundOf(candidate, block);
          expect(bound).toBeLessThanOrEqual(least);
          if (bound > 0.9 * least) near++;
        }
        const group = new CandidateGroup(sought, library, 0, Uint32Array.of(0), 1);
        const [bound] = group.leastNoises(blocks);
        expect(bound).toBeLessThanOrEqual(Math.min(...blocks.whole().networks.map(noise)));
      }),
      { numRuns: 150, seed: 11 },
    );
    expect(near).toBeGreaterThan(150);
  });
});
