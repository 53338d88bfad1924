import type { OperatingConditions } from '../../src/conditions/index.js';
import {
  CONTRIBUTORS,
  shotPowerDensity,
  thermalPowerDensity,
  type Contributor,
} from '../../src/noise/index.js';
import { solveTransposed, type ComplexMatrix } from './complexMatrix.js';

/** An amplifier with nothing unknown but, perhaps, its gain–bandwidth product. */
export interface KnownAmplifier {
  voltageNoise: number;
  voltageNoiseCorner: number;
  currentNoise: number;
  currentNoiseCorner: number;
  gainBandwidth: number | null;
  inputCapacitance: number;
}

interface Branch {
  from: number;
  to: number;
  resistance: number;
  inductance?: number;
  temperature: number;
  contributor: Contributor;
}

interface Circuit {
  branches: Branch[];
  capacitors: { from: number; to: number; capacitance: number }[];
  signal:
    'emf of the first branch' | 'half an emf on each of the first two branches' | 'current into the − input';
  /** the one amplifier between + input, − input and output where left out */
  amplifiers?: { plus: number; minus: number; out: number }[];
  /** inputs whose current noise counts as that of the feedback network; the − input where left out */
  feedbackInputs?: number[];
}

const GROUND = 0;
const PLUS = 1;
const MINUS = 2;
const OUT = 3;
const SOURCE = 4;
const OTHER_SOURCE = 5;
const SINGLE = { plus: PLUS, minus: MINUS, out: OUT };

function nonInverting({ source, stage, ...rest }: OperatingConditions, inputCapacitance: number): Circuit {
  const ambient = { temperature: rest.ambientTemperature };
  const { gain = 1, gainResistance = 0, loadResistance } = stage;
  const branch = (from: number, to: number, resistance: number, contributor: Contributor): Branch => ({
    from,
    to,
    resistance,
    contributor,
    ...ambient,
  });
  const feedback =
    gain > 1
      ? [
          branch(MINUS, GROUND, gainResistance, 'feedback'),
          branch(OUT, MINUS, gainResistance * (gain - 1), 'feedback'),
        ]
      : [branch(OUT, MINUS, 0, 'feedback')];
  return {
    branches: [
      sourceBranch(source, PLUS, rest.ambientTemperature),
      ...feedback,
      ...(loadResistance === undefined ? [] : [branch(PLUS, GROUND, loadResistance, 'bias')]),
    ],
    capacitors: [{ from: PLUS, to: GROUND, capacitance: source.capacitance + inputCapacitance }],
    signal: 'emf of the first branch',
  };
}

function inverting({ source, stage, ...rest }: OperatingConditions, inputCapacitance: number): Circuit {
  const temperature = rest.ambientTemperature;
  const { gain = 1, gainResistance = 0, biasResistance = 0 } = stage;
  const feedbackResistance = gain * (source.resistance + gainResistance);
  return {
    branches: [
      sourceBranch(source, SOURCE, temperature),
      { from: SOURCE, to: MINUS, resistance: gainResistance, temperature, contributor: 'feedback' },
      { from: OUT, to: MINUS, resistance: feedbackResistance, temperature, contributor: 'feedback' },
      { from: PLUS, to: GROUND, resistance: biasResistance, temperature, contributor: 'bias' },
    ],
    capacitors: [
      { from: SOURCE, to: GROUND, capacitance: source.capacitance },
      // Inside e_n: between the − input and the + input's noise-free side, which an ideal bias resistor grounds.
      { from: MINUS, to: GROUND, capacitance: inputCapacitance },
    ],
    signal: 'emf of the first branch',
  };
}

function transimpedance({ source, stage, ...rest }: OperatingConditions, inputCapacitance: number): Circuit {
  const temperature = rest.ambientTemperature;
  const { feedbackResistance = 1, feedbackCapacitance = 0 } = stage;
  if (feedbackCapacitance === 'auto') throw new Error('state the feedback capacitance');
  return {
    branches: [
      {
        from: MINUS,
        to: GROUND,
        resistance: source.resistance,
        temperature: source.temperature ?? temperature,
        contributor: 'source',
      },
      { from: OUT, to: MINUS, resistance: feedbackResistance, temperature, contributor: 'feedback' },
      { from: PLUS, to: GROUND, resistance: 0, temperature, contributor: 'bias' },
    ],
    capacitors: [
      { from: MINUS, to: GROUND, capacitance: source.capacitance + inputCapacitance },
      { from: OUT, to: MINUS, capacitance: feedbackCapacitance },
    ],
    signal: 'current into the − input',
  };
}

