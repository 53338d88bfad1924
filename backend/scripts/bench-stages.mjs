const AMPLIFIERS = 300;
const RESISTORS = 4000;

const CONDITIONS = {
  source: { resistance: 600, inductance: 0, capacitance: 0 },
  ambientTemperature: 298.15,
  band: { lower: 20, upper: 20_000, lowPassOrder: 0 },
  stage: {
    topology: 'non-inverting',
    gain: 100,
    gainTolerance: 0.01,
    network: { minimumTotal: 500, maximumTotal: 100_000 },
    parallelMaximum: 1,
  },
  referenceFrequency: 1000,
  bandwidthMargin: 0,
  amplifierTemperatureModel: 'none',
};

/** Every tenth op-amp and every seventh resistor is without a price. */
const PRICES = {
  quantity: 100,
  opAmp: ({ row }, pieces) => (row % 10 === 9 ? NaN : (3000 + ((row * 7919) % 80_000)) * pieces),
  resistor: (index, pieces) => (index % 7 === 6 ? NaN : (20 + ((index * 104_729) % 3000)) * pieces),
};

/**
 * Ranks whole stages by the pruned search, by noise and by price with its frontier, and by trying every pair of
 * resistors with every amplifier, on the same library; answers how many stages each evaluated and how long it
 * took, in ms.
 */
export async function compareStages(columns) {
  const noise = await import('@roothertz/common/noise');
  const library = amplifierLibrary(noise, columns);
  const resistors = await resistorLibrary();
  const page = { conditions: CONDITIONS, filter: {}, within: 1, limit: 50, offset: 0 };
  const pruned = timed(() => noise.rankStages({ ...page, sort: 'inputNoiseRms' }, [library], resistors));
  const priced = timed(() =>
    noise.rankStages({ ...page, sort: 'unitPrice', prices: PRICES }, [library], resistors),
  );
  const exhaustive = timed(() => tryAll(noise, library, resistors));
  const quietest = pruned.result.items[0].figures.inputNoiseRms;
  if (Math.abs(exhaustive.result.least / quietest - 1) > 1e-9) throw new Error('the two searches disagree');
  return {
    evaluations: pruned.result.evaluations.made,
    exhaustiveEvaluations: exhaustive.result.evaluations,
    time: pruned.time,
    pricedEvaluations: priced.result.evaluations.made,
    pricedTime: priced.time,
    exhaustiveTime: exhaustive.time,
  };
}

function timed(action) {
  const began = performance.now();
  return { result: action(), time: performance.now() - began };
}

function amplifierLibrary({ emptyColumns }, columns) {
  const library = emptyColumns(AMPLIFIERS);
  library.parameters.channels.fill(1);
  for (const [key, values] of Object.entries(columns))
    library.parameters[key].set(values.subarray(0, AMPLIFIERS));
  return library;
}

/** Values of several series over and over, as makers sell them. */
async function resistorLibrary() {
  const { preferredValuesBetween } = await import('@roothertz/common/parts');
  const values = [96, 192, 24].flatMap((series) => preferredValuesBetween(series, 1, 1e7));
  return Array.from({ length: RESISTORS }, (_, n) => ({
    resistance: values[n % values.length],
    noiseIndex: -30 + (n % 7) * 5,
  }));
}

function tryAll({ amplifierAt, stageNoise, withNetwork }, library, resistors) {
  const networks = allPairs(resistors);
  let evaluations = 0;
  let least = Infinity;
  for (let row = 0; row < library.count; row += 1) {
    const amplifier = amplifierAt(library, row);
    for (const network of networks) {
      least = Math.min(least, stageNoise(withNetwork(CONDITIONS, network), amplifier));
      evaluations += 1;
    }
  }
  return { evaluations, least };
}

function allPairs(resistors) {
  const { gain: wanted, gainTolerance, network } = CONDITIONS.stage;
  const pairs = [];
  for (const { resistance: gainResistance } of resistors) {
    for (const { resistance: feedbackResistance } of resistors) {
      const gain = 1 + feedbackResistance / gainResistance;
      const total = gainResistance + feedbackResistance;
      const fits = total >= network.minimumTotal && total <= network.maximumTotal;
      if (fits && Math.abs(gain - wanted) <= gainTolerance * wanted)
        pairs.push({ gain, gainResistance, feedbackResistance });
    }
  }
  return pairs;
}
