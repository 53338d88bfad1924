import fc from 'fast-check';

/** Stand in for what no value can hold: a number that becomes infinity, and nesting without end. */
const TOO_LARGE = 'a number past all doubles';
const TOO_DEEP = 'an array past all nesting';

/** Values that have broken programs before. */
export const hostileValue: fc.Arbitrary<unknown> = fc.oneof(
  fc.constantFrom<unknown>(
    null,
    true,
    0,
    -0,
    -1,
    0.5,
    1e300,
    -1e300,
    5e-324,
    2 ** 53,
    TOO_LARGE,
    '',
    ' ',
    'NaN',
    'Infinity',
    '-1e999',
    "'; DROP TABLE parts; --",
    '" OR 1=1 #',
    '<script>alert(1)</script>',
    '{{7*7}}',
    '%00',
    '\u0000',
    '\ud800',
    '𝛑'.repeat(300),
    'x'.repeat(100_000),
    [],
    {},
    [null],
    { constructor: { prototype: 1 } },
    { toString: 1, valueOf: 2, length: 1e9 },
    [[[[[[[[[[[[]]]]]]]]]]]],
    TOO_DEEP,
  ),
  fc.string({ unit: 'binary' }),
  fc.double(),
  fc.jsonValue({ maxDepth: 4 }) as fc.Arbitrary<unknown>,
);

export function toRequestText(body: unknown): string {
  const deep = '['.repeat(5_000) + ']'.repeat(5_000);
  return (JSON.stringify(body) ?? '')
    .replaceAll(JSON.stringify(TOO_LARGE), '1e999')
    .replaceAll(JSON.stringify(TOO_DEEP), deep);
}
