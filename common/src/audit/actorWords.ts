import type { AuditObject } from './auditActions.js';

/** Who did it, in words; without a name it was the payment service, or somebody whose account is gone. */
export function actorWords(name: string | null | undefined, object: AuditObject): string {
  return name ?? (object === 'plan' ? 'the payment service' : 'a former member');
}
