import { excessPowerDensity, thermalVoltageDensity } from '@roothertz/common/noise';
import type { Resistor } from '@roothertz/common/parts';
import { formatQuantity } from '@roothertz/common/units';
import type { Curve, CurvesPlot } from '../../../components/charts/curve';
import { logSteps } from '../../../components/charts/logRange';
import type { ResistorAt } from './resistorAt';

const FROM = 0.1;
const TO = 1e5;
const FREQUENCIES = logSteps(FROM, TO, 10);

/** Thermal and excess noise density of a resistor over frequency, under a direct voltage. */
export function resistorPlot(partNumber: string, resistor: Resistor, at: ResistorAt): CurvesPlot {
  const { crossover } = at;
  const isInPlot = crossover !== null && crossover >= FROM && crossover <= TO;
  return {
    title: `Noise density of ${partNumber}`,
    x: { label: 'frequency', kind: 'frequency' },
    y: { label: 'voltage noise', kind: 'voltageNoiseDensity' },
    curves: [thermalCurve(resistor, at), ...excessCurves(resistor, at)],
    ...(isInPlot && { mark: { at: crossover, label: 'excess equals thermal' } }),
  };
}

function thermalCurve({ resistance }: Resistor, { temperature }: ResistorAt): Curve {
  const density = thermalVoltageDensity(resistance, temperature);
  return {
    name: 'thermal',
    points: FREQUENCIES.map((frequency) => [frequency, density]),
    colour: 'verdigris',
    stroke: 'solid',
  };
}

/** No curve where nobody knows the noise index or no direct voltage makes excess noise. */
function excessCurves({ noiseIndex }: Resistor, { dcVoltage }: ResistorAt): Curve[] {
  if (noiseIndex === null || dcVoltage === 0) return [];
  return [
    {
      name: `excess at ${formatQuantity(dcVoltage, 'voltage', { trim: true })}`,
      points: FREQUENCIES.map((frequency) => [
        frequency,
        Math.sqrt(excessPowerDensity(noiseIndex, dcVoltage, frequency)),
      ]),
      colour: 'rust',
      stroke: 'dashed',
    },
  ];
}
