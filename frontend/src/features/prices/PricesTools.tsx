import { OFFER_FIELDS } from '@roothertz/common/prices';
import { Button, Input } from 'antd';
import { useState } from 'react';
import { readCount } from './draft/readCell';
import type { ShownRow } from './draft/shownRows';
import styles from './PricesTools.module.css';

interface PricesToolsProps {
  /** The row that has the focus. */
  row: ShownRow | undefined;
  mayEdit: boolean;
  isPanelOpen: boolean;
  onNewOffer: (row: ShownRow) => void;
  onCloseOffer: (row: ShownRow) => void;
  onPanel: () => void;
  onColumn: (quantity: number) => void;
  onSettings: () => void;
}

/** What can be done with the row that has the focus, and with the grid. */
export function PricesTools(props: PricesToolsProps) {
  const { row, mayEdit, isPanelOpen, onNewOffer, onCloseOffer, onPanel, onColumn, onSettings } = props;
  const name = row?.part.partNumber;
  return (
    <div className={styles.tools}>
      <Button disabled={!row} aria-pressed={isPanelOpen} onClick={onPanel}>
        Price history
      </Button>
      {mayEdit && (
        <>
          <Button disabled={!row} onClick={() => row && onNewOffer(row)}>
            New offer{name && ` for ${name}`}
          </Button>
          <Button disabled={!row?.offer} onClick={() => row && onCloseOffer(row)}>
            Close this offer
          </Button>
          <AddColumn onColumn={onColumn} />
        </>
      )}
      <Button onClick={onSettings}>Currency and rates</Button>
    </div>
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
