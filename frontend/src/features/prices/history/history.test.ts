import { describe, expect, it } from 'vitest';
import { offerOf } from '../../../test/prices';
import { labelOffsets } from './labelOffsets';
import { offerEvents } from './offerEvents';
import { priceLines } from './priceSteps';

const [SPRING, AUTUMN] = ['2026-03-01T09:00:00.000Z', '2026-09-01T09:00:00.000Z'];
const before = offerOf({ id: '10', version: 1, openedAt: SPRING, closedAt: AUTUMN, leadTimeDays: 30 });
const after = offerOf({
  id: '11',
  openedAt: AUTUMN,
  openedBy: { id: '9', name: 'Amara Lindqvist' },
  breaks: [
    { minimumQuantity: 1, unitPrice: '4.2000' },
    { minimumQuantity: 100, unitPrice: '3.4500' },
  ],
});
const other = offerOf({
  id: '12',
  supplier: { id: '4', name: 'Tidewrack' },
  openedAt: SPRING,
  closedAt: AUTUMN,
  closedBy: { id: '8', name: 'Tobias Fenn' },
});

describe('the history of a part’s prices', () => {
  it('says who changed what from what to what, the latest first', () => {
    const events = offerEvents({ current: [after], history: [before, other] });
    expect(events.map(({ at, supplier, changes }) => [at, supplier, changes])).toEqual([
      [AUTUMN, 'Tidewrack', ['closed']],
      [AUTUMN, 'Brook & Weir', ['at 100: 3.10 → 3.45 EUR', 'lead time in days: 30 → 42']],
      [SPRING, 'Tidewrack', ['new: 4.20 EUR at 1, 3.10 EUR at 100']],
      [SPRING, 'Brook & Weir', ['new: 4.20 EUR at 1, 3.10 EUR at 100']],
    ]);
    expect(events.slice(0, 2).map(({ who }) => who)).toEqual(['Tobias Fenn', 'Amara Lindqvist']);
  });

  it('is a line for each supplier that ends where nothing follows', () => {
    const now = Date.parse('2026-12-01');
    const step = (
      { id: offerId, supplier, openedAt: from, closedAt: until }: typeof after,
      unitPrice: string,
    ) => ({
      offerId,
      supplier,
      from,
      until,
      unitPrice,
    });
    const items = [step(before, '3.10'), step(other, '2.00'), step(after, '3.45')];
    const lines = priceLines({ currency: 'EUR', quantity: 100, items }, [before, after, other], now);
    expect(lines).toEqual([
      {
        name: 'Brook & Weir',
        points: [
          [Date.parse(SPRING), 3.1],
          [Date.parse(AUTUMN), 3.45],
          [now, 3.45],
          [now, null],
        ],
      },
      {
        name: 'Tidewrack',
        points: [
          [Date.parse(SPRING), 2],
          [Date.parse(AUTUMN), 2],
          [Date.parse(AUTUMN), null],
        ],
      },
    ]);
  });

  it('names its lines beside each other’s names, not over them', () => {
    expect(labelOffsets([5], 140)).toEqual([0]);
    expect(labelOffsets([4, 4, 4], 140)).toEqual([0, 15, 30]);
    expect(labelOffsets([1, 9, 8.9], 140)).toEqual([0, 0, expect.closeTo(13.95)]);
  });
});
