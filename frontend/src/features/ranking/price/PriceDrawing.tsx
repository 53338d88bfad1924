import { useMemo, type Ref } from 'react';
import { axisName, tickText } from '../../../components/charts/axisText';
import { FONT_FAMILY, type Tokens } from '../../../theme';
import { amountText } from '../priceWords';
import { frontierPath, PRICE_HEIGHT, PRICE_WIDTH, type PriceGeometry } from './priceGeometry';
import type { PricePlot, PricePoint } from './pricePlot';

interface PriceDrawingProps {
  plot: PricePlot;
  geometry: PriceGeometry;
  tokens: Tokens;
  selected: PricePoint | undefined;
  cursor: PricePoint | undefined;
  ref: Ref<SVGSVGElement>;
}

/** Each part at its price and noise, the frontier as steps, in colours of its own so that it can be saved. */
export function PriceDrawing({ plot, geometry, tokens, selected, cursor, ref }: PriceDrawingProps) {
  const { points, floor } = plot;
  const { left, right, bottom, xOf, yOf } = geometry;
  const path = useMemo(() => frontierPath(points, geometry), [points, geometry]);
  return (
    <svg
      ref={ref}
      xmlns="http://www.w3.org/2000/svg"
      viewBox={`0 0 ${PRICE_WIDTH} ${PRICE_HEIGHT}`}
      fontFamily={FONT_FAMILY}
      fontSize={12}
      aria-hidden="true"
    >
      <Axes plot={plot} geometry={geometry} tokens={tokens} />
      {floor > 0 && (
        <>
          <path d={`M${left} ${yOf(floor)}H${right}`} stroke={tokens.slate} strokeWidth={3} />
          <text
            x={right}
            y={yOf(floor) + (bottom - yOf(floor) > 20 ? 14 : -5)}
            textAnchor="end"
            fill={tokens.muted}
          >
            source floor
          </text>
        </>
      )}
      <path d={path} fill="none" stroke={tokens.ink} strokeWidth={1.3} />
      {points.map((point) => (
        <Mark
          key={point.id}
          x={xOf(point.price)}
          y={yOf(point.noise)}
          isOnFrontier={point.isOnFrontier}
          isSelected={point === selected}
          tokens={tokens}
        />
      ))}
      {selected && <Label point={selected} geometry={geometry} tokens={tokens} />}
      {cursor && (
        <circle
          cx={xOf(cursor.price)}
          cy={yOf(cursor.noise)}
          r={8}
          fill="none"
          stroke={tokens.ink}
          strokeWidth={1.5}
        />
      )}
    </svg>
  );
}

interface MarkProps {
  x: number;
  y: number;
  isOnFrontier: boolean;
  isSelected: boolean;
  tokens: Tokens;
}

/** A diamond on the frontier, elsewhere a ring; the selected one filled in the accent. */
function Mark({ x, y, isOnFrontier, isSelected, tokens }: MarkProps) {
  const colour = isSelected ? tokens.damson : isOnFrontier ? tokens.ink : tokens.muted;
  const fill = isSelected || isOnFrontier ? colour : tokens.sheet;
  return isOnFrontier ? (
    <path d={`M${x} ${y - 5.5}l5.5 5.5l-5.5 5.5l-5.5 -5.5z`} fill={fill} stroke={tokens.sheet} />
  ) : (
    <circle cx={x} cy={y} r={isSelected ? 4.5 : 3} fill={fill} stroke={colour} strokeWidth={1.2} />
  );
}

interface LabelProps {
  point: PricePoint;
  geometry: PriceGeometry;
  tokens: Tokens;
}

function Label({ point, geometry: { xOf, yOf, left, right, top }, tokens }: LabelProps) {
  const [x, y] = [xOf(point.price), yOf(point.noise)];
  const isRight = x > (left + right) / 2;
  return (
    <text
      x={isRight ? x - 8 : x + 8}
      y={y - 8 < top + 4 ? y + 16 : y - 8}
      textAnchor={isRight ? 'end' : 'start'}
      fontWeight={600}
      fill={tokens.damson}
      stroke={tokens.sheet}
      strokeWidth={3}
      strokeLinejoin="round"
      paintOrder="stroke"
    >
      {shortened(point.partNumber)}
    </text>
  );
}

const LONGEST = 20;

function shortened(text: string): string {
  return text.length > LONGEST ? `${text.slice(0, LONGEST - 1)}…` : text;
}

type AxesProps = Pick<PriceDrawingProps, 'plot' | 'geometry' | 'tokens'>;

function Axes({ plot: { kind, currency, quantity }, geometry, tokens }: AxesProps) {
  const { left, right, top, bottom, xOf, yOf, priceTicks, noiseTicks } = geometry;
  return (
    <g fill={tokens.muted}>
      {noiseTicks.map((noise) => (
        <path key={noise} d={`M${left} ${yOf(noise)}H${right}`} stroke={tokens.rule} />
      ))}
      <path d={`M${left} ${top}V${bottom}H${right}`} fill="none" stroke={tokens.muted} />
      {priceTicks.map((price) => (
        <text key={price} x={xOf(price)} y={bottom + 15} textAnchor="middle">
          {amountText({ amount: String(price) })}
        </text>
      ))}
      {noiseTicks.map((noise) => (
        <text key={noise} x={left - 6} y={yOf(noise) + 4} textAnchor="end">
          {tickText(noise, kind)}
        </text>
      ))}
      <text x={6} y={13}>
        {axisName('input noise rms', kind)}
      </text>
      <text x={(left + right) / 2} y={PRICE_HEIGHT - 5} textAnchor="middle">
        {`price at ${quantity}, ${currency}`}
      </text>
    </g>
  );
}
