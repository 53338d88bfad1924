import type { ConditionFieldPath } from '@roothertz/common/conditions';
import type { Contributor } from '@roothertz/common/noise';

export type SymbolName =
  | 'resistor'
  | 'capacitor'
  | 'coil'
  | 'ground'
  | 'voltageSource'
  | 'currentSource'
  | 'plusInput'
  | 'minusInput'
  | 'node'
  | 'terminal';

/** A symbol with its middle at x, y; drawn pale while the value of its field is none. */
export interface ElementPlace {
  symbol: SymbolName;
  x: number;
  y: number;
  vertical?: boolean;
  field?: ConditionFieldPath;
  /** Lies in the line of the signal: a plain wire where its value is none. */
  inLine?: boolean;
}

/** A wire that is drawn pale with the element at its end. */
export interface Branch {
  field: ConditionFieldPath;
  path: string;
}

/** Where a value stands that can be changed; `before` is the word in front of it. */
export interface ValuePlace {
  field: ConditionFieldPath;
  x: number;
  y: number;
  align?: 'left' | 'centre' | 'right';
  before?: string;
  emptyText?: string;
}

export type Anchor = 'start' | 'middle' | 'end';

/** A noise generator's disc and the place of its percentage. */
export interface DiscPlace {
  contributor: Contributor;
  x: number;
  y: number;
  label: { x: number; y: number; anchor: Anchor };
}

/** The left edge and the middle of an amplifier's triangle; a small one has its inputs 12 px off the middle, not 18. */
export interface AmplifierPlace {
  x: number;
  y: number;
  small?: boolean;
}

/** The drawing of one kind of stage, in CSS pixels. */
export interface SchematicLayout {
  height: number;
  /** The path of the wires that are always there. */
  wires: string;
  branches: readonly Branch[];
  amplifiers: readonly AmplifierPlace[];
  elements: readonly ElementPlace[];
  values: readonly ValuePlace[];
  discs: readonly DiscPlace[];
  /** Where the feedback resistance stands that follows from the gain, once or for each of two alike. */
  feedbackResistances?: readonly { x: number; y: number }[];
}

export const SCHEMATIC_WIDTH = 308;
