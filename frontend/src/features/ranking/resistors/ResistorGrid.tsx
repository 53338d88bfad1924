import { useMemo, useState } from 'react';
import { RowsGrid } from '../RowsGrid';
import { resistorColumns } from './resistorColumns';
import { resistorRows } from './resistorRows';
import type { ShownResistors } from './useResistors';

interface ResistorGridProps {
  resistors: ShownResistors;
  isStale: boolean;
  onNearEnd: () => void;
}

/** The resistors as rows. */
export function ResistorGrid({ resistors, ...state }: ResistorGridProps) {
  const { unit, priceHeading, rows } = useMemo(() => resistorRows(resistors), [resistors]);
  const columns = useMemo(() => resistorColumns(unit, priceHeading), [unit, priceHeading]);
  const [selectedId, setSelectedId] = useState<string | null>(null);
  return (
    <RowsGrid
      label="Resistors"
      rows={rows}
      columns={columns}
      selectedId={selectedId}
      onSelect={setSelectedId}
      {...state}
    />
  );
}
