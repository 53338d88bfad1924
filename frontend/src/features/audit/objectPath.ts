import type { AuditEntry } from '../../api/audit';

type AuditedObject = AuditEntry['object'];

const PATHS: Readonly<Partial<Record<AuditedObject['kind'], (object: AuditedObject) => string>>> = {
  'op-amp': ({ id }) => `/parts/${id}`,
  resistor: ({ id }) => `/parts/resistors/${id}`,
  offer: ({ label }) => pricesOf(label?.replace(' from ', ' ')),
  supplier: ({ label }) => pricesOf(label),
  rate: () => pricesOf(null),
  'price-settings': () => pricesOf(null),
  import: ({ id }) => `/imports/${id}`,
  plan: () => '/team/plan',
  team: () => '/team',
  member: () => '/team',
  invitation: () => '/team',
};

/** Where the object of an act is shown; null = nowhere, or no more. */
export function objectPath({ action, object }: Pick<AuditEntry, 'action' | 'object'>): string | null {
  return action.endsWith('.deleted') ? null : (PATHS[object.kind]?.(object) ?? null);
}

/** The prices that a search finds. */
function pricesOf(search: string | null | undefined): string {
  return search ? `/prices?search=${encodeURIComponent(search)}` : '/prices';
}
