import { actorWords, AUDIT_ACTIONS, AUDIT_OBJECTS, describeChange } from '@roothertz/common/audit';
import { harmlessCell } from '@roothertz/common/imports';
import { csvLine, encoderOf } from '../shared/csv/csv-lines.js';
import type { AuditEntry } from './entities/audit-entry.entity.js';

const PORTION = 1000;
const HEADINGS = ['time (UTC)', 'who', 'did', 'kind', 'object', 'number', 'what changed'];

/**
 * The trail as the pieces of a CSV file, in words.
 *
 * @param load the entries older than one, or the newest, in falling order of their ids
 */
export async function* auditPieces(
  load: (last: number | null, portion: number) => Promise<AuditEntry[]>,
): AsyncGenerator<Buffer> {
  const encode = encoderOf({ encoding: 'utf-8', byteOrderMark: true });
  yield encode.first(csvLine(HEADINGS, 'comma'));
  for (let last: number | null = null; ;) {
    const entries = await load(last, PORTION);
    if (entries.length === 0) return;
    yield encode.next(entries.map((entry) => csvLine(cellsOf(entry), 'comma')).join(''));
    last = entries[entries.length - 1].id;
  }
}

function cellsOf({ at, user, action, objectKind, objectId, objectLabel, from, to }: AuditEntry): string[] {
  const changes = describeChange(from, to).map(
    (change) => `${change.field}: ${change.from ?? '–'} → ${change.to ?? '–'}`,
  );
  return [
    at.toISOString().replace('T', ' ').replace('Z', ''),
    actorWords(user?.name, objectKind),
    AUDIT_ACTIONS[action],
    AUDIT_OBJECTS[objectKind],
    objectLabel ?? '',
    objectId,
    changes.join('; '),
  ].map(harmlessCell);
}
