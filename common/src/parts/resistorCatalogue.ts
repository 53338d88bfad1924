import type { PartCatalogue } from './partCatalogue.js';
import { TECHNOLOGY_FIELD } from './partFields.js';
import type { ResistorPart } from './resistor.js';
import { RESISTOR_PARAMETERS } from './resistorParameters.js';

/** No two of a resistor's figures can contradict each other. */
export const RESISTOR_CATALOGUE: PartCatalogue<ResistorPart> = {
  kind: 'resistor',
  nominal: 'resistance',
  group: 'resistor',
  choice: TECHNOLOGY_FIELD,
  parameters: RESISTOR_PARAMETERS,
  check: () => [],
};
