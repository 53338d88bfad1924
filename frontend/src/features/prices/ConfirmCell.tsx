import type { ICellRendererParams } from 'ag-grid-community';
import { Button } from 'antd';
import { isConfirmable } from './confirmable';
import type { ShownRow } from './draft/shownRows';

interface ConfirmCellProps extends ICellRendererParams<ShownRow> {
  onConfirm: (rows: readonly ShownRow[]) => void;
}

/** One click says that the offer holds as it stands; Enter in the cell does too. */
export function ConfirmCell({ data, onConfirm }: ConfirmCellProps) {
  if (!data || !isConfirmable(data)) return null;
  return (
    <Button
      size="small"
      type="link"
      tabIndex={-1}
      style={{ fontSize: 14, paddingInline: 0 }}
      aria-label={`Confirm ${data.part.partNumber} of ${data.offer?.supplier.name} as still valid`}
      onClick={() => onConfirm([data])}
    >
      Still valid
    </Button>
  );
}