function difference({ source, stage, ...rest }: OperatingConditions, inputCapacitance: number): Circuit {
  const temperature = rest.ambientTemperature;
  const { gain = 1, gainResistance = 0 } = stage;
  const half = { ...source, resistance: source.resistance / 2, inductance: source.inductance / 2 };
  const feedback = (from: number, to: number, resistance: number): Branch => ({
    from,
    to,
    resistance,
    temperature,
    contributor: 'feedback',
  });
  const feedbackResistance = gain * (half.resistance + gainResistance);
  return {
    branches: [
      sourceBranch(half, SOURCE, temperature),
      sourceBranch(half, OTHER_SOURCE, temperature),
      feedback(SOURCE, MINUS, gainResistance),
      feedback(OTHER_SOURCE, PLUS, gainResistance),
      feedback(OUT, MINUS, feedbackResistance),
      feedback(PLUS, GROUND, feedbackResistance),
    ],
    capacitors: [
      { from: SOURCE, to: GROUND, capacitance: 2 * source.capacitance },
      { from: OTHER_SOURCE, to: GROUND, capacitance: 2 * source.capacitance },
      { from: MINUS, to: GROUND, capacitance: inputCapacitance },
      { from: PLUS, to: GROUND, capacitance: inputCapacitance },
    ],
    signal: 'half an emf on each of the first two branches',
  };
}

/** The input amplifiers of an instrumentation stage, before the third op-amp. */
const PAIR = [
  { plus: 4, minus: 5, out: 6, joins: MINUS },
  { plus: 7, minus: 8, out: 9, joins: PLUS },
];

function instrumentation({ source, stage, ...rest }: OperatingConditions, inputCapacitance: number): Circuit {
  const temperature = rest.ambientTemperature;
  const { gain = 1, gainResistance = 0, loadResistance, differenceResistance = 10e3 } = stage;
  const half = { ...source, resistance: source.resistance / 2, inductance: source.inductance / 2 };
  const branch = (from: number, to: number, resistance: number, contributor: Contributor): Branch => ({
    from,
    to,
    resistance,
    temperature,
    contributor,
  });
  const [one, other] = PAIR;
  return {
    branches: [
      ...PAIR.map(({ plus }) => sourceBranch(half, plus, temperature)),
      ...(loadResistance === undefined
        ? []
        : PAIR.map(({ plus }) => branch(plus, GROUND, loadResistance, 'bias'))),
      ...PAIR.map(({ out, minus }) => branch(out, minus, (gainResistance * (gain - 1)) / 2, 'feedback')),
      ...(gain > 1 ? [branch(one.minus, other.minus, gainResistance, 'feedback')] : []),
      ...PAIR.map(({ out, joins }) => branch(out, joins, differenceResistance, 'feedback')),
      branch(OUT, MINUS, differenceResistance, 'feedback'),
      branch(PLUS, GROUND, differenceResistance, 'feedback'),
    ],
    capacitors: [
      ...PAIR.map(({ plus }) => ({
        from: plus,
        to: GROUND,
        capacitance: 2 * source.capacitance + inputCapacitance,
      })),
      ...[one.minus, other.minus, MINUS, PLUS].map((from) => ({
        from,
        to: GROUND,
        capacitance: inputCapacitance,
      })),
    ],
    signal: 'half an emf on each of the first two branches',
    amplifiers: [...PAIR, SINGLE],
    feedbackInputs: [one.minus, other.minus, MINUS, PLUS],
  };
}

function sourceBranch(source: OperatingConditions['source'], to: number, ambient: number): Branch {
  const { resistance, inductance, temperature = ambient } = source;
  return { from: GROUND, to, resistance, inductance, temperature, contributor: 'source' };
}

const CIRCUITS = {
  'non-inverting': nonInverting,
  inverting,
  transimpedance,
  difference,
  instrumentation,
};

/** Output noise by contributor in V²/Hz at one frequency, and the signal's power gain there. */
export interface NodalSpot {
  powers: Record<Contributor, number>;
  gain2: number;
}

/**
 * The stage solved as a circuit, node by node, without any formula of the noise model: amplifier parameters
 * count as given (amplifier temperature model "none").
 */
