import {
  type LibraryPart,
  OP_AMP_CATALOGUE,
  type OpAmpPart,
  type PartCatalogue,
  RESISTOR_CATALOGUE,
  type ResistorPart,
} from '@roothertz/common/parts';
import { OpAmp } from './entities/op-amp.entity.js';
import type { Part } from './entities/part.entity.js';
import { Resistor } from './entities/resistor.entity.js';

/** A row of a kind's own table; the parameters stand in it under the name of their group. */
export interface ParameterRow {
  partId: number;
  part: Part;
  origins: LibraryPart['origins'];
}

/** Where the database keeps a kind of part besides what all parts have. */
export interface PartTable<Kind extends LibraryPart> {
  catalogue: PartCatalogue<Kind>;
  entity: new () => ParameterRow;
  name: string;
}

export const OP_AMPS: PartTable<OpAmpPart> = { catalogue: OP_AMP_CATALOGUE, entity: OpAmp, name: 'op_amps' };

export const RESISTORS: PartTable<ResistorPart> = {
  catalogue: RESISTOR_CATALOGUE,
  entity: Resistor,
  name: 'resistors',
};
