import type { Contributor } from '@roothertz/common/noise';
import { patternUrl } from './ContributorPatterns';
import { CONTRIBUTOR_STYLES } from './contributors';

/** A contributor's colour and pattern with its name. */
export function ContributorSwatch({ contributor }: { contributor: Contributor }) {
  return (
    <span style={{ whiteSpace: 'nowrap' }}>
      <svg aria-hidden="true" width={11} height={11} style={{ marginRight: 5, verticalAlign: -1 }}>
        <rect width={11} height={11} fill={patternUrl(contributor)} />
      </svg>
      {CONTRIBUTOR_STYLES[contributor].name}
    </span>
  );
}
