import { TRIAL_DAYS, TRIAL_SEATS } from '@roothertz/common/access';
import { Button } from 'antd';
import { startTrial } from '../../api/billing';
import { detailOf } from '../../api/problem';
import { FieldMessage } from '../../components/FieldMessage';
import styles from './Billing.module.css';
import { useBillingAct } from './useBillingAct';

export function TrialOffer() {
  const trial = useBillingAct(startTrial);
  return (
    <section className={styles.section} aria-labelledby="trial">
      <h2 id="trial">Try the Team plan</h2>
      <p>
        {TRIAL_DAYS} days with {TRIAL_SEATS} seats, without a card. It ends by itself.
      </p>
      <div className={styles.act}>
        <Button onClick={() => trial.mutate()} loading={trial.isPending}>
          Start the trial
        </Button>
      </div>
      {trial.error && <FieldMessage>{detailOf(trial.error)}</FieldMessage>}
    </section>
  );
}
