import { CONTRIBUTORS, type Contributor } from '@roothertz/common/noise';
import type { ReactNode } from 'react';
import { variableOf } from '../../theme';
import { CONTRIBUTOR_STYLES, type ContributorStyle } from './contributors';

/** The `fill` of a contributor's surface, where the page holds `ContributorPatterns`. */
export function patternUrl(contributor: Contributor): string {
  return `url(#contributor-${contributor})`;
}

const MARKS: Record<ContributorStyle['pattern'], ReactNode> = {
  plain: null,
  rising: <path d="M-1 1L1-1M0 6L6 0M5 7L7 5" />,
  falling: <path d="M-1 5L1 7M0 0L6 6M5-1L7 1" />,
  dots: <path d="M1.5 1.5h.01M4.5 4.5h.01" strokeLinecap="round" strokeWidth={1.8} />,
  bars: <path d="M1.5 0V6M4.5 0V6" />,
  crossed: <path d="M0 0L6 6M0 6L6 0" />,
};

/** The patterns that tell contributors apart without colour; once on a page that draws budgets. */
export function ContributorPatterns() {
  return (
    <svg aria-hidden="true" width={0} height={0} style={{ position: 'absolute' }}>
      <defs>
        {CONTRIBUTORS.map((contributor) => {
          const { colour, pattern } = CONTRIBUTOR_STYLES[contributor];
          return (
            <pattern
              key={contributor}
              id={`contributor-${contributor}`}
              width={6}
              height={6}
              patternUnits="userSpaceOnUse"
            >
              <rect width={6} height={6} fill={`var(${variableOf(colour)})`} />
              <g stroke="var(--sheet)" strokeWidth={1} opacity={0.75}>
                {MARKS[pattern]}
              </g>
            </pattern>
          );
        })}
      </defs>
    </svg>
  );
}
