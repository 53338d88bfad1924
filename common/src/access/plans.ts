export const PLANS = ['free', 'team'] as const;
export type Plan = (typeof PLANS)[number];

export interface PlanLimits {
  /** People that the team may have; null = as many as it pays for. */
  seats: number | null;
  /** The team keeps a library of its own beside the curated one, and imports lists into it. */
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

export const PLAN_LABELS: Record<Plan, string> = { free: 'Free', team: 'Team' };

/** Days that a team may try the Team plan without a card. */
export const TRIAL_DAYS = 14;

/** Seats that a trial has. */
export const TRIAL_SEATS = 5;

/** Days after a payment failed in which everything still works. */
export const GRACE_DAYS = 14;

/** The most seats that a team can buy by itself. */
export const MOST_SEATS = 500;

/** How a team stands with its plan. */
export const STANDINGS = ['active', 'trial', 'trial-over', 'past-due', 'unpaid', 'cancelled'] as const;
export type Standing = (typeof STANDINGS)[number];

interface StandingRule {
  /** The plan whose limits hold; nothing that the team has is deleted when it has less. */
  plan: Plan;
  /** Everything can be read and exported, and nothing be changed but members and plan. */
  readOnly: boolean;
}

/** What holds in each standing; a team that is `active` without a subscription is on Free. */
export const STANDING_RULES: Record<Exclude<Standing, 'active'>, StandingRule> = {
  trial: { plan: 'team', readOnly: false },
  'trial-over': { plan: 'free', readOnly: false },
  'past-due': { plan: 'team', readOnly: false },
  unpaid: { plan: 'team', readOnly: true },
  cancelled: { plan: 'team', readOnly: true },
};

/** Whether nothing can be changed in this standing. */
export function isReadOnly(standing: Standing): boolean {
  return standing !== 'active' && STANDING_RULES[standing].readOnly;
}
