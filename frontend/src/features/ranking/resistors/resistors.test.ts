import { describe, expect, it } from 'vitest';
import type { ResistorRanking } from '../../../api/resistorRanking';
import { rankedResistor, resistorRankingOf } from '../../../test/stages';
import { plainText } from '../answer';
import { resistorAnswer } from './resistorAnswer';
import { resistorRows } from './resistorRows';

const request = {
  conditions: {
    resistance: 4700,
    resistanceTolerance: 0.02,
    dcVoltage: 2,
    ambientTemperature: 298.15,
    band: { lower: 1, upper: 500, lowPassOrder: 2 },
  },
};
const noisy = rankedResistor(1, 'TR-4K70', { excessRms: 100e-9, totalRms: 141.4e-9, aboveThermal: 3.01 });
const unknown = rankedResistor(2, 'XX-4K70', { excessRms: null, cautions: ['noise-index-unknown'] });

function answer(items = [noisy], more: Partial<ResistorRanking> = {}, dcVoltage = 2) {
  const asked = { ...request, conditions: { ...request.conditions, dcVoltage } };
  const first = { ...resistorRankingOf(items, more), request: asked };
  const { lead, following } = resistorAnswer({ request: asked, first, items });
  const plain = (text: string) => text.replaceAll('\u2009', ' ');
  return { lead: plain(plainText(lead)), following: plain(following) };
}

describe('the answer of resistors', () => {
  it('names the quietest and what its excess noise adds', () => {
    expect(answer().lead).toBe('Quietest is TR-4K70: 141 nV rms, 3.01 dB above its thermal noise.');
    expect(answer().following).toBe(
      '1 resistor lies within 2 % of 4.7 kΩ. The excess noise that 2 V makes tells them apart.',
    );
  });

  it('says that without a direct voltage there is no excess noise', () => {
    expect(answer([noisy], {}, 0).following).toMatch(/Without a direct voltage .* no excess noise/);
  });

  it('says what to change where none lies within the window, or all are left out', () => {
    expect(answer([]).lead).toBe('No resistor lies within 2 % of 4.7 kΩ.');
    expect(answer([]).following).toMatch(/^Widen the window/);
    const excluded = { total: 5, reasons: [{ reason: 'over-rating' as const, count: 5 }] };
    expect(answer([], { excluded }).following).toMatch(
      /dissipates more than its rating\. Lower the direct voltage/,
    );
  });
});

describe('the rows of resistors', () => {
  const { unit, rows } = resistorRows({ items: [noisy, unknown], request });

  it('share one unit and set the dissipation beside the rating', () => {
    expect(unit).toBe('nV');
    expect(rows[0]).toMatchObject({ thermal: '100', excess: '100', total: '141', technology: 'thick film' });
    expect(rows[0].dissipation).toBe('4.00\u2009mW of 125\u2009mW');
  });

  it('have a price where any has one', () => {
    const priced = { ...noisy, unitPrice: { amount: '0.0125', currency: 'EUR' } as never };
    const { priceHeading, rows: all } = resistorRows({ items: [priced, unknown], request });
    expect([priceHeading, all[0].price, all[1].price]).toEqual(['€ at 1', '0.0125', 'no price']);
    expect(resistorRows({ items: [unknown], request }).priceHeading).toBeNull();
  });

  it('take an unknown excess noise for a bound, never for none', () => {
    expect(rows[1]).toMatchObject({ excess: 'unknown', total: '≥\u2009100', aboveThermal: '–' });
  });
});
