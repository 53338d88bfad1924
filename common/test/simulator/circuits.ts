import type { OperatingConditions } from '../../src/conditions/index.js';
import type { KnownAmplifier } from '../support/nodalAnalysis.js';
import { addOpAmp, addShotNoise, addSource, Netlist } from './netlist.js';

/** The stage as a netlist: `out` is its output, `signal` the source that its noise is referred to. */
export interface SimulatedStage {
  netlist: Netlist;
  signal: 'vsig' | 'isig';
}

type Build = (netlist: Netlist, conditions: OperatingConditions, amplifier: KnownAmplifier) => void;

const nonInverting: Build = (netlist, conditions, amplifier) => {
  const { stage, ambientTemperature } = conditions;
  const { gain = 1, gainResistance = 0, loadResistance } = stage;
  netlist.add('vsig sig 0 dc 0 ac 1');
  addSource(netlist, conditions, 'plus', 'sig');
  netlist.capacitor('plus', '0', amplifier.inputCapacitance);
  if (loadResistance !== undefined) netlist.resistor('plus', '0', loadResistance, ambientTemperature, 'bias');
  const feedback = gain > 1 ? gainResistance * (gain - 1) : 0;
  netlist.resistor('out', 'minus', feedback, ambientTemperature, 'feedback');
  if (gain > 1) netlist.resistor('minus', '0', gainResistance, ambientTemperature, 'feedback');
  addOpAmp(netlist, amplifier, { plus: 'plus', minus: 'minus', out: 'out' });
};

const inverting: Build = (netlist, conditions, amplifier) => {
  const { stage, source, ambientTemperature } = conditions;
  const { gain = 1, gainResistance = 0, biasResistance = 0 } = stage;
  netlist.add('vsig sig 0 dc 0 ac 1');
  addSource(netlist, conditions, 'leg', 'sig');
  netlist.resistor('leg', 'minus', gainResistance, ambientTemperature, 'feedback');
  const feedback = gain * (source.resistance + gainResistance);
  netlist.resistor('out', 'minus', feedback, ambientTemperature, 'feedback');
  netlist.resistor('plus', '0', biasResistance, ambientTemperature, 'bias');
  netlist.capacitor('minus', '0', amplifier.inputCapacitance);
  addOpAmp(netlist, amplifier, { plus: 'plus', minus: 'minus', out: 'out' });
};

const transimpedance: Build = (netlist, { stage, source, ambientTemperature }, amplifier) => {
  const { feedbackResistance = 1, feedbackCapacitance = 0 } = stage;
  const capacitance = source.capacitance + amplifier.inputCapacitance;
  // Graeme 1996: maximally flat.
  const flat = Math.sqrt(
    capacitance / (Math.PI * feedbackResistance * (amplifier.gainBandwidth ?? Infinity)),
  );
  netlist.add('isig 0 minus dc 0 ac 1');
  netlist.resistor('minus', '0', source.resistance, source.temperature ?? ambientTemperature, 'source');
  netlist.capacitor('minus', '0', capacitance);
  netlist.resistor('out', 'minus', feedbackResistance, ambientTemperature, 'feedback');
  netlist.capacitor('out', 'minus', feedbackCapacitance === 'auto' ? flat : feedbackCapacitance);
  netlist.resistor('plus', '0', 0, ambientTemperature, 'bias');
  addShotNoise(netlist, 'minus', source.directCurrent ?? 0);
  addOpAmp(netlist, amplifier, { plus: 'plus', minus: 'minus', out: 'out' });
};

/** Half of the EMF on each leg, against ground. */
function addLegs(netlist: Netlist, conditions: OperatingConditions, legs: readonly [string, string]): void {
  netlist.add('vsig sig 0 dc 0 ac 1');
  legs.forEach((leg, n) => {
    netlist.add(`eleg${n}`, `emf${n}`, 0, 'sig', 0, n === 0 ? 0.5 : -0.5);
    addSource(netlist, conditions, leg, `emf${n}`, 1 / 2);
  });
}

const difference: Build = (netlist, conditions, amplifier) => {
  const { stage, source, ambientTemperature } = conditions;
  const { gain = 1, gainResistance = 0 } = stage;
  addLegs(netlist, conditions, ['legp', 'legm']);
  const feedback = gain * (gainResistance + source.resistance / 2);
  netlist.resistor('legp', 'plus', gainResistance, ambientTemperature, 'feedback');
  netlist.resistor('legm', 'minus', gainResistance, ambientTemperature, 'feedback');
  netlist.resistor('plus', '0', feedback, ambientTemperature, 'feedback');
  netlist.resistor('out', 'minus', feedback, ambientTemperature, 'feedback');
  for (const input of ['plus', 'minus']) netlist.capacitor(input, '0', amplifier.inputCapacitance);
  addOpAmp(netlist, amplifier, { plus: 'plus', minus: 'minus', out: 'out' });
};

const instrumentation: Build = (netlist, conditions, amplifier) => {
  const { stage, ambientTemperature } = conditions;
  const { gain = 1, gainResistance = 0, loadResistance, differenceResistance = 10e3 } = stage;
  addLegs(netlist, conditions, ['plusa', 'plusb']);
  const network = (from: string, to: string, resistance: number) =>
    netlist.resistor(from, to, resistance, ambientTemperature, 'feedback');
  for (const n of ['a', 'b']) {
    if (loadResistance !== undefined)
      netlist.resistor(`plus${n}`, '0', loadResistance, ambientTemperature, 'bias');
    network(`out${n}`, `minus${n}`, gain > 1 ? (gainResistance * (gain - 1)) / 2 : 0);
    addOpAmp(netlist, amplifier, { plus: `plus${n}`, minus: `minus${n}`, out: `out${n}` });
  }
  if (gain > 1) network('minusa', 'minusb', gainResistance);
  network('outa', 'plus', differenceResistance);
  network('outb', 'minus', differenceResistance);
  network('plus', '0', differenceResistance);
  network('out', 'minus', differenceResistance);
  for (const input of ['plusa', 'minusa', 'plusb', 'minusb', 'plus', 'minus'])
    netlist.capacitor(input, '0', amplifier.inputCapacitance);
  addOpAmp(netlist, amplifier, {
    plus: 'plus',
    minus: 'minus',
    out: 'out',
    plusCounts: 'amplifierCurrentFeedback',
  });
};

const BUILDS = { 'non-inverting': nonInverting, inverting, transimpedance, difference, instrumentation };

/** The circuit of a stage, made from its conditions and nothing else. */
export function simulatedStage(conditions: OperatingConditions, amplifier: KnownAmplifier): SimulatedStage {
  const netlist = new Netlist();
  const { topology } = conditions.stage;
  BUILDS[topology](netlist, conditions, amplifier);
  return { netlist, signal: topology === 'transimpedance' ? 'isig' : 'vsig' };
}
