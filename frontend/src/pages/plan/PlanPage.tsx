import { useQuery, useQueryClient } from '@tanstack/react-query';
import { Button, Skeleton } from 'antd';
import type { ReactNode } from 'react';
import { useSearchParams } from 'react-router-dom';
import { billingQuery, syncedBillingQuery } from '../../api/billing';
import { LoadFailure } from '../../components/LoadFailure';
import { useFocusAfterChange } from '../../components/lostFocus';
import { useMayDo, useMember } from '../../components/useMember';
import { BillingActs } from '../../features/billing/BillingActs';
import { BillingFacts } from '../../features/billing/BillingFacts';
import { Invoices } from '../../features/billing/Invoices';
import { planHeadline, planMeaning } from '../../features/billing/planWords';
import { PlanTable } from '../../features/billing/PlanTable';
import { TeamTabs } from '../team/TeamTabs';
import styles from './PlanPage.module.css';

/** The team's plan: how it stands, what it costs, and what can be done about it. */
export function PlanPage() {
  return useMayDo('billing.read') ? <AdminPlan /> : <MemberPlan />;
}

function MemberPlan() {
  const member = useMember();
  return (
    <Page title={planHeadline(member)}>
      <p>Seats, payment and invoices are seen to by your team’s admins.</p>
      <PlanTable current={member.plan} />
    </Page>
  );
}

function AdminPlan() {
  const { data: billing, error, isFetching, refetch } = useBilling();
  if (billing === undefined)
    return (
      <Page title="Plan">
        {error ? (
          <LoadFailure error={error} onRetry={refetch} />
        ) : (
          <Skeleton title={false} paragraph={{ rows: 6, width: '100%' }} />
        )}
      </Page>
    );
  return (
    <Page key="known" title={planHeadline(billing)} meaning={planMeaning(billing)}>
      <BillingFacts billing={billing} />
      {billing.payment === null && (
        <p role="alert">
          The payment service doesn’t answer, so price, invoices and changes are missing here.{' '}
          <Button size="small" loading={isFetching} onClick={() => void refetch()}>
            Ask again
          </Button>
        </p>
      )}
      <BillingActs billing={billing} />
      <Invoices invoices={billing.payment?.invoices ?? []} />
      <PlanTable current={billing.plan} />
    </Page>
  );
}

/** Whoever comes back from the payment service sees what has become of it there. */
function useBilling() {
  const queryClient = useQueryClient();
  const [search] = useSearchParams();
  const isBack = search.has('from');
  const { isPending: isSyncing } = useQuery({ ...syncedBillingQuery(queryClient), enabled: isBack });
  return useQuery({ ...billingQuery, enabled: !isBack || !isSyncing });
}

function Page({ title, meaning, children }: { title: string; meaning?: string; children: ReactNode }) {
  const heading = useFocusAfterChange<HTMLHeadingElement>(title);
  return (
    <div className={styles.page}>
      <title>Plan · Roothertz</title>
      <TeamTabs />
      <div className={styles.lead}>
        <h1 ref={heading} tabIndex={-1}>
          {title}
        </h1>
        {meaning && <p>{meaning}</p>}
      </div>
      {children}
    </div>
  );
}
