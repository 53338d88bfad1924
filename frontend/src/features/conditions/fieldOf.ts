import { CONDITION_FIELDS, type ConditionFieldPath, type Topology } from '@roothertz/common/conditions';
import type { QuantityField } from '@roothertz/common/parts';

/** What the catalogue says of a field; the target of a transimpedance stage is a current. */
export function fieldOf(path: ConditionFieldPath, topology: Topology): QuantityField {
  const field = CONDITION_FIELDS[path];
  return path === 'target.inputNoiseRms' && topology === 'transimpedance'
    ? { ...field, kind: 'current' }
    : field;
}
