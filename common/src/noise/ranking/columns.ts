import {
  INPUT_TYPES,
  OP_AMP_PARAMETERS,
  type Amplifier,
  type Approval,
  type InputType,
  type Lifecycle,
  type OpAmpParameterKey,
  type Origin,
} from '../../parts/index.js';

/** The parameters whose spread decides whether two parts can be told apart. */
export const NOISE_PARAMETERS = [
  'voltageNoise',
  'voltageNoiseCorner',
  'currentNoise',
  'currentNoiseCorner',
] as const satisfies readonly OpAmpParameterKey[];
export type NoiseParameter = (typeof NOISE_PARAMETERS)[number];

/** A library's op-amps as columns, one entry a part; built once per revision of the library. */
export interface AmplifierColumns {
  count: number;
  /** SI units; NaN = unknown */
  parameters: Record<OpAmpParameterKey, Float64Array>;
  inputType: (InputType | null)[];
  origins: Record<NoiseParameter, Origin[]>;
  lifecycle: Lifecycle[];
  approval: Approval[];
  package: string[];
  /** manufacturer, part number and description in lower case */
  searchText: string[];
}

/** The parameters of the part at a row, as API and noise model use them. */
export function amplifierAt(columns: AmplifierColumns, row: number): Amplifier {
  const amplifier: Record<string, number | string | null> = { inputType: columns.inputType[row] };
  for (const { key } of OP_AMP_PARAMETERS) {
    const value = columns.parameters[key][row];
    amplifier[key] = Number.isNaN(value) ? null : value;
  }
  return amplifier as unknown as Amplifier;
}

/** Room for a library of `count` op-amps; every parameter unknown, every origin typical. */
export function emptyColumns(count: number): AmplifierColumns {
  const unknown = () => new Float64Array(count).fill(NaN);
  return {
    count,
    parameters: Object.fromEntries(OP_AMP_PARAMETERS.map(({ key }) => [key, unknown()])) as Record<
      OpAmpParameterKey,
      Float64Array
    >,
    inputType: new Array<InputType | null>(count).fill(null),
    origins: Object.fromEntries(
      NOISE_PARAMETERS.map((key) => [key, new Array<Origin>(count).fill('typical')]),
    ) as Record<NoiseParameter, Origin[]>,
    lifecycle: new Array<Lifecycle>(count).fill('active'),
    approval: new Array<Approval>(count).fill('approved'),
    package: new Array<string>(count).fill(''),
    searchText: new Array<string>(count).fill(''),
  };
}

/** For arrays of words that are compared row by row: INPUT_TYPES with the unknown one. */
export const INPUT_TYPES_OR_UNKNOWN: readonly (InputType | null)[] = [...INPUT_TYPES, null];
