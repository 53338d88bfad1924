const NUMBER = /(?<![\d.,])(\d{1,3}(?:[.,'’\s]\d{3})+|\d+)\s?(k(?!\p{L}))?(?![.,]?\d)/iu;
const UP_TO = /^\s*(?:-|–|—|\.{2,3}|…|to(?!\p{L})|bis(?!\p{L})|à(?!\p{L}))\s*\d[\d.,'’\s]*/iu;
/** “Price per 100” is the price of a hundred pieces, not the one from 100 pieces on. */
const PER_MANY = /(?:\/|(?<!\p{L})(?:per|je|pro|par))\s*\d/iu;
const WORDS = new Set([
  ...['price', 'prices', 'unit', 'net', 'each', 'cost', 'at', 'from', 'for', 'of', 'per'],
  ...['qty', 'quantity', 'pcs', 'pc', 'pce', 'piece', 'pieces', 'ea', 'units', 'up', 'and', 'over'],
  ...[
    'preis',
    'preise',
    'stückpreis',
    'stueckpreis',
    'einzelpreis',
    'nettopreis',
    'netto',
    'bei',
    'ab',
    'je',
  ],
  ...['pro', 'menge', 'stk', 'st', 'stück', 'stueck', 'vk', 'ep'],
  ...[
    'prix',
    'unitaire',
    'pu',
    'ht',
    'à',
    'a',
    'partir',
    'de',
    'dès',
    'par',
    'pièce',
    'pièces',
    'qté',
    'quantité',
  ],
]);

/**
 * The quantity from which on the prices under a heading hold: “10”, “10+”, “10 pcs”, “≥ 10”, “10–99”, “ab 10”,
 * “Preis 10”, “price @ 10”; null where the heading holds another word, no number or several.
 *
 * @param heading without unit and currency
 * @example breakOfHeading('Preis ab 1.000 Stück') → 1000
 */
export function breakOfHeading(heading: string): number | null {
  const found = NUMBER.exec(heading);
  if (found === null || PER_MANY.test(heading)) return null;
  const [whole, digits, thousands] = found;
  const after = heading.slice(found.index + whole.length).replace(UP_TO, ' ');
  const rest = `${heading.slice(0, found.index)} ${after}`;
  if (/\d|<|≤/.test(rest)) return null;
  const words = rest.toLowerCase().match(/\p{L}+/gu) ?? [];
  if (!words.every((word) => WORDS.has(word))) return null;
  const quantity = Number(digits.replace(/\D/g, '')) * (thousands === undefined ? 1 : 1000);
  return quantity >= 1 ? quantity : null;
}
