import type { ConditionFieldPath } from '@roothertz/common/conditions';
import { SCHEMATIC_WIDTH, type AmplifierPlace, type ElementPlace, type SchematicLayout } from './layout';
import { SYMBOLS } from './symbols';

const PALE = 0.28;

interface SchematicDrawingProps {
  layout: SchematicLayout;
  title: string;
  /** Whether the field's element isn't there, such as a coil of 0 H. */
  isAbsent: (field: ConditionFieldPath) => boolean;
  children: React.ReactNode;
}

/** The wires and the symbols of a stage; the discs lie between them and the values. */
export function SchematicDrawing({ layout, title, isAbsent, children }: SchematicDrawingProps) {
  const { height, wires, branches, amplifiers, elements } = layout;
  return (
    <svg
      role="img"
      aria-label={title}
      width={SCHEMATIC_WIDTH}
      height={height}
      viewBox={`0 0 ${SCHEMATIC_WIDTH} ${height}`}
    >
      {children}
      <g stroke="var(--ink)" color="var(--ink)" strokeWidth={1.4} fill="none" strokeLinejoin="round">
        <path d={wires} />
        {amplifiers.map((place) => (
          <path key={`${place.x} ${place.y}`} d={triangle(place)} />
        ))}
        {branches.map(({ field, path }) => (
          <path key={field} d={path} opacity={isAbsent(field) ? PALE : 1} />
        ))}
        {elements.map((element) => (
          <ElementSymbol
            key={`${element.symbol} ${element.x} ${element.y}`}
            element={element}
            absent={element.field !== undefined && isAbsent(element.field)}
          />
        ))}
      </g>
    </svg>
  );
}

function triangle({ x, y, small }: AmplifierPlace): string {
  return small ? `M${x} ${y - 23}v46l36-23z` : `M${x} ${y - 38}v76l58-38z`;
}

function ElementSymbol({ element, absent }: { element: ElementPlace; absent: boolean }) {
  const { symbol, x, y, vertical, inLine } = element;
  return (
    <g transform={`translate(${x} ${y})${vertical ? ' rotate(90)' : ''}`}>
      <g opacity={absent ? PALE : 1}>{SYMBOLS[symbol]}</g>
      {absent && inLine && <path d="M-18 0H18" />}
    </g>
  );
}
