/** What the trail records: each in the words that stand between who did it and what it was done to. */
export const AUDIT_ACTIONS = {
  'offer.opened': 'recorded the offer',
  'offer.changed': 'changed the offer',
  'offer.confirmed': 'confirmed the offer',
  'offer.closed': 'withdrew the offer',
  'supplier.added': 'added the supplier',
  'rates.changed': 'set the exchange rate',
  'price-settings.changed': 'changed the settings of',
  'part.created': 'added the part',
  'part.changed': 'changed the part',
  'part.retired': 'retired the part',
  'part.restored': 'brought back the part',
  'part.deleted': 'deleted the part',
  'import.applied': 'applied the import',
  'import.undone': 'took back the import',
  'conditions.saved': 'saved the conditions',
  'conditions.changed': 'changed the conditions',
  'conditions.deleted': 'deleted the conditions',
  'plan.trial-started': 'started the trial of',
  'plan.changed': 'changed',
  'team.renamed': 'renamed the team',
  'team.handed-over': 'handed over the team',
  'member.roles-changed': 'changed the roles of',
  'member.removed': 'removed',
  'member.left': 'left the team:',
  'member.joined': 'joined the team:',
  'invitation.sent': 'invited',
  'invitation.resent': 'invited again',
  'invitation.revoked': 'withdrew the invitation of',
} as const;
export type AuditAction = keyof typeof AUDIT_ACTIONS;

/** The kinds of object that it records. */
export const AUDIT_OBJECTS = {
  offer: 'offer',
  supplier: 'supplier',
  rate: 'exchange rate',
  'price-settings': 'prices',
  'op-amp': 'op-amp',
  resistor: 'resistor',
  import: 'import',
  conditions: 'saved conditions',
  plan: 'plan',
  team: 'team',
  member: 'member',
  invitation: 'invitation',
} as const;
export type AuditObject = keyof typeof AUDIT_OBJECTS;
