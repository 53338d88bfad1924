import type { OperatingConditions } from '@roothertz/common/conditions';
import { evaluateStage, sourceFloor } from '@roothertz/common/noise';
import type { Amplifier } from '@roothertz/common/parts';
import type { CurvePoint, CurvesPlot } from '../../components/charts/curve';
import { logSteps } from '../../components/charts/logRange';
import type { PlottedPart } from './comparedPart';
import { noiseKind } from './noiseUnit';
import { threeCurves } from './plotStyle';

const PER_DECADE = 10;

/** Total noise over the source's resistance, everything else as in the conditions. */
export function resistancePlot(
  conditions: OperatingConditions,
  selected: PlottedPart,
  compared: PlottedPart | null,
): CurvesPlot {
  const { resistance } = conditions.source;
  const steps = logSteps(...resistanceRange(resistance), PER_DECADE);
  const at = steps.map((step) => withResistance(conditions, step));
  const totals = (amplifier: Amplifier): CurvePoint[] =>
    at.map((changed, step) => [steps[step], evaluateStage(changed, amplifier).inputNoiseRms]);
  const floor = at.map((changed, step): CurvePoint => [steps[step], sourceFloor(changed).inputNoiseRms]);
  return {
    title: 'Noise over source resistance',
    x: { label: 'source resistance', kind: 'resistance' },
    y: { label: 'input noise rms', kind: noiseKind(conditions.stage.topology) },
    curves: threeCurves(
      floor,
      compared && { name: compared.partNumber, points: totals(compared.amplifier) },
      { name: selected.partNumber, points: totals(selected.amplifier) },
    ),
    mark: resistance > 0 ? { at: resistance, label: 'present resistance' } : undefined,
  };
}

/** Six decades or so with the present resistance among them. */
export function resistanceRange(present: number): [number, number] {
  const decade = present > 0 ? Math.log10(present) : 2.5;
  if (decade > 5.5) return decades(Math.ceil(decade) - 5, Math.ceil(decade) + 1);
  if (decade < 0.5) return decades(Math.floor(decade) - 1, Math.floor(decade) + 5);
  return decades(0, 6);
}

function decades(from: number, to: number): [number, number] {
  return [Number(`1e${from}`), Number(`1e${to}`)];
}

function withResistance(conditions: OperatingConditions, resistance: number): OperatingConditions {
  return { ...conditions, source: { ...conditions.source, resistance } };
}
