import type { AgGridReact } from 'ag-grid-react';
import { useCallback, useRef, useState } from 'react';
import type { PartListFilter, StoredPart } from '../../api/parts';
import { useMayDo } from '../../components/useMember';
import type { KindOfPart } from './kindOfPart';
import { PartsGrid } from './PartsGrid';
import styles from './PartsGrid.module.css';
import { MatchingBar } from './standing/MatchingBar';
import { StandingBar } from './standing/StandingBar';

interface ChosenPartsProps {
  kind: KindOfPart;
  parts: readonly StoredPart[];
  /** Parts that match; only the first of them are listed. */
  matching: number;
  /** What they match. */
  filter: PartListFilter;
  sort?: string;
  onSort: (sort: string | undefined) => void;
}

const NONE: ReadonlySet<string> = new Set();

/** The list, and below it what can be done with the parts chosen in it, or with all that match. */
export function ChosenParts({ kind, parts, matching, filter, sort, onSort }: ChosenPartsProps) {
  const mayEdit = useMayDo('parts.edit');
  const [ids, setIds] = useState(NONE);
  const [matched, setMatched] = useState<string | null>(null);
  const grid = useRef<AgGridReact<StoredPart>>(null);
  const chosen = parts.filter(({ id }) => ids.has(id));
  const filterKey = JSON.stringify(filter);
  const isWhole = chosen.length === parts.length && matching > parts.length;
  const clear = () => {
    setMatched(null);
    grid.current?.api.deselectAll();
  };
  const choose = useCallback((next: ReadonlySet<string>) => {
    setIds(next);
    setMatched(null);
  }, []);
  return (
    <div className={styles.chosen}>
      <PartsGrid
        ref={grid}
        kind={kind}
        parts={parts}
        sort={sort}
        onSort={onSort}
        onChoose={mayEdit ? choose : null}
      />
      {isWhole && matched === filterKey ? (
        <MatchingBar kind={kind} filter={filter} matching={matching} onClear={clear} />
      ) : (
        chosen.length > 0 && (
          <StandingBar
            kind={kind}
            parts={chosen}
            matching={isWhole ? matching : null}
            onClear={clear}
            onChooseMatching={() => setMatched(filterKey)}
          />
        )
      )}
    </div>
  );
}
