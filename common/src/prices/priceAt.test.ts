import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { type ExchangeRates, type Offer, priceAt, scaledText, toScaled } from './index.js';

const TODAY = '2026-12-01';

function offer(changes: Partial<Offer> = {}): Offer {
  return {
    supplier: 'Brook & Weir',
    supplierNumber: '',
    currency: 'EUR',
    breaks: [
      { minimumQuantity: 1, unitPrice: '1.0000' },
      { minimumQuantity: 100, unitPrice: '0.9000' },
    ],
    minimumOrderQuantity: 1,
    orderMultiple: 1,
    leadTimeDays: null,
    stock: null,
    validFrom: '2026-01-01',
    validUntil: null,
    confirmedAt: '2026-11-01T09:00:00.000Z',
    ...changes,
  };
}

const at = (quantity: number, ...offers: Offer[]) => priceAt(offers, quantity, { USD: '0.9' }, 'EUR', TODAY);

describe('priceAt', () => {
  it('takes the break that the quantity reaches', () => {
    expect(at(99, offer())).toMatchObject({ minimumQuantity: 1, unitPrice: '1.0000', total: '99.0000' });
    expect(at(100, offer())).toMatchObject({ minimumQuantity: 100, unitPrice: '0.9000', total: '90.0000' });
  });

  it('says that 100 pieces cost less than 95, and not where they cost as much', () => {
    expect(at(95, offer())).toMatchObject({
      total: '95.0000',
      cheaperOrder: { orderQuantity: 100, minimumQuantity: 100, total: '90.0000' },
    });
    expect(at(90, offer())!.cheaperOrder).toBeNull();
  });

  it('counts what has to be bought: MOQ, order multiple and the first break', () => {
    expect(at(10, offer({ minimumOrderQuantity: 50 }))).toMatchObject({
      orderQuantity: 50,
      total: '50.0000',
      unitPrice: '5.0000',
    });
    expect(at(101, offer({ orderMultiple: 40 }))).toMatchObject({ orderQuantity: 120, total: '108.0000' });
    const fromTen = offer({ breaks: [{ minimumQuantity: 10, unitPrice: '2.5' }] });
    expect(at(3, fromTen)).toMatchObject({ orderQuantity: 10, minimumQuantity: 10, unitPrice: '8.3333' });
  });

  it('takes the supplier that is cheapest in all, in the team’s currency', () => {
    const dollars = offer({ supplier: 'Fenway', currency: 'USD' });
    expect(at(10, offer(), dollars)).toMatchObject({ offer: dollars, total: '9.0000' });
    expect(at(10, offer(), offer({ ...dollars, minimumOrderQuantity: 20 }))!.offer.currency).toBe('EUR');
  });

  it('passes over offers that aren’t valid and currencies without a rate', () => {
    expect(at(1)).toBeNull();
    expect(at(1, offer({ validFrom: '2026-12-02' }))).toBeNull();
    expect(at(1, offer({ validUntil: '2026-11-30' }))).toBeNull();
    expect(at(1, offer({ validUntil: TODAY }))).not.toBeNull();
    expect(at(1, offer({ currency: 'JPY' }))).toBeNull();
  });

  it('keeps money exact where binary fractions would not', () => {
    const tenths = offer({ breaks: [{ minimumQuantity: 1, unitPrice: '0.1' }] });
    expect(at(3, tenths)!.total).toBe('0.3000');
    const huge = offer({ breaks: [{ minimumQuantity: 1, unitPrice: '999999999.9999' }] });
    expect(at(1e9, huge)!.total).toBe('999999999999900000.0000');
  });

  it('equals the search through every quantity of every supplier', () => {
    fc.assert(
      fc.property(
        fc.array(anyOffer, { minLength: 1, maxLength: 4 }),
        fc.integer({ min: 1, max: 60 }),
        (offers, quantity) => {
          const rates = { USD: '0.875' };
          const found = priceAt(offers, quantity, rates, 'EUR', TODAY)!;
          const expected = bruteForce(offers, quantity, rates);
          expect(found.total).toBe(text(expected.least));
          expect(found.cheaperOrder?.total ?? found.total).toBe(text(expected.best));
          expect(found.orderQuantity).toBeGreaterThanOrEqual(quantity);
        },
      ),
      { numRuns: 400 },
    );
  });
});

const anyBreaks = fc
  .tuple(
    fc.uniqueArray(fc.integer({ min: 1, max: 50 }), { minLength: 1, maxLength: 4 }),
    fc.array(fc.integer({ min: 1, max: 30_000 }), { minLength: 4, maxLength: 4 }),
  )
  .map(([quantities, prices]) => {
    const falling = [...prices].sort((a, b) => b - a);
    return quantities
      .sort((a, b) => a - b)
      .map((minimumQuantity, n) => ({ minimumQuantity, unitPrice: scaledText(BigInt(falling[n]), 4) }));
  });

const anyOffer = fc
  .record({
    currency: fc.constantFrom('EUR', 'USD'),
    breaks: anyBreaks,
    minimumOrderQuantity: fc.integer({ min: 1, max: 40 }),
    orderMultiple: fc.integer({ min: 1, max: 12 }),
  })
  .map(offer);

/** Orders each quantity up to where no break follows: the least that covers the need, and the cheapest. */
function bruteForce(offers: Offer[], quantity: number, rates: ExchangeRates) {
  const least: bigint[] = [];
  const all: bigint[] = [];
  for (const { breaks, currency, minimumOrderQuantity, orderMultiple } of offers) {
    let isLeast = true;
    for (let pieces = quantity; pieces <= 200; pieces++) {
      const reached = breaks.filter((price) => price.minimumQuantity <= pieces);
      if (pieces % orderMultiple !== 0 || pieces < minimumOrderQuantity || reached.length === 0) continue;
      const rate = toScaled(currency === 'EUR' ? '1' : rates[currency]!, 8);
      const cost = BigInt(pieces) * toScaled(reached.at(-1)!.unitPrice, 4) * rate;
      if (isLeast) least.push(cost);
      isLeast = false;
      all.push(cost);
    }
  }
  return { least: smallest(least), best: smallest(all) };
}

function smallest(costs: bigint[]): bigint {
  return costs.reduce((a, b) => (b < a ? b : a));
}

function text(cost: bigint): string {
  return scaledText((cost + 5n * 10n ** 7n) / 10n ** 8n, 4);
}
