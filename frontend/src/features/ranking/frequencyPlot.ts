import type { OperatingConditions } from '@roothertz/common/conditions';
import { densitySpectrum } from '@roothertz/common/noise';
import type { Amplifier } from '@roothertz/common/parts';
import type { CurvePoint, CurvesPlot } from '../../components/charts/curve';
import { decadesAround, logSteps } from '../../components/charts/logRange';
import type { PlottedPart } from './comparedPart';
import { densityKind } from './noiseUnit';
import { threeCurves } from './plotStyle';

const PER_DECADE = 30;

/** Noise density referred to the source over frequency, the band and half a decade around it. */
export function frequencyPlot(
  conditions: OperatingConditions,
  selected: PlottedPart,
  compared: PlottedPart | null,
): CurvesPlot {
  const { band, referenceFrequency, stage } = conditions;
  const frequencies = logSteps(...decadesAround([band.lower / 3, band.upper * 2]), PER_DECADE);
  const spectrum = (amplifier: Amplifier) => densitySpectrum(conditions, amplifier, frequencies);
  const ofSelected = spectrum(selected.amplifier);
  const densities = (points: ReturnType<typeof spectrum>): CurvePoint[] =>
    points.map(({ frequency, inputNoiseDensity }) => [frequency, inputNoiseDensity]);
  return {
    title: 'Density over frequency',
    x: { label: 'frequency', kind: 'frequency' },
    y: { label: 'input noise density', kind: densityKind(stage.topology) },
    curves: threeCurves(
      ofSelected.map(({ frequency, contributions }) => [frequency, contributions.source]),
      compared && { name: compared.partNumber, points: densities(spectrum(compared.amplifier)) },
      { name: selected.partNumber, points: densities(ofSelected) },
    ),
    mark: { at: referenceFrequency, label: 'reference frequency' },
  };
}
