import type { OpAmpPart } from './amplifier.js';
import { checkOpAmp } from './checkOpAmp.js';
import { OP_AMP_PARAMETERS } from './opAmpParameters.js';
import type { PartCatalogue } from './partCatalogue.js';
import { INPUT_TYPE_FIELD } from './partFields.js';

export const OP_AMP_CATALOGUE: PartCatalogue<OpAmpPart> = {
  kind: 'op-amp',
  nominal: null,
  group: 'amplifier',
  choice: INPUT_TYPE_FIELD,
  parameters: OP_AMP_PARAMETERS,
  check: checkOpAmp,
};
