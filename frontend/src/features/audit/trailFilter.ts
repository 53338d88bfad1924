import { AUDIT_ACTIONS, AUDIT_OBJECTS, type AuditAction, type AuditObject } from '@roothertz/common/audit';
import { isDay } from '@roothertz/common/prices';
import type { AuditFilter } from '../../api/audit';

/** The filter that an address holds; what makes no sense is left out. */
export function readFilter(params: URLSearchParams): AuditFilter {
  const [kind, from, to] = ['kind', 'from', 'to'].map((key) => params.get(key) ?? '');
  const action = params.getAll('action').filter((one): one is AuditAction => one in AUDIT_ACTIONS);
  const userId = params.get('member') ?? '';
  return {
    ...(action.length > 0 && { action }),
    ...(kind in AUDIT_OBJECTS && { objectKind: kind as AuditObject }),
    ...(/^\d{1,10}$/.test(userId) && { userId }),
    ...(isDay(from) && { from }),
    ...(isDay(to) && { to }),
  };
}

/** The address of a filter. */
export function writeFilter({ action = [], objectKind, userId, from, to }: AuditFilter): URLSearchParams {
  const params = new URLSearchParams(action.map((one) => ['action', one]));
  const single = { kind: objectKind, member: userId, from, to };
  for (const [key, value] of Object.entries(single)) if (value) params.set(key, value);
  return params;
}
