import { type Role, ROLE_LABELS, ROLES } from '@roothertz/common/access';

export const ROLE_OPTIONS = ROLES.map((value) => ({ value, label: ROLE_LABELS[value] }));

export function rolesText(roles: readonly Role[]): string {
  return roles.map((role) => ROLE_LABELS[role]).join(', ');
}
