import { type ComparedPart, isRetired, type LibraryPart } from '@roothertz/common/parts';
import { figureAt, type ListedRow, sharedTexts } from './listed-rows.js';
import type { PartTable } from './part-tables.js';

/** A library's part as the search for duplicates takes it. */
export interface IdentifiedPart extends ComparedPart {
  id: number;
}

const PIECE = 1000;

/** All but the retired ones, which are out of use already; made in pieces, so that other work can go on between them. */
export function* toComparedParts<Kind extends LibraryPart>(
  { catalogue }: PartTable<Kind>,
  rows: readonly ListedRow[],
  isOwn: boolean,
): Generator<void, IdentifiedPart[]> {
  const shared = sharedTexts();
  const nominal = catalogue.parameters.findIndex(({ key }) => key === catalogue.nominal);
  const parts: IdentifiedPart[] = [];
  for (const [place, row] of rows.entries()) {
    if (place % PIECE === PIECE - 1) yield;
    const [id, manufacturer, partNumber, , packageName, lifecycle, approval, choice] = row;
    if (isRetired({ lifecycle, approval })) continue;
    parts.push({
      id,
      manufacturer: shared(manufacturer),
      partNumber,
      package: shared(packageName),
      figures: [shared(choice), ...catalogue.parameters.map((_, figure) => figureAt(row, figure))],
      nominal: nominal < 0 ? null : figureAt(row, nominal),
      isOwn,
    });
  }
  return parts;
}
