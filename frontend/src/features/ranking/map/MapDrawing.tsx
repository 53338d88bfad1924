import { useMemo, type ReactNode, type Ref } from 'react';
import type { QuietestMap } from '../../../api/quietestMap';
import { FONT_FAMILY, type Tokens } from '../../../theme';
import { MapAxes } from './MapAxes';
import { borderPath, MAP_HEIGHT, MAP_WIDTH, surfacePath, type MapGeometry } from './mapGeometry';
import { labelSpot, territoriesOf, type Territory } from './territories';
import { TerritoryPattern } from './territoryStyles';

interface MapDrawingProps {
  map: QuietestMap;
  geometry: MapGeometry;
  tokens: Tokens;
  /** Makes the patterns' names the page's only ones. */
  id: string;
  selectedId: string;
  ref: Ref<SVGSVGElement>;
  /** What lies over the territories. */
  children: ReactNode;
}

const CHARACTER = 6.4;
const LABEL_HEIGHT = 14;

/** The territories with their labels and axes, in colours of its own so that it can be saved. */
export function MapDrawing({ map, geometry, tokens, id, selectedId, ref, children }: MapDrawingProps) {
  const { parts, winners } = map;
  const territories = useMemo(() => territoriesOf(winners), [winners]);
  const selected = parts.findIndex((part) => part.id === selectedId);
  return (
    <svg
      ref={ref}
      xmlns="http://www.w3.org/2000/svg"
      viewBox={`0 0 ${MAP_WIDTH} ${MAP_HEIGHT}`}
      fontFamily={FONT_FAMILY}
      fontSize={12}
      aria-hidden="true"
    >
      <defs>
        {parts.map((part, index) => (
          <TerritoryPattern key={part.id} id={`${id}-${index}`} index={index} tokens={tokens} />
        ))}
      </defs>
      {territories.map(({ part, cells }, index) => (
        <path
          key={index}
          d={surfacePath(cells, geometry)}
          fill={part < 0 ? 'none' : `url(#${id}-${part})`}
          shapeRendering="crispEdges"
        />
      ))}
      <path d={borderPath(winners, geometry)} stroke={tokens.ink} strokeWidth={0.7} />
      {selected >= 0 && (
        <path d={borderPath(winners, geometry, selected)} stroke={tokens.damson} strokeWidth={2.2} />
      )}
      <MapAxes map={map} geometry={geometry} tokens={tokens} />
      {children}
      {territories.map((territory, index) => (
        <TerritoryLabel
          key={index}
          territory={territory}
          name={parts[territory.part]?.partNumber ?? 'no part'}
          isSelected={territory.part === selected && selected >= 0}
          geometry={geometry}
          tokens={tokens}
        />
      ))}
    </svg>
  );
}

interface TerritoryLabelProps {
  territory: Territory;
  name: string;
  isSelected: boolean;
  geometry: MapGeometry;
  tokens: Tokens;
}

/** The part number in its territory, where there is room for it. */
function TerritoryLabel({ territory, name, isSelected, geometry, tokens }: TerritoryLabelProps) {
  const { left, bottom, cellWidth, cellHeight } = geometry;
  const width = name.length * CHARACTER + 4;
  const spot = labelSpot(territory, width / cellWidth, LABEL_HEIGHT / cellHeight);
  if (spot === null) return null;
  return (
    <text
      x={left + spot.x * cellWidth}
      y={bottom - spot.y * cellHeight + 4}
      textAnchor="middle"
      fontWeight={isSelected ? 700 : 600}
      fill={territory.part < 0 ? tokens.muted : isSelected ? tokens.damson : tokens.ink}
      stroke={tokens.sheet}
      strokeWidth={3}
      strokeLinejoin="round"
      paintOrder="stroke"
    >
      {name}
    </text>
  );
}
