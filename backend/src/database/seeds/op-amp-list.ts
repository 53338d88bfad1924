import { type OpAmpPart, readOpAmpHeadings, readOpAmpRow } from '@roothertz/common/parts';
import { parse } from 'csv-parse/sync';
import { readFileSync } from 'node:fs';

const DATA = new URL('../../../../data/', import.meta.url);

interface ListedRow {
  record: Record<string, string>;
  info: { lines: number };
}

/** The op-amps of a list in data/, read as an upload's rows are; the first fault ends it, naming line and field. */
export function readOpAmpList(path: string): OpAmpPart[] {
  const rows = parse(readFileSync(new URL(path, DATA)), {
    bom: true,
    columns: true,
    info: true,
    skip_empty_lines: true,
  }) as unknown as ListedRow[];
  const columns = readOpAmpHeadings(Object.keys(rows[0]?.record ?? {}));
  return rows.map(({ record, info }) => {
    const reading = readOpAmpRow(record, columns);
    if (reading.ok) return reading.part;
    const [{ field, message }] = reading.errors;
    throw new Error(`data/${path}, line ${info.lines}, ${field}: ${message}`);
  });
}
