import { it } from 'vitest';
import { evaluateStage } from '../src/noise/index.js';
import { stageModel } from '../src/noise/stage/stageModel.js';
import { checkConditions } from '../src/conditions/index.js';
import { bruteForce } from './support/bruteForce.js';
let seed = 12345;
const rnd = () => { seed = (seed * 1664525 + 1013904223) >>> 0; return seed / 2 ** 32; };
const log = (a: number, b: number) => a * (b / a) ** rnd();
const maybe = <T,>(p: number, v: () => T, e: T) => (rnd() < p ? v() : e);
it('fuzz', () => {
  const rows: any[] = [];
  for (let n = 0; n < 500; n++) {
    const topology = ['non-inverting', 'inverting', 'transimpedance'][n % 3] as any;
    const lower = log(1e-2, 1e4);
    const upper = lower * log(2, 1e6);
    const ti = topology === 'transimpedance';
    const source = { resistance: ti ? log(1e3, 1e10) : log(1, 1e6), inductance: ti ? 0 : maybe(0.7, () => log(1e-7, 10), 0), capacitance: maybe(0.8, () => log(1e-12, 1e-6), 0) };
    const stage: any = ti ? { topology, feedbackResistance: log(1e3, 1e9), feedbackCapacitance: maybe(0.5, () => log(1e-14, 1e-10), 0) }
      : topology === 'inverting' ? { topology, gain: log(0.1, 1000), gainResistance: maybe(0.8, () => log(1, 1e5), 0), biasResistance: maybe(0.5, () => log(1, 1e5), 0) }
      : { topology, gain: maybe(0.8, () => log(1, 1000), 1), gainResistance: log(1, 1e4), ...(rnd() < 0.4 ? { loadResistance: log(1e2, 1e7) } : {}) };
    const conditions: any = { source, ambientTemperature: 300, band: { lower, upper, lowPassOrder: Math.floor(rnd() * 5) }, stage, referenceFrequency: lower * (upper / lower) ** rnd(), bandwidthMargin: 0, amplifierTemperatureModel: 'none' };
    const amp = { voltageNoise: log(1e-9, 1e-7), voltageNoiseCorner: maybe(0.5, () => log(1, 1e4), 0), currentNoise: log(1e-16, 1e-11), currentNoiseCorner: maybe(0.5, () => log(1, 1e4), 0), gainBandwidth: maybe<number|null>(0.8, () => log(1e4, 1e9), null), inputCapacitance: maybe(0.7, () => log(1e-13, 1e-10), 0) };
    if (checkConditions({ conditions }).length) { console.log(checkConditions({conditions})); continue; }
    const model = stageModel(conditions);
    if (amp.gainBandwidth === null && conditions.band.lowPassOrder === 1 && model.growth(amp.inputCapacitance) === 2) continue;
    if (rnd()<0) continue;
    const own = evaluateStage(conditions, amp);
    const b = bruteForce(conditions, amp);
    const err = own.outputNoiseRms / b.outputNoiseRms - 1;
    const errs = Object.entries(b.contributions).filter(([, v]) => v > b.inputNoiseRms*1e-6).map(([k, v]) => Math.abs((own.contributions as any)[k] / v - 1));
    rows.push({ n, err, cerr: Math.max(...errs), q: model.quality(amp.gainBandwidth ?? Infinity, amp.inputCapacitance), conditions, amp });
  }
  rows.sort((a, b) => Math.abs(b.err) - Math.abs(a.err));
  console.log(rows.length, 'over 1e-4:', rows.filter((r) => Math.abs(r.err) > 1e-4).length, 'over 1e-3:', rows.filter((r) => Math.abs(r.err) > 1e-3).length, 'contrib over 1e-3', rows.filter((r) => r.cerr > 1e-3).length);
  for (const r of rows.slice(0, 25)) console.log(r.n, r.err.toExponential(2), r.cerr.toExponential(2), 'Q', r.q, JSON.stringify(r.conditions.source), JSON.stringify(r.conditions.stage), JSON.stringify(r.conditions.band), 'ref', r.conditions.referenceFrequency, JSON.stringify(r.amp));
}, 300000);
