import { type ListedFields, ORIGIN_LABELS } from '@roothertz/common/parts';
import type { StoredPart } from '../../api/parts';
import { Facts } from '../../components/Facts';
import { Unknown } from '../../components/Figure';
import { formatEditable } from '@roothertz/common/units';
import { hasOrigin, parameterLabel } from './ParameterItem';
import { figureOf, figuresOf } from './partDraft';
import { originOf } from './partValues';

interface PartParametersProps {
  fields: ListedFields;
  part: StoredPart;
}

/** Every parameter of a part and where its figure comes from. */
export function PartParameters({ fields, part }: PartParametersProps) {
  const figures = figuresOf(fields, part);
  const entries = fields.parameters.map((parameter) => {
    const { key, kind } = parameter;
    const value = figureOf(figures, key);
    return {
      term: parameterLabel(parameter),
      value: value === null ? <Unknown /> : formatEditable(value, kind),
      note: value === null || !hasOrigin(parameter) ? undefined : ORIGIN_LABELS[originOf(part.origins[key])],
    };
  });
  return <Facts label="Parameters" entries={entries} />;
}
