/** What a member of a team may be; a member can be several of these at once. */
export const ROLES = ['admin', 'librarian', 'purchasing', 'engineer', 'reviewer'] as const;
export type Role = (typeof ROLES)[number];

export const ROLE_LABELS: Record<Role, string> = {
  admin: 'team admin',
  librarian: 'librarian',
  purchasing: 'purchasing',
  engineer: 'engineer',
  reviewer: 'reviewer',
};
