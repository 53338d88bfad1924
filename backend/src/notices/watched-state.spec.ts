import { atNewQuantity, changesSince, knownAfter, type WatchedState } from './watched-state.js';

const state = (changes: Partial<WatchedState> = {}): WatchedState => ({
  lifecycle: 'active',
  available: true,
  quantity: 100,
  unitPrice: '1.0000',
  currency: 'EUR',
  ...changes,
});
const changes = (before: Partial<WatchedState>, now: Partial<WatchedState>) =>
  changesSince(state(before), state(now));

describe('what is worth telling of a part', () => {
  it('is that it became obsolete, and no other step of its life', () => {
    expect(changes({}, { lifecycle: 'obsolete' })).toEqual([{ kind: 'obsolete' }]);
    expect(changes({}, { lifecycle: 'last-time-buy' })).toEqual([]);
    expect(changes({ lifecycle: 'obsolete' }, { lifecycle: 'obsolete' })).toEqual([]);
    expect(changes({ lifecycle: 'obsolete' }, {})).toEqual([]);
  });

  it('is that it can’t be bought any more, but not that it never could', () => {
    expect(changes({}, { available: false, unitPrice: null })).toEqual([{ kind: 'unavailable' }]);
    expect(changes({ available: false }, { available: false })).toEqual([]);
    expect(changes({ available: false }, {})).toEqual([]);
  });

  it('is a price more than 10 % above the one before, to the last digit', () => {
    expect(changes({}, { unitPrice: '1.1000' })).toEqual([]);
    expect(changes({}, { unitPrice: '1.1001' })).toEqual([{ kind: 'dearer', from: '1.0000', to: '1.1001' }]);
    expect(changes({}, { unitPrice: '0.5000' })).toEqual([]);
  });

  it('is no price that can’t be compared: none or next to none before, none now, another currency or quantity', () => {
    const [unpriced, dear] = [{ unitPrice: null, currency: null }, { unitPrice: '9.0000' }];
    expect(changes(unpriced, dear)).toEqual([]);
    expect(changes({ unitPrice: '0.0000' }, dear)).toEqual([]);
    expect(changes({}, unpriced)).toEqual([]);
    expect(changes({}, { ...dear, currency: 'JPY' })).toEqual([]);
    expect(changes({}, { ...dear, quantity: 10 })).toEqual([]);
  });
});

describe('the price that the next one is compared with', () => {
  const known = (now: Partial<WatchedState>) => knownAfter(state(), state(now)).unitPrice;

  it('stays until it is told, through small steps, lows and times without one', () => {
    expect([known({ unitPrice: '1.0900' }), known({ unitPrice: '0.1000' })]).toEqual(['1.0000', '1.0000']);
    expect(known({ unitPrice: null, currency: null, available: false })).toBe('1.0000');
    expect(known({ unitPrice: '1.2000' })).toBe('1.2000');
  });

  it('is the new one where there was none, or in another currency or at another quantity', () => {
    expect(knownAfter(state({ unitPrice: null, currency: null }), state()).unitPrice).toBe('1.0000');
    expect(known({ unitPrice: '160.0000', currency: 'JPY' })).toBe('160.0000');
    expect(atNewQuantity(state(), state({ quantity: 10, unitPrice: '2.0000' })).unitPrice).toBe('2.0000');
  });

  it('is not that of a saving at the same quantity, and a saving tells nothing else', () => {
    const now = state({ lifecycle: 'obsolete', unitPrice: '9.0000' });
    expect(atNewQuantity(state(), now)).toEqual(state());
    expect(atNewQuantity(state(), { ...now, quantity: 10 }).lifecycle).toBe('active');
  });
});
