import type { Billing } from '../../api/billing';
import { BuyPlan } from './BuyPlan';
import { PortalButton } from './PortalButton';
import { SeatsForm } from './SeatsForm';
import { TrialOffer } from './TrialOffer';

/** What an admin can do about the plan as it stands. */
export function BillingActs({ billing }: { billing: Billing }) {
  const { plan, standing, mayTry, granted, hasCustomer, payment } = billing;
  const isPaid = standing === 'active' && plan === 'team' && !granted;
  const isMissing = standing === 'past-due' || standing === 'unpaid';
  const mayBuy = !isPaid && !isMissing && !granted;
  return (
    <>
      {mayTry && <TrialOffer />}
      {mayBuy && payment && <BuyPlan billing={billing} seatPrice={payment.seatPrice} />}
      {isPaid && payment && <SeatsForm key={billing.seats} billing={billing} />}
      {(isPaid || isMissing) && hasCustomer && <PortalButton urgent={isMissing} />}
    </>
  );
}
