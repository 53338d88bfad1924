import { Button } from 'antd';
import { portalAddress } from '../../api/billing';
import { detailOf } from '../../api/problem';
import { FieldMessage } from '../../components/FieldMessage';
import styles from './Billing.module.css';
import { useLeaveFor } from './useBillingAct';

/** Leads to where card and cancellation are seen to. */
export function PortalButton({ urgent }: { urgent: boolean }) {
  const portal = useLeaveFor(portalAddress);
  return (
    <section className={styles.section} aria-labelledby="portal">
      <h2 id="portal">Card and cancellation</h2>
      <p>The payment service keeps the card: change it there, pay what is open, or cancel the plan.</p>
      <div className={styles.act}>
        <Button
          type={urgent ? 'primary' : 'default'}
          onClick={() => portal.mutate()}
          loading={portal.isPending || portal.isSuccess}
        >
          Card and cancellation
        </Button>
      </div>
      {portal.error && <FieldMessage>{detailOf(portal.error)}</FieldMessage>}
    </section>
  );
}
