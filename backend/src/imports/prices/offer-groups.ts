import type { PriceRowReader, QuotedLine, QuotedNames } from '@roothertz/common/imports';
import { normalisePartKey } from '@roothertz/common/parts';
import { nameKey } from '../../shared/text/name-key.js';
import type { CsvRecord } from '../file/csv-records.js';

/** A row of a price list as it was read. */
export type ReadLine = QuotedLine & CsvRecord;

/** The rows of a price list that speak of one offer. */
export interface OfferGroup {
  partKey: string;
  supplier: string;
  supplierKey: string;
  /** Empty where the list names no supplier's number. */
  numberKey: string;
  lines: ReadLine[];
}

/** Puts the rows of each offer together; rows that can't be told to belong to one stay apart. */
export function offerGroups(
  { isLong }: PriceRowReader,
  lines: readonly ReadLine[],
): { groups: OfferGroup[]; apart: ReadLine[] } {
  const groups = new Map<string, OfferGroup>();
  const apart: ReadLine[] = [];
  for (const line of lines) {
    const { names, errors, stated } = line.row;
    if (names === null || (!isLong && errors.length > 0)) {
      apart.push(line);
      continue;
    }
    const own = groupOf(names, stated.supplierNumber ?? '');
    const key = JSON.stringify([own.partKey, own.supplierKey, own.numberKey]);
    const group = groups.get(key) ?? own;
    groups.set(key, group);
    group.lines.push(line);
  }
  return { groups: [...groups.values()], apart };
}

function groupOf({ manufacturer, partNumber, supplier }: QuotedNames, supplierNumber: string): OfferGroup {
  return {
    partKey: normalisePartKey(manufacturer, partNumber),
    supplier,
    supplierKey: nameKey(supplier),
    numberKey: nameKey(supplierNumber),
    lines: [],
  };
}
