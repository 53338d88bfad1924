import { CONTRIBUTOR_LABELS } from '@roothertz/common/noise';
import { CONTRIBUTOR_STYLES } from '../../../components/charts/contributors';
import { percentText } from '../../../components/charts/shares';
import { variableOf } from '../../../theme';
import { discRadius } from './discRadius';
import type { DiscPlace } from './layout';

const LEAST_SHARE = 0.0005;

/** A noise generator on its element: the larger the disc, the larger its share of the noise. */
export function NoiseDisc({ place, share }: { place: DiscPlace; share: number }) {
  if (share < LEAST_SHARE) return null;
  const { colour, textColour, symbol } = CONTRIBUTOR_STYLES[place.contributor];
  const { x, y, anchor } = place.label;
  const fill = `var(${variableOf(colour)})`;
  return (
    <g>
      <title>{`${CONTRIBUTOR_LABELS[place.contributor]}: ${percentText(share)} of the noise power`}</title>
      <circle
        cx={place.x}
        cy={place.y}
        r={discRadius(share)}
        fill={fill}
        fillOpacity={0.28}
        stroke={fill}
        data-contributor={place.contributor}
      />
      <text x={x} y={y} textAnchor={anchor} fontSize={12.5} fill={`var(${variableOf(textColour)})`}>
        {symbol !== '' && <SymbolText symbol={symbol} />}
        {percentText(share)}
      </text>
    </g>
  );
}

function SymbolText({ symbol }: { symbol: string }) {
  return (
    <>
      <tspan fontStyle="italic">{symbol}</tspan>
      <tspan dy={3} fontSize={9.5}>
        n
      </tspan>
      <tspan dy={-3}> </tspan>
    </>
  );
}
