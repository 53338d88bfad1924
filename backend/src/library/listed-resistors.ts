import type { LibraryResistor } from '@roothertz/common/noise';
import {
  type Library,
  RESISTOR_PARAMETERS,
  type Resistor,
  type ResistorOrigins,
  type Technology,
} from '@roothertz/common/parts';
import { figureAt, type ListedRow, originsReader, searchText, sharedTexts } from './listed-rows.js';

/** A library's resistor as the ranking takes it and names it. */
export interface ListedResistor extends LibraryResistor {
  id: number;
  library: Library;
  manufacturer: string;
  partNumber: string;
  origins: ResistorOrigins;
}

export function toListedResistors(rows: readonly ListedRow[], library: Library): ListedResistor[] {
  const originsOf = originsReader();
  const shared = sharedTexts();
  return rows.map((row) => {
    const [id, manufacturer, partNumber, , packageName, lifecycle, approval, technology] = row;
    return {
      id,
      library,
      manufacturer: shared(manufacturer),
      partNumber,
      package: shared(packageName),
      lifecycle: shared(lifecycle),
      approval: shared(approval),
      searchText: searchText(row),
      origins: originsOf(row),
      ...figuresOf(row),
      technology: shared(technology as Technology | null),
    };
  });
}

function figuresOf(row: ListedRow): Omit<Resistor, 'technology'> {
  const figures = RESISTOR_PARAMETERS.map(({ key }, place) => [key, figureAt(row, place)]);
  return Object.fromEntries(figures) as Omit<Resistor, 'technology'>;
}
