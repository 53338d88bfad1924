import type { OpAmpParameterKey } from './opAmpParameters.js';
import type { InputType, Origin } from './vocabulary.js';

/**
 * An op-amp's parameters in SI units, as API, database and noise model use them; `null` = unknown.
 * Only the voltage noise is always known.
 */
export type Amplifier = { inputType: InputType | null; channels: number; voltageNoise: number } & Record<
  Exclude<OpAmpParameterKey, 'channels' | 'voltageNoise'>,
  number | null
>;

/** Where each known figure comes from; a parameter that isn't listed is a data sheet's typical value. */
export type AmplifierOrigins = Partial<Record<OpAmpParameterKey, Origin>>;
