export const PLANS = ['free', 'team'] as const;
export type Plan = (typeof PLANS)[number];

export interface PlanLimits {
  /** Members that the team may have; null = as many as it pays for. */
  seats: number | null;
  /** The team keeps a library of its own beside the curated one. */
  ownLibrary: boolean;
  /** The team keeps suppliers' prices. */
  prices: boolean;
  /** Named operating conditions that the team may save; null = unlimited. */
  savedConditions: number | null;
}

export const PLAN_LIMITS: Record<Plan, PlanLimits> = {
  free: { seats: 1, ownLibrary: false, prices: false, savedConditions: 3 },
  team: { seats: null, ownLibrary: true, prices: true, savedConditions: null },
};
