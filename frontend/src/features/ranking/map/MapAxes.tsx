import type { QuietestMap } from '../../../api/quietestMap';
import { axisName, tickText } from '../../../components/charts/axisText';
import type { Tokens } from '../../../theme';
import { decadesOn, MAP_HEIGHT, type MapGeometry } from './mapGeometry';

interface MapAxesProps {
  map: QuietestMap;
  geometry: MapGeometry;
  tokens: Tokens;
}

/** Both axes with a label at each decade. */
export function MapAxes({ map, geometry, tokens }: MapAxesProps) {
  const { left, right, top, bottom, xOf, yOf } = geometry;
  return (
    <g fill={tokens.muted}>
      <path d={`M${left} ${top}V${bottom}H${right}`} fill="none" stroke={tokens.muted} />
      {decadesOn(map.resistances).map((resistance) => (
        <text key={resistance} x={xOf(resistance)} y={bottom + 15} textAnchor="middle">
          {tickText(resistance, 'resistance')}
        </text>
      ))}
      {decadesOn(map.frequencies).map((frequency) => (
        <text key={frequency} x={left - 6} y={yOf(frequency) + 4} textAnchor="end">
          {tickText(frequency, 'frequency')}
        </text>
      ))}
      <text x={6} y={13}>
        {axisName('frequency', 'frequency')}
      </text>
      <text x={(left + right) / 2} y={MAP_HEIGHT - 5} textAnchor="middle">
        {axisName('source resistance', 'resistance')}
      </text>
    </g>
  );
}
