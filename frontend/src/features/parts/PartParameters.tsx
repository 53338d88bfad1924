import { OP_AMP_PARAMETERS, ORIGIN_LABELS } from '@roothertz/common/parts';
import type { OpAmp } from '../../api/opAmps';
import { Facts } from '../../components/Facts';
import { Unknown } from '../../components/Figure';
import { formatEditable } from '@roothertz/common/units';
import { hasOrigin, parameterLabel } from './ParameterItem';
import { originOf } from './partValues';

/** Every parameter of a part and where its figure comes from. */
export function PartParameters({ part: { amplifier, origins } }: { part: OpAmp }) {
  const entries = OP_AMP_PARAMETERS.map((parameter) => {
    const { key, kind } = parameter;
    const value = amplifier[key];
    return {
      term: parameterLabel(parameter),
      value: value === null ? <Unknown /> : formatEditable(value, kind),
      note: value === null || !hasOrigin(parameter) ? undefined : ORIGIN_LABELS[originOf(origins[key])],
    };
  });
  return <Facts label="Parameters" entries={entries} />;
}
