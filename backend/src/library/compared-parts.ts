import { type ComparedPart, isRetired, type LibraryPart } from '@roothertz/common/parts';
import { figureAt, type ListedRow, sharedTexts } from './listed-rows.js';
import type { PartTable } from './part-tables.js';

/** A library's part as the search for duplicates takes it. */
export interface IdentifiedPart extends ComparedPart {
  id: number;
}

/** All but the retired ones: they are out of use already. */
export function toComparedParts<Kind extends LibraryPart>(
  { catalogue }: PartTable<Kind>,
  rows: readonly ListedRow[],
  isOwn: boolean,
): IdentifiedPart[] {
  const shared = sharedTexts();
  const inUse = rows.filter(([, , , , , lifecycle, approval]) => !isRetired({ lifecycle, approval }));
  const nominal = catalogue.parameters.findIndex(({ key }) => key === catalogue.nominal);
  return inUse.map((row) => {
    const [id, manufacturer, partNumber, , packageName, , , choice] = row;
    return {
      id,
      manufacturer: shared(manufacturer),
      partNumber,
      package: shared(packageName),
      figures: [shared(choice), ...catalogue.parameters.map((_, place) => figureAt(row, place))],
      nominal: nominal < 0 ? null : figureAt(row, nominal),
      isOwn,
    };
  });
}
