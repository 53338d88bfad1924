import type { ApiProblem } from '../../../api/problem';
import type { SavedPriceRow } from '../../../api/prices';
import type { GridRow } from './cells';
import type { Refusal } from './draft';
import { cellOf } from './readRow';

export interface SentRow {
  row: GridRow;
  body: SavedPriceRow;
}

/** What the server refused, at the cells that it is about; what isn't about a cell stands at the part. */
export function savedRefusals(sent: readonly SentRow[], problem: ApiProblem): Refusal[] {
  return fieldsOf(sent, problem).map(({ row, body, path, message }) => {
    const column = cellOf({ field: path, message }, body.breaks ?? []);
    return { key: row.key, column, message, from: 'server' };
  });
}

/** The rows of which the server says that somebody else has changed or closed their offers. */
export function overrunRows(sent: readonly SentRow[], problem: ApiProblem): GridRow[] {
  return fieldsOf(sent, problem).flatMap(({ row, path }) => (path === 'version' ? row : []));
}

function fieldsOf(sent: readonly SentRow[], { errors }: ApiProblem) {
  return errors.flatMap(({ field, message }) => {
    const [, index, path] = /^rows\[(\d+)\]\.(.+)$/.exec(field) ?? [];
    const one = sent[Number(index)];
    return one === undefined ? [] : [{ ...one, path, message }];
  });
}