export function nodalAnalysis(conditions: OperatingConditions, amplifier: KnownAmplifier) {
  const circuit = CIRCUITS[conditions.stage.topology](conditions, amplifier.inputCapacitance);
  return (frequency: number): NodalSpot => {
    const transfer = transfersToOutput(circuit, amplifier, frequency);
    const powers = Object.fromEntries(CONTRIBUTORS.map((key) => [key, 0])) as Record<Contributor, number>;
    circuit.branches.forEach(({ resistance, temperature, contributor }, k) => {
      powers[contributor] += thermalPowerDensity(temperature, frequency) * resistance * transfer.ofBranch(k);
    });
    powers.source += shotPowerDensity(conditions.source.directCurrent ?? 0) * transfer.ofCurrent(MINUS);
    const { voltageNoise, voltageNoiseCorner, currentNoise, currentNoiseCorner } = amplifier;
    const current2 = currentNoise ** 2 * (1 + currentNoiseCorner / frequency);
    const { amplifiers = [SINGLE], feedbackInputs = [MINUS] } = circuit;
    const inputs = amplifiers.flatMap(({ plus, minus }) => [plus, minus]);
    powers.amplifierVoltage =
      voltageNoise ** 2 *
      (1 + voltageNoiseCorner / frequency) *
      sum(amplifiers.map((_, k) => transfer.ofAmplifier(k)));
    for (const input of inputs) {
      const contributor = feedbackInputs.includes(input)
        ? 'amplifierCurrentFeedback'
        : 'amplifierCurrentSource';
      powers[contributor] += current2 * transfer.ofCurrent(input);
    }
    return { powers, gain2: signalGain2(circuit, transfer) };
  };
}

function signalGain2({ signal }: Circuit, transfer: ReturnType<typeof transfersToOutput>): number {
  if (signal === 'current into the − input') return transfer.ofCurrent(MINUS);
  return signal === 'emf of the first branch' ? transfer.ofBranch(0) : transfer.ofDifference(0, 1) / 4;
}

const sum = (values: number[]) => values.reduce((total, value) => total + value, 0);

/** Rows: currents into each node, one voltage law a branch, the amplifier's law. */
function transfersToOutput(circuit: Circuit, amplifier: KnownAmplifier, frequency: number) {
  const { branches, capacitors, amplifiers = [SINGLE] } = circuit;
  const nodes = Math.max(OUT, ...branches.flatMap(({ from, to }) => [from, to]));
  const size = nodes + branches.length + amplifiers.length;
  const matrix: ComplexMatrix = { size, re: new Float64Array(size ** 2), im: new Float64Array(size ** 2) };
  const angular = 2 * Math.PI * frequency;
  const add = (row: number, column: number, re: number, im = 0) => {
    matrix.re[row * size + column] += re;
    matrix.im[row * size + column] += im;
  };
  const node = (index: number) => index - 1;
  for (const { from, to, capacitance } of capacitors) {
    for (const [a, b] of [
      [from, to],
      [to, from],
    ]) {
      if (a === GROUND) continue;
      add(node(a), node(a), 0, angular * capacitance);
      if (b !== GROUND) add(node(a), node(b), 0, -angular * capacitance);
    }
  }
  branches.forEach(({ from, to, resistance, inductance = 0 }, k) => {
    const row = nodes + k;
    for (const [end, sign] of [
      [from, 1],
      [to, -1],
    ]) {
      if (end === GROUND) continue;
      add(node(end), row, sign);
      add(row, node(end), sign);
    }
    add(row, row, -resistance, -angular * inductance);
  });
  const law = (k: number) => nodes + branches.length + k;
  amplifiers.forEach(({ plus, minus, out }, k) => {
    add(node(out), law(k), 1);
    add(law(k), node(plus), 1);
    add(law(k), node(minus), -1);
    if (amplifier.gainBandwidth !== null) add(law(k), node(out), 0, -frequency / amplifier.gainBandwidth);
  });
  const { re, im } = solveTransposed(matrix, node(OUT));
  const square = (row: number) => re[row] ** 2 + im[row] ** 2;
  return {
    ofBranch: (k: number) => square(nodes + k),
    ofDifference: (a: number, b: number) =>
      (re[nodes + a] - re[nodes + b]) ** 2 + (im[nodes + a] - im[nodes + b]) ** 2,
    ofCurrent: (index: number) => square(node(index)),
    ofAmplifier: (k: number) => square(law(k)),
  };
}
