import type { QuantityKind } from '@roothertz/common/units';
import { csvText, heading } from '../../../components/charts/plotCsv';
import { QUANTITIES } from '@roothertz/common/units';

/** A part or stage by what it costs and how much noise it makes. */
export interface PricePoint {
  id: string;
  /** in full */
  name: string;
  /** the part alone, for where there is little room */
  partNumber: string;
  /** of a piece, in the team's currency */
  price: number;
  /** V or A */
  noise: number;
  /** No other is both as quiet and as cheap. */
  isOnFrontier: boolean;
}

export interface PricePlot {
  title: string;
  currency: string;
  quantity: number;
  kind: QuantityKind;
  /** of the source alone; 0 = none */
  floor: number;
  /** in ascending order of price */
  points: PricePoint[];
  /** what is ranked without a price, as far as it is loaded */
  unpriced: Pick<PricePoint, 'id' | 'name' | 'partNumber'>[];
}

interface Priced {
  id: string;
  name: string;
  partNumber: string;
  noise: number;
  unitPrice: { amount: string; currency: string } | null;
}

type Frame = Pick<PricePlot, 'quantity' | 'kind' | 'floor'>;

/** The plot of what is loaded of a ranking and of the frontier of all that is ranked. */
export function pricePlot(ranked: readonly Priced[], frontier: readonly Priced[], frame: Frame): PricePlot {
  const onFrontier = new Set(frontier.map(({ id }) => id));
  const all = [...frontier, ...ranked.filter(({ id }) => !onFrontier.has(id))];
  const points = all.flatMap(({ unitPrice, ...point }) =>
    unitPrice === null
      ? []
      : [{ ...point, price: Number(unitPrice.amount), isOnFrontier: onFrontier.has(point.id) }],
  );
  return {
    title: 'Noise against price',
    currency: all.find(({ unitPrice }) => unitPrice !== null)?.unitPrice?.currency ?? '',
    ...frame,
    points: points.sort((one, other) => one.price - other.price || one.noise - other.noise),
    unpriced: ranked.filter(({ unitPrice }) => unitPrice === null),
  };
}

/** The plot as CSV: a row for each part, those without a price last. */
export function pricePlotCsv({ currency, quantity, kind, points, unpriced }: PricePlot): string {
  const header = [
    'part',
    heading(`price at ${quantity}`, currency),
    heading('input noise rms', QUANTITIES[kind].unit),
    'on the frontier',
  ];
  const rows = points.map(({ name, price, noise, isOnFrontier }) => [
    name,
    price,
    noise,
    isOnFrontier ? 'yes' : 'no',
  ]);
  return csvText(header, [...rows, ...unpriced.map(({ name }) => [name, 'no price', '', ''])]);
}
