const BOLTZMANN = 1.380649e-23;
const AMBIENT = 298.15;
const RESISTANCE = 600;
const [LOWER, UPPER] = [20, 20_000];
const [GAIN, GAIN_RESISTANCE] = [100, 10];
const MARGIN = 3;
const PAGE = 50;

const ranking = (source) => ({
  conditions: {
    source,
    ambientTemperature: AMBIENT,
    band: { lower: LOWER, upper: UPPER, lowPassOrder: 0 },
    stage: { topology: 'non-inverting', gain: GAIN, gainResistance: GAIN_RESISTANCE },
    referenceFrequency: 1000,
    bandwidthMargin: MARGIN,
    amplifierTemperatureModel: 'none',
  },
  filter: { library: ['team'], lifecycle: ['active'], approval: ['approved'] },
  limit: PAGE,
});

/** The two rankings that are timed. */
export const RANKINGS = {
  resistive: ranking({ resistance: RESISTANCE }),
  reactive: ranking({ resistance: RESISTANCE, inductance: 0.1, capacitance: 1e-9 }),
};

/** The resistive case with an ideally fast amplifier: each generator's share of the squared rms, per unit of it. */
const NETWORK = GAIN_RESISTANCE * (1 - 1 / GAIN);
const FIXED = 4 * BOLTZMANN * AMBIENT * (RESISTANCE + NETWORK) * (UPPER - LOWER);
const WHITE = UPPER - LOWER;
const FLICKER = Math.log(UPPER / LOWER);
const CURRENT = RESISTANCE ** 2 + NETWORK ** 2;
const LEAST_SPEED = MARGIN * UPPER * GAIN;

/** The same ranking as one query; its parameter is the library. */
export const SQL = `
  SELECT part.id, part.manufacturer, part.part_number, SQRT(${FIXED}
    + op_amp.voltage_noise * op_amp.voltage_noise * (${WHITE} + op_amp.voltage_noise_corner * ${FLICKER})
    + op_amp.current_noise * op_amp.current_noise * (${WHITE} + op_amp.current_noise_corner * ${FLICKER}) * ${CURRENT}
  ) AS input_noise
  FROM parts part JOIN op_amps op_amp ON op_amp.part_id = part.id
  WHERE part.library_id = ? AND part.lifecycle IN ('active') AND part.approval IN ('approved')
    AND op_amp.gain_bandwidth >= ${LEAST_SPEED}
  ORDER BY input_noise LIMIT ${PAGE}`;

/** The same as a bare loop; answers nothing, so that the caller times it. */
export function loopOver({
  voltageNoise,
  voltageNoiseCorner,
  currentNoise,
  currentNoiseCorner,
  gainBandwidth,
}) {
  const totals = new Float64Array(voltageNoise.length);
  let count = 0;
  for (let row = 0; row < voltageNoise.length; row += 1) {
    if (gainBandwidth[row] < LEAST_SPEED) continue;
    totals[count] = Math.sqrt(
      FIXED +
        voltageNoise[row] ** 2 * (WHITE + voltageNoiseCorner[row] * FLICKER) +
        currentNoise[row] ** 2 * (WHITE + currentNoiseCorner[row] * FLICKER) * CURRENT,
    );
    count += 1;
  }
  totals.subarray(0, count).sort();
}
