import type { Tokens } from '../../../theme';
import type { MapGeometry } from './mapGeometry';
import type { Cell } from './territories';

interface MapMarksProps {
  geometry: MapGeometry;
  tokens: Tokens;
  /** The present conditions, Ω and Hz. */
  present: { resistance: number; frequency: number };
  /** The cell that is looked at. */
  cursor: Cell | null;
}

/** Where the present conditions lie, and the cell that is looked at. */
export function MapMarks({ geometry, tokens, present, cursor }: MapMarksProps) {
  const { left, right, top, bottom, cellWidth, cellHeight, xOf, yOf } = geometry;
  const [x, y] = [xOf(present.resistance), yOf(present.frequency)];
  return (
    <>
      <path d={`M${x} ${top}V${bottom}M${left} ${y}H${right}`} stroke={tokens.ink} strokeDasharray="2 3" />
      <circle cx={x} cy={y} r={5} fill={tokens.sheet} stroke={tokens.ink} strokeWidth={2} />
      <circle cx={x} cy={y} r={1.6} fill={tokens.ink} />
      {cursor && (
        <rect
          x={left + cursor.column * cellWidth}
          y={bottom - (cursor.row + 1) * cellHeight}
          width={cellWidth}
          height={cellHeight}
          fill="none"
          stroke={tokens.ink}
          strokeWidth={2}
        />
      )}
    </>
  );
}
