/** What the trail records. */
export const AUDIT_ACTIONS = [
  'offer.opened',
  'offer.changed',
  'offer.confirmed',
  'offer.closed',
  'supplier.added',
  'rates.changed',
  'price-settings.changed',
  'plan.trial-started',
  'plan.changed',
] as const;
export type AuditAction = (typeof AUDIT_ACTIONS)[number];

/** The kinds of object that it records. */
export const AUDIT_OBJECTS = ['offer', 'supplier', 'rate', 'price-settings', 'plan'] as const;
export type AuditObject = (typeof AUDIT_OBJECTS)[number];
