import { OFFER_FIELDS } from '@roothertz/common/prices';
import { Button, Input } from 'antd';
import { useState } from 'react';
import { grouped } from '../../components/countOf';
import { ConfirmButton } from './ConfirmButton';
import { readCount } from './draft/readCell';
import type { ShownRow } from './draft/shownRows';
import styles from './PricesTools.module.css';
import type { PriceList } from './usePriceList';

interface PricesToolsProps {
  /** The row that has the focus. */
  row: ShownRow | undefined;
  rows: readonly ShownRow[];
  selected: readonly ShownRow[];
  list: PriceList;
  mayEdit: boolean;
  isPanelOpen: boolean;
  isConfirming: boolean;
  onNewOffer: (row: ShownRow) => void;
  onCloseOffer: (row: ShownRow) => void;
  onPanel: () => void;
  onColumn: (quantity: number) => void;
  onSettings: () => void;
  onConfirm: (rows: readonly ShownRow[]) => void;
}

/** What can be done with the row that has the focus, and with the grid. */
export function PricesTools(props: PricesToolsProps) {
  const { row, list, mayEdit, isPanelOpen, onPanel, onSettings } = props;
  return (
    <div className={styles.bar}>
      <div className={styles.tools}>
        <Button disabled={!row} aria-pressed={isPanelOpen} onClick={onPanel}>
          Price history
        </Button>
        {mayEdit && <EditTools {...props} />}
        <Button onClick={onSettings}>Currency and rates</Button>
      </div>
      <Loaded list={list} />
      {mayEdit && (
        <ConfirmButton
          rows={props.rows}
          selected={props.selected}
          areAllLoaded={list.items.length >= list.total}
          isPending={props.isConfirming}
          onConfirm={props.onConfirm}
        />
      )}
    </div>
  );
}

function EditTools({ row, onNewOffer, onCloseOffer, onColumn }: PricesToolsProps) {
  const name = row?.part.partNumber;
  return (
    <>
      <Button disabled={!row} onClick={() => row && onNewOffer(row)}>
        New offer{name && ` for ${name}`}
      </Button>
      <Button disabled={!row?.offer} onClick={() => row && onCloseOffer(row)}>
        Close this offer
      </Button>
      <AddColumn onColumn={onColumn} />
    </>
  );
}

/** How much of a long list is loaded. */
function Loaded({ list: { items, total, isLoadingMore } }: { list: PriceList }) {
  if (items.length >= total) return null;
  return (
    <span className={styles.loaded}>
      {isLoadingMore
        ? `Loading more of ${grouped(total)} rows …`
        : `${grouped(items.length)} of ${grouped(total)} rows, more as you scroll`}
    </span>
  );
}

/** Another quantity to give prices at. */
function AddColumn({ onColumn }: { onColumn: (quantity: number) => void }) {
  const [text, setText] = useState('');
  const reading = readCount(OFFER_FIELDS.minimumQuantity, text);
  const add = () => {
    if (!reading.ok) return;
    onColumn(reading.value);
    setText('');
  };
  return (
    <Input
      className={styles.column}
      inputMode="numeric"
      aria-label="Add a column of prices at a quantity"
      placeholder="Prices at…"
      title="Enter adds a column of prices at this quantity"
      value={text}
      status={text !== '' && !reading.ok ? 'error' : ''}
      onChange={(event) => setText(event.target.value)}
      onPressEnter={add}
    />
  );
}
