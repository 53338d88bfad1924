import { useQuery } from '@tanstack/react-query';
import { gapCountsQuery } from '../../api/parts';
import { GapCounts } from '../../features/parts/completeness/GapCounts';
import { GapTable } from '../../features/parts/completeness/GapTable';
import { countOf, grouped } from '../../components/countOf';
import type { KindOfPart } from '../../features/parts/kindOfPart';
import { PartsFilters } from '../../features/parts/PartsFilters';
import { usePartsView } from '../../features/parts/usePartsView';
import { useDebounced } from '../../components/useDebounced';
import { PartsHead } from './PartsHead';
import styles from './PartsPage.module.css';

const PAUSE_IN_TYPING = 300;

/** Which parts lack what, and where it is filled in. */
export function CompletenessPage({ kind }: { kind: KindOfPart }) {
  const { view, change } = usePartsView(kind);
  const { missing = [], sort: _, ...filters } = view;
  const search = useDebounced(view.search.trim(), PAUSE_IN_TYPING);
  const asked = { ...filters, search: search || undefined };
  const { data: counts } = useQuery(gapCountsQuery(kind.reader, asked));
  const narrowed = { ...view, search };
  return (
    <div className={styles.sheet}>
      <title>{`${kind.title}s, completeness · Roothertz`}</title>
      <PartsHead
        kind={kind}
        place="completeness"
        facts={counts && `${countOf(counts.total, 'part')}, ${grouped(counts.complete)} complete`}
      />
      <PartsFilters kind={kind} view={view} change={change} />
      {counts && (
        <GapCounts
          kind={kind}
          counts={counts}
          chosen={missing}
          onChoose={(next) => change({ missing: next })}
        />
      )}
      <GapTable key={JSON.stringify(narrowed)} kind={kind} view={narrowed} />
    </div>
  );
}
