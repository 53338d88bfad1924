import type { Range } from '@roothertz/common/units';
import { ConditionField } from './ConditionField';
import { useConditionsForm } from './ConditionsContext';
import { withBand } from './withBand';

/** Both limits of the band; a range such as "0.1-10 Hz", typed in either, states both. */
export function BandFields() {
  const { replace } = useConditionsForm();
  const setBoth = (range: Range) => replace((before) => withBand(before, range));
  return (
    <>
      <ConditionField path="conditions.band.lower" onRange={setBoth} /> to{' '}
      <ConditionField path="conditions.band.upper" onRange={setBoth} />
    </>
  );
}
