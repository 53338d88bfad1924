import type { OpAmpParameterKey } from './opAmpParameters.js';
import type { Origins, PartFields } from './part.js';
import type { InputType } from './vocabulary.js';

/**
 * An op-amp's parameters in SI units, as API, database and noise model use them; `null` = unknown.
 * Only the voltage noise is always known.
 */
export type Amplifier = { inputType: InputType | null; channels: number; voltageNoise: number } & Record<
  Exclude<OpAmpParameterKey, 'channels' | 'voltageNoise'>,
  number | null
>;

export type AmplifierOrigins = Origins<OpAmpParameterKey>;

/** An op-amp as a library keeps it. */
export interface OpAmpPart extends PartFields {
  amplifier: Amplifier;
  origins: AmplifierOrigins;
}
