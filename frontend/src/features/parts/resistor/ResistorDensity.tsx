import { RESISTOR_CONDITION_FIELDS } from '@roothertz/common/conditions';
import { formatQuantity } from '@roothertz/common/units';
import { useMemo, useState } from 'react';
import type { StoredResistor } from '../../../api/resistors';
import { CurvesChart } from '../../../components/charts/CurvesChart';
import { QuantityInput } from '../../../components/QuantityInput';
import { resistorAt, type ResistorAt } from './resistorAt';
import styles from './ResistorDensity.module.css';
import { resistorPlot } from './resistorPlot';

const FIELD = RESISTOR_CONDITION_FIELDS['conditions.dcVoltage'];

/** How thermal and excess noise go over frequency under the direct voltage that is typed here. */
export function ResistorDensity({ part: { partNumber, resistor } }: { part: StoredResistor }) {
  const [dcVoltage, setVoltage] = useState(1);
  const at = useMemo(() => resistorAt(resistor, dcVoltage), [resistor, dcVoltage]);
  const plot = useMemo(() => resistorPlot(partNumber, resistor, at), [partNumber, resistor, at]);
  return (
    <>
      <label className={styles.voltage}>
        direct voltage across it
        <QuantityInput
          field={FIELD}
          value={dcVoltage}
          variant="inline"
          onCommit={(value) => value !== null && setVoltage(value)}
        />
      </label>
      <CurvesChart plot={plot} height={230} />
      <p className={at.isOverRating ? styles.over : styles.note} role="status">
        {sentence(at, resistor.powerRating)}
      </p>
    </>
  );
}

function sentence({ crossover, dcVoltage, dissipation, isOverRating }: ResistorAt, rating: number | null) {
  const show = (value: number, kind: 'power' | 'frequency') => formatQuantity(value, kind, { trim: true });
  if (isOverRating && rating !== null)
    return `It would dissipate ${show(dissipation, 'power')}, more than its rating of ${show(rating, 'power')}.`;
  if (dcVoltage === 0) return 'Without a direct voltage it makes thermal noise alone.';
  if (crossover === null) return 'Its noise index is unknown: no excess noise can be drawn.';
  return `Excess noise equals thermal noise at ${show(crossover, 'frequency')}; it dissipates ${show(dissipation, 'power')}.`;
}
