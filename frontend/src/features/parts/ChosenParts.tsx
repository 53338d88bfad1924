import type { AgGridReact } from 'ag-grid-react';
import { useRef, useState } from 'react';
import type { StoredPart } from '../../api/parts';
import { useMayDo } from '../../components/useMember';
import type { KindOfPart } from './kindOfPart';
import { PartsGrid } from './PartsGrid';
import styles from './PartsGrid.module.css';
import { StandingBar } from './standing/StandingBar';

interface ChosenPartsProps {
  kind: KindOfPart;
  parts: readonly StoredPart[];
  /** Parts that the filters let through; only the first of them are listed. */
  total: number;
  sort?: string;
  onSort: (sort: string | undefined) => void;
}

const NONE: ReadonlySet<string> = new Set();

/** The list, and below it what can be done with the parts chosen in it. */
export function ChosenParts({ kind, parts, total, sort, onSort }: ChosenPartsProps) {
  const mayEdit = useMayDo('parts.edit');
  const [ids, setIds] = useState(NONE);
  const grid = useRef<AgGridReact<StoredPart>>(null);
  const chosen = parts.filter(({ id }) => ids.has(id));
  const clear = () => grid.current?.api.deselectAll();
  return (
    <div className={styles.chosen}>
      <PartsGrid
        ref={grid}
        kind={kind}
        parts={parts}
        sort={sort}
        onSort={onSort}
        onChoose={mayEdit ? setIds : null}
      />
      {chosen.length > 0 && (
        <StandingBar
          kind={kind}
          parts={chosen}
          unlisted={chosen.length === parts.length ? total - parts.length : 0}
          onClear={clear}
        />
      )}
    </div>
  );
}
