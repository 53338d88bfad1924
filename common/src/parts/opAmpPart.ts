import type { Amplifier, AmplifierOrigins } from './amplifier.js';
import { OP_AMP_PARAMETERS } from './opAmpParameters.js';
import type { ParameterDefinition } from './parameter.js';
import type { Approval, Lifecycle } from './vocabulary.js';

/** An op-amp as a library keeps it, whoever brought it: form, API or CSV. */
export interface OpAmpPart {
  manufacturer: string;
  partNumber: string;
  description: string;
  package: string;
  lifecycle: Lifecycle;
  approval: Approval;
  amplifier: Amplifier;
  origins: AmplifierOrigins;
}

/** Whether a part can be kept without the parameter: not what is required, and not a count. */
export function canBeUnknown(parameter: ParameterDefinition): boolean {
  return !parameter.required && parameter.kind !== 'count';
}

/** The origins of the figures that are known: an unknown figure comes from nowhere. */
export function originsOfKnown(amplifier: Amplifier, origins: AmplifierOrigins): AmplifierOrigins {
  const known = OP_AMP_PARAMETERS.map(({ key }) => key).filter(
    (key) => amplifier[key] !== null && origins[key] !== undefined,
  );
  return Object.fromEntries(known.map((key) => [key, origins[key]]));
}
