import { CONTRIBUTOR_LABELS, CONTRIBUTORS, type Contributions } from '@roothertz/common/noise';
import { ContributorSwatch } from '../../components/charts/ContributorSwatch';
import { patternUrl } from '../../components/charts/ContributorPatterns';
import { percentText, sharesOf } from '../../components/charts/shares';
import { BAR_WIDTH, type Bar } from './barScale';

const HEIGHT = 11;

/** A row's noise powers side by side; an arrow where the bar goes on beyond its place. */
export function BudgetBar({ bar, contributions }: { bar: Bar; contributions: Contributions }) {
  const description = describeBudget(contributions);
  return (
    <svg role="img" aria-label={description} width={BAR_WIDTH + 8} height={HEIGHT}>
      <title>{description}</title>
      {bar.pieces.map(({ contributor, x, width }) => (
        <rect key={contributor} x={x} width={width} height={HEIGHT} fill={patternUrl(contributor)} />
      ))}
      {bar.overflows && (
        <path
          d={`M${BAR_WIDTH - 6} 0h4l4.5 ${HEIGHT / 2}l-4.5 ${HEIGHT / 2}h-4l4.5-${HEIGHT / 2}z`}
          fill="var(--sheet)"
          stroke="var(--ink)"
          strokeWidth={0.8}
        />
      )}
    </svg>
  );
}

function describeBudget(contributions: Contributions): string {
  const shares = sharesOf(contributions);
  return CONTRIBUTORS.filter((contributor) => shares[contributor] > 0)
    .map((contributor) => `${CONTRIBUTOR_LABELS[contributor]} ${percentText(shares[contributor])}`)
    .join(', ');
}

/** What the colours and patterns of the bars stand for; only what the rows have. */
export function BudgetLegend({ rows }: { rows: readonly { budget: { contributions: Contributions } }[] }) {
  const shown = CONTRIBUTORS.filter((contributor) =>
    rows.some(({ budget }) => budget.contributions[contributor] > 0),
  );
  return (
    <>
      {shown.map((contributor) => (
        <ContributorSwatch key={contributor} contributor={contributor} />
      ))}
    </>
  );
}
