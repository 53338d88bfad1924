import { useState, type KeyboardEvent, type PointerEvent, type MouseEvent } from 'react';
import type { QuietestMap } from '../../../api/quietestMap';
import { MAP_HEIGHT, MAP_WIDTH, type MapGeometry } from './mapGeometry';
import type { Cell } from './territories';

const STEPS: Record<string, Cell> = {
  ArrowLeft: { column: -1, row: 0 },
  ArrowRight: { column: 1, row: 0 },
  ArrowDown: { column: 0, row: -1 },
  ArrowUp: { column: 0, row: 1 },
};

/** The cell that is looked at, by pointer or by arrow keys; a click or Enter takes it. */
export function useMapCursor(
  { resistances, frequencies }: QuietestMap,
  geometry: MapGeometry,
  present: Cell,
  onTake: (cell: Cell) => void,
) {
  const [cursor, setCursor] = useState<Cell | null>(null);
  const under = (event: MouseEvent<HTMLElement>) => {
    const box = event.currentTarget.getBoundingClientRect();
    const scale = MAP_WIDTH / box.width;
    return geometry.cellAt(
      (event.clientX - box.left) * scale,
      ((event.clientY - box.top) * MAP_HEIGHT) / box.height,
    );
  };
  const moved = ({ column, row }: Cell, step: Cell): Cell => ({
    column: within(column + step.column, resistances.length),
    row: within(row + step.row, frequencies.length),
  });
  const onKeyDown = (event: KeyboardEvent) => {
    const step = STEPS[event.key];
    if (event.key === 'Escape') return setCursor(null);
    if (step === undefined && event.key !== 'Enter') return;
    event.preventDefault();
    if (step) setCursor(moved(cursor ?? present, step));
    else if (cursor) {
      onTake(cursor);
      setCursor(null);
    }
  };
  return {
    cursor,
    handlers: {
      onKeyDown,
      onPointerMove: (event: PointerEvent<HTMLElement>) => setCursor(under(event)),
      onPointerLeave: () => setCursor(null),
      onBlur: () => setCursor(null),
      onClick: (event: MouseEvent<HTMLElement>) => onTake(under(event)),
    },
  };
}

function within(index: number, count: number): number {
  return Math.min(count - 1, Math.max(0, index));
}
