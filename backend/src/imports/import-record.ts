import type { Recorded } from '../audit/audit.service.js';
import type { Import } from './entities/import.entity.js';

/** What the trail says of an import: its file, its kind, its rows by their verdicts, and what came of them. */
export function importRecord(
  action: Extract<Recorded['action'], `import.${string}`>,
  { id, fileName, kind, counts }: Pick<Import, 'id' | 'fileName' | 'kind' | 'counts'>,
  outcome: object = {},
): Recorded {
  const object = { kind: 'import' as const, id, label: fileName };
  return { action, object, from: null, to: { kind, counts, ...outcome } };
}
