import type { ApiProblem } from '../../../api/problem';
import type { SavedPriceRow } from '../../../api/prices';
import type { Refusal } from './draft';
import { cellOf } from './readRow';

export interface SentRow {
  key: string;
  body: SavedPriceRow;
}

/** What the server refused, at the cells that it is about; what isn't about a cell stands at the part. */
export function savedRefusals(sent: readonly SentRow[], { errors }: ApiProblem): Refusal[] {
  return errors.flatMap(({ field, message }): Refusal[] => {
    const [, index, path] = /^rows\[(\d+)\]\.(.+)$/.exec(field) ?? [];
    const row = sent[Number(index)];
    if (row === undefined) return [];
    const column = cellOf({ field: path, message }, row.body.breaks ?? []);
    return [{ key: row.key, column, message, from: 'server' }];
  });
}
