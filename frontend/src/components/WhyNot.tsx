import { type Action, mayDo, refusalOf } from '@roothertz/common/access';
import type { ReactNode } from 'react';
import { Link } from 'react-router-dom';
import { useMember } from './useMember';

interface WhyNotProps {
  action: Action;
  /** What is said where the member's roles don't allow it. */
  byRole: ReactNode;
  /** What the team's plan doesn't have. */
  byPlan: string;
}

/** Why the member can't do something now, and what can be done about it. */
export function WhyNot({ action, byRole, byPlan }: WhyNotProps) {
  const refusal = refusalOf(useMember(), action);
  if (refusal !== 'plan' && refusal !== 'read-only') return byRole;
  return (
    <>
      {refusal === 'plan'
        ? byPlan
        : 'Your team is read-only now: everything can be read and exported, and nothing changed.'}{' '}
      <SeeToPlan />
    </>
  );
}

/** The way to the team's plan, or who can go there. */
export function SeeToPlan() {
  const isAdmin = mayDo(useMember().roles, 'billing.manage');
  return isAdmin ? <Link to="/team/plan">See to the plan</Link> : 'A team admin can see to it.';
}
