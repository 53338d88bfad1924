import { leastCurrentNoise } from '@roothertz/common/noise';
import type { Amplifier } from '@roothertz/common/parts';
import type { CurvePoint, CurvesPlot } from '../../../components/charts/curve';
import { logSteps } from '../../../components/charts/logRange';

const FROM = 0.1;
const TO = 1e5;
const POINTS_PER_DECADE = 20;
const FREQUENCY = { label: 'frequency', kind: 'frequency' } as const;

/** Density e·√(1 + f_c/f) over frequency; an unknown corner counts as 0 Hz. */
function densityCurve(white: number, corner: number | null): CurvePoint[] {
  return logSteps(FROM, TO, POINTS_PER_DECADE).map((frequency) => [
    frequency,
    white * Math.sqrt(1 + (corner ?? 0) / frequency),
  ]);
}

export function voltagePlot(partNumber: string, amplifier: Amplifier): CurvesPlot {
  return {
    title: `Voltage noise density of ${partNumber}`,
    x: FREQUENCY,
    y: { label: 'voltage noise', kind: 'voltageNoiseDensity' },
    curves: [
      {
        name: 'e_n',
        points: densityCurve(amplifier.voltageNoise, amplifier.voltageNoiseCorner),
        colour: 'damson',
        stroke: 'solid',
      },
    ],
  };
}

/** The current noise, with the lower bound in place of an unknown one. */
export function currentPlot(partNumber: string, amplifier: Amplifier): CurvesPlot {
  const { currentNoise, inputType, inputBiasCurrent, currentNoiseCorner } = amplifier;
  const white = currentNoise ?? leastCurrentNoise(inputType, inputBiasCurrent);
  return {
    title: `Current noise density of ${partNumber}`,
    x: FREQUENCY,
    y: { label: 'current noise', kind: 'currentNoiseDensity' },
    curves: [
      {
        name: currentNoise === null ? 'i_n, at least' : 'i_n',
        points: densityCurve(white, currentNoiseCorner),
        colour: 'ochre',
        stroke: 'dashed',
      },
    ],
  };
}
