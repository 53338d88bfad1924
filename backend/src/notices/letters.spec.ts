import { type Digest, digestLetter, type ListedOffer } from './digest-letter.js';
import { type ChangedPart, partLetter, sentence } from './part-letter.js';

const part = (changes: Partial<ChangedPart> = {}): ChangedPart => ({
  id: 7,
  kind: 'op-amp',
  manufacturer: 'Acme',
  partNumber: 'OX-27',
  conditions: 'River geophone',
  now: { lifecycle: 'active', available: true, quantity: 100, unitPrice: '1.3800', currency: 'EUR' },
  changes: [{ kind: 'dearer', from: '1.2300', to: '1.3800' }],
  ...changes,
});

describe('a notice of parts', () => {
  it('says each change in words', () => {
    expect(sentence(part())).toBe(
      'OX-27 by Acme (in River geophone): 12\u00a0% dearer at 100: 1.23 → 1.38 EUR.',
    );
    expect(sentence(part({ changes: [{ kind: 'obsolete' }, { kind: 'unavailable' }] }))).toBe(
      'OX-27 by Acme (in River geophone): now obsolete; no longer available: no supplier with a valid offer has any in stock.',
    );
    const small = part({ changes: [{ kind: 'dearer', from: '0.0104', to: '0.0125' }] });
    expect(sentence(small)).toContain('20\u00a0% dearer at 100: 0.0104 → 0.0125 EUR');
  });

  it('names the part in the subject and opens its page where it is one, at however many conditions', () => {
    const letter = partLetter('Weir & Sons', [
      part({ changes: [{ kind: 'obsolete' }] }),
      part({ conditions: 'Weir', changes: [{ kind: 'obsolete' }] }),
    ]);
    expect(letter.subject).toBe('OX-27 by Acme is now obsolete');
    expect(letter.link).toEqual({ label: 'Open OX-27', path: '/parts/7' });
    expect(letter.lists![0].items).toHaveLength(2);
    expect(partLetter('Weir', [part({ kind: 'resistor' })]).link?.path).toBe('/parts/resistors/7');
  });

  it('counts several parts in the subject, and lists fifty', () => {
    const letter = partLetter(
      'Weir & Sons',
      Array.from({ length: 60 }, (_, id) => part({ id })),
    );
    expect(letter.subject).toBe('60 parts in your saved conditions have changed');
    expect(letter.lists![0].items).toHaveLength(51);
    expect(letter.lists![0].items.at(-1)).toBe('and 10 more');
  });
});

describe('a digest of prices', () => {
  const offer = (changes: Partial<ListedOffer> = {}): ListedOffer => ({
    part: { manufacturer: 'Acme', partNumber: 'OX-27' },
    supplier: { name: 'Fenway' },
    currency: 'EUR',
    breaks: [{ minimumQuantity: 10, unitPrice: '4.2000' }],
    confirmedAt: '2026-07-01T10:00:00.000Z',
    validUntil: '2026-12-20',
    ...changes,
  });
  const digest = (changes: Partial<Digest> = {}): Digest => ({
    team: 'Weir & Sons',
    staleAfterDays: 90,
    counts: { stale: 1, expiring: 1, expired: 0 },
    expiring: [offer()],
    stale: [offer()],
    ...changes,
  });

  it('counts what is stale and what ends, and names part, supplier, price and day', () => {
    expect(digestLetter(digest())).toMatchObject({
      subject: 'Prices of Weir & Sons: 1 stale, 1 ending soon',
      paragraphs: ['One offer was last confirmed more than 90 days ago. One offer ends within 30 days.'],
      lists: [
        {
          heading: 'Ending soon',
          items: ['OX-27 by Acme, from Fenway at 4.20 EUR for 10 or more, ends on 20 December 2026'],
        },
        {
          heading: 'Not confirmed for long',
          items: ['OX-27 by Acme, from Fenway at 4.20 EUR for 10 or more, last confirmed on 1 July 2026'],
        },
      ],
      link: { path: '/prices?state=stale,expiring' },
    });
  });

  it('says nothing of what there is none of, and that the list goes on', () => {
    const letter = digestLetter(digest({ counts: { stale: 30, expiring: 0, expired: 2 }, expiring: [] }));
    expect(letter.subject).toBe('Prices of Weir & Sons: 30 stale');
    expect(letter.paragraphs).toEqual([
      '30 offers were last confirmed more than 90 days ago. 2 offers have ended and no longer count.',
    ]);
    expect(letter.lists).toMatchObject([{ heading: 'The 1 of 30 that were confirmed longest ago' }]);
  });
});
