import { daysLeft } from '@roothertz/common/access';
import { Alert } from 'antd';
import { useLocation } from 'react-router-dom';
import type { Session } from '../api/session';
import { useMember } from '../components/useMember';
import { SeeToPlan } from '../components/WhyNot';

const PLAN_PAGE = '/team/plan';
/** A trial is mentioned on every page when so few days are left. */
const TRIAL_ENDING_DAYS = 4;

/** Says on every page what is wrong or ending with the team's plan, and who can do what about it. */
export function PlanNotice() {
  const member = useMember();
  const { pathname } = useLocation();
  const text = noticeText(member);
  if (text === null || pathname === PLAN_PAGE) return null;
  return (
    <Alert
      banner
      type="warning"
      title={
        <>
          {text} <SeeToPlan />
        </>
      }
    />
  );
}

function noticeText({ standing, standingUntil }: Session): string | null {
  const days = standingUntil === null ? 0 : daysLeft(new Date(standingUntil), new Date());
  const left = days === 1 ? '1 day' : `${days} days`;
  if (standing === 'trial')
    return days <= TRIAL_ENDING_DAYS ? `The trial of the Team plan ends in ${left}.` : null;
  if (standing === 'past-due')
    return `A payment for the team’s plan is missing: the team is read-only in ${left}.`;
  if (standing === 'unpaid')
    return 'Read-only, for a payment is missing: everything can be read and exported, and nothing changed.';
  if (standing === 'cancelled')
    return 'Read-only, for the plan is cancelled: everything can be read and exported, and nothing changed.';
  return null;
}
