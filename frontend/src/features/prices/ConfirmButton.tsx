import { Button } from 'antd';
import { MOST_SAVED } from '../../api/prices';
import { isConfirmable } from './confirmable';
import type { ShownRow } from './draft/shownRows';

interface ConfirmButtonProps {
  rows: readonly ShownRow[];
  selected: readonly ShownRow[];
  isPending: boolean;
  onConfirm: (rows: readonly ShownRow[]) => void;
}

/** Confirms the selected offers, or all that are shown where none is selected. */
export function ConfirmButton({ rows, selected, isPending, onConfirm }: ConfirmButtonProps) {
  const meant = (selected.length > 0 ? selected : rows).filter(isConfirmable);
  const which = selected.length > 0 ? 'selected' : 'shown';
  const isTooMany = meant.length > MOST_SAVED;
  return (
    <Button
      disabled={meant.length === 0 || isTooMany}
      loading={isPending}
      title={isTooMany ? `At most ${MOST_SAVED} at once: narrow the list first` : undefined}
      onClick={() => onConfirm(meant)}
    >
      Confirm the {meant.length} {which} as still valid
    </Button>
  );
}
