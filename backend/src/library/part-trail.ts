import type { AuditAction } from '@roothertz/common/audit';
import { isRetired, type LibraryPart, type PartKind } from '@roothertz/common/parts';
import type { Recorded } from '../audit/audit.service.js';
import type { PartRecord } from './part-record.js';

/** How a part was before and is since; null = not at all. */
export type PartChange<Kind extends LibraryPart> = readonly [
  before: PartRecord<Kind> | null,
  after: PartRecord<Kind> | null,
];

/** What the trail says of a change. */
export function trailOf<Kind extends LibraryPart>(kind: PartKind, change: PartChange<Kind>): Recorded {
  const [before, after] = change;
  const { id, manufacturer, partNumber } = (before ?? after)!;
  return {
    action: actionOf(change),
    object: { kind, id, label: `${manufacturer} ${partNumber}` },
    from: before && changeable(before),
    to: after && changeable(after),
  };
}

/** What the trail says of a change of all parts of a filter. */
export function matchingTrail(
  action: 'standings.changed' | 'standings.undone',
  kind: PartKind,
  { id, parts }: { id: number; parts: number },
  to: object,
): Recorded {
  const label = `${parts} ${parts === 1 ? kind : `${kind}s`}`;
  return { action, object: { kind: 'standings', id, label }, from: null, to };
}

function actionOf<Kind extends LibraryPart>([before, after]: PartChange<Kind>): AuditAction {
  if (before === null) return 'part.created';
  if (after === null) return 'part.deleted';
  if (isRetired(before) === isRetired(after)) return 'part.changed';
  return isRetired(after) ? 'part.retired' : 'part.restored';
}

/** What of a part somebody can change. */
function changeable<Kind extends LibraryPart>({
  library,
  version,
  updatedAt,
  ...part
}: PartRecord<Kind>): object {
  return part;
}
