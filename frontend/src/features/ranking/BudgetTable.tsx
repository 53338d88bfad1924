import { CONTRIBUTORS, type Contributions } from '@roothertz/common/noise';
import type { QuantityKind } from '@roothertz/common/units';
import { ContributorSwatch } from '../../components/charts/ContributorSwatch';
import { percentText, sharesOf } from '../../components/charts/shares';
import { Figure } from '../../components/Figure';
import styles from './PartBudget.module.css';

interface BudgetTableProps {
  contributions: Contributions;
  total: number;
  kind: QuantityKind;
}

/** What each contributor makes of the noise; powers add up, so the rms values don't. */
export function BudgetTable({ contributions, total, kind }: BudgetTableProps) {
  const shares = sharesOf(contributions);
  const shown = CONTRIBUTORS.filter((contributor) => shares[contributor] > 0);
  shown.sort((one, other) => shares[other] - shares[one]);
  return (
    <table className={styles.budget}>
      <thead className="visually-hidden">
        <tr>
          <th>contributor</th>
          <th>rms</th>
          <th>share of power</th>
        </tr>
      </thead>
      <tbody>
        {shown.map((contributor) => (
          <tr key={contributor}>
            <th scope="row">
              <ContributorSwatch contributor={contributor} />
            </th>
            <td>
              <Figure value={contributions[contributor]} kind={kind} />
            </td>
            <td>{percentText(shares[contributor])}</td>
          </tr>
        ))}
        <tr className={styles.total}>
          <th scope="row">total, rms</th>
          <td>
            <Figure value={total} kind={kind} />
          </td>
          <td />
        </tr>
      </tbody>
    </table>
  );
}
