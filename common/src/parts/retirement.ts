import type { Approval, Lifecycle } from './vocabulary.js';

/** How a part stands with its maker and with the team. */
export interface Standing {
  lifecycle: Lifecycle;
  approval: Approval;
}

/** How a retired part stands: it is kept and can be read, and no ranking takes it unless it is asked for. */
export const RETIRED: Readonly<Standing> = { lifecycle: 'obsolete', approval: 'not-approved' };

/** Why a ranking leaves a retired part out, in plain words. */
export const RETIRED_DETAIL = 'it is retired: obsolete and not approved; tick one of these to rank it';

/** Whether a part is retired: obsolete and not approved. */
export function isRetired({ lifecycle, approval }: Standing): boolean {
  return lifecycle === RETIRED.lifecycle && approval === RETIRED.approval;
}

/**
 * Whether a filter leaves a part out because it is retired: only a filter that names a lifecycle or an
 * approval asks for retired parts, if it names theirs.
 */
export function isRetiredUnasked(
  standing: Standing,
  filter: { lifecycle?: readonly Lifecycle[]; approval?: readonly Approval[] },
): boolean {
  return isRetired(standing) && !filter.lifecycle?.length && !filter.approval?.length;
}
