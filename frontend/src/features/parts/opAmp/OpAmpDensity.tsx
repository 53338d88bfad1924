import { useMemo } from 'react';
import type { OpAmp } from '../../../api/opAmps';
import type { CurvesPlot } from '../../../components/charts/curve';
import { CurvesChart } from '../../../components/charts/CurvesChart';
import { currentPlot, voltagePlot } from './densityPlots';

const HEIGHT = 190;

/** How the two noise generators of an op-amp go over frequency. */
export function OpAmpDensity({ part: { partNumber, amplifier } }: { part: OpAmp }) {
  const voltage = useMemo(() => voltagePlot(partNumber, amplifier), [partNumber, amplifier]);
  const current = useMemo(() => currentPlot(partNumber, amplifier), [partNumber, amplifier]);
  return (
    <>
      <CurvesChart plot={voltage} height={HEIGHT} />
      {hasCurve(current) ? (
        <CurvesChart plot={current} height={HEIGHT} />
      ) : (
        <p style={{ color: 'var(--muted)' }}>No current noise is known that could be drawn.</p>
      )}
    </>
  );
}

function hasCurve({ curves }: CurvesPlot): boolean {
  return curves.some(({ points }) => points.some(([, density]) => density > 0));
}
