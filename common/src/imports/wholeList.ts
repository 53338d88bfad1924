/** What a member says of all rows of a list, where it has no column for it; null = nothing. */
export interface WholeList {
  supplier: string | null;
  /** ISO 4217 */
  currency: string | null;
}

export const NOT_STATED: WholeList = { supplier: null, currency: null };
