import { describe, expect, it } from 'vitest';
import { readOption, readText } from './partText.js';
import { LIFECYCLE_LABELS } from './vocabulary.js';

const field = { key: 'x', label: 'part number', required: true, maxLength: 8, fallback: null, synonyms: [] };

describe('readText', () => {
  it('trims and composes a text', () => {
    expect(readText(field, '\u00a0 Mu\u0308 \n')).toEqual({ ok: true, value: 'M\u00fc' });
  });

  it('keeps markup and quotes as they are', () => {
    expect(readText(field, `<b>'";--`)).toEqual({ ok: true, value: `<b>'";--` });
  });

  it.each([
    ['an empty text', '  ', 'part number: a text was expected'],
    ['a long text', '123456789', 'part number: at most 8 characters were expected'],
    ['a text that grows when composed', '\ufdfa', 'part number: at most 8 characters were expected'],
    ['a NUL', 'a\0b', 'part number: a text on one line, without control characters, was expected'],
    ['a line break', 'a\nb', 'part number: a text on one line, without control characters, was expected'],
    [
      'half a character',
      'a\ud800',
      'part number: a text on one line, without control characters, was expected',
    ],
  ])('refuses %s', (_, text, message) => {
    expect(readText(field, text)).toEqual({ ok: false, message });
  });

  it('allows an empty text where none is required', () => {
    expect(readText({ ...field, required: false }, ' ')).toEqual({ ok: true, value: '' });
  });
});

describe('readOption', () => {
  it.each(['last-time-buy', 'Last-Time Buy', 'LAST TIME BUY'])('reads %j', (word) => {
    expect(readOption('lifecycle', LIFECYCLE_LABELS, word)).toEqual({ ok: true, value: 'last-time-buy' });
  });

  it('names the options for any other word', () => {
    expect(readOption('lifecycle', LIFECYCLE_LABELS, 'new')).toEqual({
      ok: false,
      message: 'lifecycle: one of active, not-recommended, last-time-buy, obsolete was expected',
    });
  });
});
