import type { Offer, PriceHistory } from '../../../api/prices';

/** The price of one supplier over time: each point holds until the next; null = no price from then on. */
export interface PriceLine {
  name: string;
  points: readonly (readonly [moment: number, price: number | null])[];
}

/** The steps of a history as a line for each supplier, and for each of its numbers where it has several. */
export function priceLines({ items }: PriceHistory, offers: readonly Offer[], now: number): PriceLine[] {
  const numbers = new Map(offers.map(({ id, supplierNumber }) => [id, supplierNumber]));
  const lines = new Map<string, PriceHistory['items']>();
  for (const step of items) {
    const key = `${step.supplier.name}\n${numbers.get(step.offerId) ?? ''}`;
    lines.set(key, [...(lines.get(key) ?? []), step]);
  }
  const keys = [...lines.keys()];
  return [...lines].map(([key, steps]) => ({ name: nameOf(key, keys), points: pointsOf(steps, now) }));
}

function nameOf(key: string, keys: readonly string[]): string {
  const [supplier, number] = key.split('\n');
  const isAlone = keys.filter((other) => other.startsWith(`${supplier}\n`)).length === 1;
  return isAlone || number === '' ? supplier : `${supplier}, ${number}`;
}

function pointsOf(steps: PriceHistory['items'], now: number): PriceLine['points'] {
  return steps.flatMap(({ from, until, unitPrice }, index) => {
    const price = unitPrice === null ? null : Number(unitPrice);
    const end = until === null ? now : Date.parse(until);
    const isFollowed = steps[index + 1]?.from === until;
    const start = [Date.parse(from), price] as const;
    return isFollowed ? [start] : [start, [end, price] as const, [end, null] as const];
  });
}
