import { Tooltip } from 'antd';
import type { ICellRendererParams } from 'ag-grid-community';
import type { ReactNode } from 'react';
import { isChanged, type ShownRow, textBefore } from './draft/shownRows';
import { useIsFocused } from './FocusedCell';
import styles from './PricesGrid.module.css';

interface EditedCellProps extends ICellRendererParams<ShownRow, string> {
  children?: ReactNode;
}

/** A cell with its text, a mark where it isn't saved yet, and the reason where it can't be taken. */
export function EditedCell({ data, value, column, children }: EditedCellProps) {
  if (!data || !column) return null;
  const id = column.getColId();
  const content = children ?? value;
  const error = data.errors.get(id);
  if (error !== undefined)
    return (
      <Refused row={data} column={id} message={error}>
        {content}
      </Refused>
    );
  if (!isChanged(data, id)) return children ?? <span title={value ?? undefined}>{value}</span>;
  const before = textBefore(data, id);
  return (
    <span className={styles.changed} title={before === '' ? 'not saved yet' : `not saved yet; was ${before}`}>
      {content}
      <span className="visually-hidden">, not saved yet</span>
    </span>
  );
}

interface RefusedProps {
  row: ShownRow;
  column: string;
  message: string;
  children: ReactNode;
}

function Refused({ row, column, message, children }: RefusedProps) {
  const isFocused = useIsFocused(row.key, column);
  return (
    <Tooltip title={message} open={isFocused || undefined} placement="bottomLeft">
      <span className={styles.refused}>
        {children}
        <span className="visually-hidden">, refused: {message}</span>
      </span>
    </Tooltip>
  );
}
