import { formatDay } from '../../components/formatDay';
import type { ICellRendererParams } from 'ag-grid-community';
import { Link } from 'react-router-dom';
import { isAdded } from './draft/draft';
import type { ShownRow } from './draft/shownRows';
import { EditedCell } from './EditedCell';
import { STATE_LABELS } from './pricesView';
import styles from './PricesGrid.module.css';

type Params = ICellRendererParams<ShownRow, string>;

export function PartCell(params: Params) {
  const { data } = params;
  if (!data) return null;
  const { id, kind, partNumber, manufacturer, library } = data.part;
  const path = kind === 'resistor' ? '/parts/resistors' : '/parts';
  return (
    <EditedCell {...params}>
      <Link
        to={`${path}/${id}`}
        tabIndex={-1}
        className={styles.part}
        title={`${partNumber}, ${manufacturer}`}
      >
        {partNumber}
      </Link>{' '}
      <span className={styles.maker}>
        {manufacturer}
        {library === 'curated' && ', curated'}
      </span>
    </EditedCell>
  );
}

/** What calls for a look at the offer, in words. */
export function StateCell(params: Params) {
  const { data } = params;
  if (!data) return null;
  return (
    <EditedCell {...params}>
      <StateWords row={data} />
    </EditedCell>
  );
}

function StateWords({ row }: { row: ShownRow }) {
  if (row.overrun) return <Overrun word={row.overrun} />;
  if (row.offer === null)
    return <span className={styles.quiet}>{isAdded(row.key) ? 'new' : STATE_LABELS.missing}</span>;
  const { states } = row.offer;
  const isAlarming = states.includes('expired');
  return (
    <span className={isAlarming ? styles.alarm : styles.caution}>
      {states.map((state) => STATE_LABELS[state]).join(', ')}
    </span>
  );
}

function Overrun({ word }: { word: string }) {
  return (
    <span className={styles.alarm} title={`${word} by somebody else`}>
      {word}
    </span>
  );
}

export function ConfirmedCell(params: Params) {
  const { data } = params;
  if (!data?.offer) return null;
  const { confirmedAt, confirmedBy } = data.offer;
  return (
    <EditedCell {...params}>
      {formatDay(confirmedAt)}
      {confirmedBy && <span className={styles.maker}> {confirmedBy.name}</span>}
    </EditedCell>
  );
}
