import { type Plan, PLAN_LABELS, PLAN_LIMITS, type PlanLimits, PLANS } from '@roothertz/common/access';
import { Table } from '../../components/Table';
import styles from './Billing.module.css';

const ROWS: readonly { label: string; value: (limits: PlanLimits) => string }[] = [
  { label: 'People', value: ({ seats }) => (seats === null ? 'as many as seats are paid' : String(seats)) },
  { label: 'Curated library, the whole ranking', value: () => 'included' },
  { label: 'Library of your own, with imports', value: ({ ownLibrary }) => included(ownLibrary) },
  { label: 'Suppliers’ prices', value: ({ prices }) => included(prices) },
  { label: 'Saved conditions', value: ({ savedConditions }) => String(savedConditions ?? 'unlimited') },
];

/** What each plan has, as the server's own guards have it. */
export function PlanTable({ current }: { current: Plan }) {
  return (
    <section className={styles.section} aria-labelledby="plans">
      <h2 id="plans">What the plans have</h2>
      <Table className={styles.table} aria-labelledby="plans">
        <thead>
          <tr>
            <td />
            {PLANS.map((plan) => (
              <th key={plan} scope="col">
                {PLAN_LABELS[plan]}
                {plan === current && ' (yours)'}
              </th>
            ))}
          </tr>
        </thead>
        <tbody>
          {ROWS.map(({ label, value }) => (
            <tr key={label}>
              <th scope="row">{label}</th>
              {PLANS.map((plan) => (
                <td key={plan}>{value(PLAN_LIMITS[plan])}</td>
              ))}
            </tr>
          ))}
        </tbody>
      </Table>
    </section>
  );
}

function included(is: boolean): string {
  return is ? 'included' : '–';
}
