import { smallestPositions } from '../../numeric/index.js';
import type { RowKey } from './sortKeys.js';

/** Where a row stands in lists of rows, one a library. */
export interface RowPlace {
  library: number;
  position: number;
}

/**
 * The rows up to the end of a page, in the order of their keys; rows without a key come last, equal ones in
 * the order of the libraries.
 */
export function firstPlaces(
  { descending, offset, limit }: { descending: boolean; offset: number; limit: number },
  rows: readonly Uint32Array[],
  keyOf: (library: number) => RowKey,
): RowPlace[] {
  const keys = new Float64Array(rows.reduce((total, { length }) => total + length, 0));
  const sign = descending ? -1 : 1;
  let joined = 0;
  rows.forEach((ofLibrary, library) => {
    const keyAt = keyOf(library);
    for (let position = 0; position < ofLibrary.length; position++)
      keys[joined++] = sign * keyAt(ofLibrary[position], position);
  });
  return Array.from(smallestPositions(keys, offset + limit), (place) => placeOf(rows, place));
}

/** From the place in the joined rows of all libraries to the library and the position in its rows. */
function placeOf(rows: readonly Uint32Array[], joined: number): RowPlace {
  let library = 0;
  let position = joined;
  while (position >= rows[library].length) position -= rows[library++].length;
  return { library, position };
}
