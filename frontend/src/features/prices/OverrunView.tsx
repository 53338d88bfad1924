import { Button } from 'antd';
import { cellLabel } from './draft/cells';
import { type Difference, differences } from './draft/overruns';
import type { ShownRow } from './draft/shownRows';
import styles from './OverrunView.module.css';
import type { PriceDraft } from './usePriceDraft';

interface OverrunViewProps {
  draft: PriceDraft;
  row: ShownRow;
  /** The choice is made and the view is about to go: the focus needs another place. */
  onSettled: () => void;
}

/** What somebody else has made of an offer beside what I was about to, and which of them is to stand. */
export function OverrunView({ draft, row, onSettled }: OverrunViewProps) {
  if (!row.change) return null;
  const isClosed = row.overrun === 'closed';
  const settle = (choose: () => void) => () => {
    choose();
    onSettled();
  };
  return (
    <div className={styles.overrun}>
      <table className={styles.table} aria-label={`Theirs and yours for ${row.part.partNumber}`}>
        <thead>
          <tr>
            <th scope="col">{row.offer?.supplier.name}</th>
            <th scope="col">was</th>
            <th scope="col">theirs</th>
            <th scope="col">yours</th>
          </tr>
        </thead>
        <tbody>
          {differences(row, row.change).map((difference) => (
            <DifferenceRow key={difference.cell} difference={difference} isClosed={isClosed} />
          ))}
        </tbody>
      </table>
      <Button size="small" onClick={settle(() => draft.keepMine(row))}>
        {isClosed ? 'Open it again with mine' : 'Keep mine'}
      </Button>
      <Button size="small" onClick={settle(() => draft.dropRow(row.key))}>
        {isClosed ? 'Leave it closed' : 'Take theirs'}
      </Button>
    </div>
  );
}

function DifferenceRow({ difference, isClosed }: { difference: Difference; isClosed: boolean }) {
  const { cell, was, theirs, mine } = difference;
  return (
    <tr>
      <th scope="row">{cellLabel(cell)}</th>
      <td>{was || 'none'}</td>
      <td>{isClosed ? 'closed' : theirs || 'none'}</td>
      <td>{mine || 'none'}</td>
    </tr>
  );
}
