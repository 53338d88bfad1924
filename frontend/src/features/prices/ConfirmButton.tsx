import { MOST_OFFERS_SAVED } from '@roothertz/common/prices';
import { Button } from 'antd';
import { grouped } from '../../components/countOf';
import { isConfirmable } from './confirmable';
import type { ShownRow } from './draft/shownRows';

interface ConfirmButtonProps {
  rows: readonly ShownRow[];
  selected: readonly ShownRow[];
  /** All rows of the list are loaded. */
  areAllLoaded: boolean;
  isPending: boolean;
  onConfirm: (rows: readonly ShownRow[]) => void;
}

/** Confirms the selected offers, or all that are shown where none is selected. */
export function ConfirmButton({ rows, selected, areAllLoaded, isPending, onConfirm }: ConfirmButtonProps) {
  const meant = (selected.length > 0 ? selected : rows).filter(isConfirmable);
  const which = selected.length > 0 ? 'selected' : areAllLoaded ? 'shown' : 'loaded';
  const isTooMany = meant.length > MOST_OFFERS_SAVED;
  return (
    <Button
      disabled={meant.length === 0 || isTooMany}
      loading={isPending}
      title={isTooMany ? `At most ${MOST_OFFERS_SAVED} at once: narrow the list first` : undefined}
      onClick={() => onConfirm(meant)}
    >
      Confirm the {grouped(meant.length)} {which} as still valid
    </Button>
  );
}
