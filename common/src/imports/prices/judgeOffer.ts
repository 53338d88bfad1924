import { checkOffer, newOfferTerms, type OfferTerms } from '../../prices/index.js';
import type { Doubt, FieldChange, RowError, RowState } from '../rowVerdict.js';
import { breakPath, offerChanges, priceDoubts } from './offerChanges.js';
import type { PriceRowReader, QuotedBreak, QuotedRow } from './priceRow.js';

/** A row of a price list that says whose part it is. */
export interface QuotedLine {
  /** The line of the file on which it begins. */
  line: number;
  cells: readonly string[];
  row: QuotedRow;
}

/** What becomes of one row. */
export interface LineVerdict {
  state: RowState;
  changes: FieldChange[];
  doubts: Doubt[];
  errors: RowError[];
}

/** What a list makes of an offer, or null where it is refused; what becomes of each of its rows. */
export interface OfferVerdict {
  terms: OfferTerms | null;
  lines: LineVerdict[];
}

interface PlacedBreak extends QuotedBreak {
  /** Which of the offer's rows states it. */
  place: number;
}

interface Fault {
  place: number;
  error: RowError;
}

const REFUSED: LineVerdict = { state: 'refused', changes: [], doubts: [], errors: [] };

/**
 * Judges the rows of one offer: one in the wide form, in the long form one for each quantity. Prices that a list
 * states take the place of all that stood; of the other terms, what it leaves open stays. An offer of which one row
 * is wrong is refused with all of them.
 *
 * @param lines of one part, supplier and supplier's number, in the order of the file
 * @param existing the offer as it stands; null = it would be a new one
 * @param today the day on which the list is checked
 */
export function judgeOffer(
  reader: PriceRowReader,
  lines: readonly QuotedLine[],
  existing: OfferTerms | null,
  today: string,
): OfferVerdict {
  const distinct = reader.isLong ? lines : lines.slice(0, 1);
  const { breaks, repeated, faults } = gatherBreaks(reader, distinct);
  const terms = termsOf(distinct, breaks, existing, today);
  const own = [...unread(distinct), ...faults, ...contradictions(reader, distinct)];
  const all = own.length > 0 ? own : termFaults(reader, distinct, terms, breaks, today);
  if (all.length > 0)
    return { terms: null, lines: withSecondRows(reader, lines, refusals(reader, distinct, all)) };
  const judged = distinct.map((_, place) =>
    repeated.has(place)
      ? repeatOf(lines[repeated.get(place)!].line)
      : verdictOf(existing, terms, breaks, place),
  );
  return { terms, lines: withSecondRows(reader, lines, judged) };
}

function unread(lines: readonly QuotedLine[]): Fault[] {
  return lines.flatMap(({ row }, place) => row.errors.map((error) => ({ place, error })));
}

/** The prices of all rows in the order of their quantities; a row that says again what another does adds none. */
function gatherBreaks(reader: PriceRowReader, lines: readonly QuotedLine[]) {
  const found = new Map<number, PlacedBreak>();
  const repeated = new Map<number, number>();
  const faults: Fault[] = [];
  lines.forEach(({ row, cells }, place) => {
    for (const price of row.breaks) {
      const before = found.get(price.minimumQuantity);
      if (before === undefined) found.set(price.minimumQuantity, { ...price, place });
      else if (before.unitPrice === price.unitPrice) repeated.set(place, before.place);
      else {
        const why = `line ${lines[before.place].line} has another price from ${price.minimumQuantity} on`;
        faults.push({ place, error: reader.errorAt('unitPrice', why, cells) });
      }
    }
  });
  const breaks = [...found.values()].sort((one, other) => one.minimumQuantity - other.minimumQuantity);
  return { breaks, repeated, faults };
}

function termsOf(
  lines: readonly QuotedLine[],
  breaks: readonly PlacedBreak[],
  existing: OfferTerms | null,
  today: string,
): OfferTerms {
  const stated = lines.map(({ row }) => row.stated).reduceRight((later, own) => ({ ...later, ...own }), {});
  const prices = breaks.map(({ minimumQuantity, unitPrice }) => ({ minimumQuantity, unitPrice }));
  const base = existing ?? { ...newOfferTerms(today), currency: '', breaks: [] };
  return { ...base, ...stated, breaks: prices.length > 0 ? prices : base.breaks };
}

/** An offer has one currency, one lead time and so on: rows that say different things of it. */
function contradictions(reader: PriceRowReader, lines: readonly QuotedLine[]): Fault[] {
  const said = new Map<string, { value: unknown; line: number }>();
  return lines.flatMap(({ row, line, cells }, place) =>
    Object.entries(row.stated).flatMap(([field, value]): Fault[] => {
      const before = said.get(field) ?? { value, line };
      said.set(field, before);
      if (before.value === value) return [];
      const why = `line ${before.line} of the same offer says ${String(before.value)}`;
      return [{ place, error: reader.errorAt(field, why, cells) }];
    }),
  );
}

/** What is wrong with the offer as a whole, at the row and column that state it. */
function termFaults(
  reader: PriceRowReader,
  lines: readonly QuotedLine[],
  terms: OfferTerms,
  breaks: readonly PlacedBreak[],
  today: string,
): Fault[] {
  const first = { place: 0, cells: lines[0].cells };
  if (terms.breaks.length === 0)
    return [{ place: 0, error: reader.errorAt('unitPrice', 'a new offer needs a price', first.cells) }];
  return checkOffer(terms, today).map(({ field, message }): Fault => {
    const price = breaks[Number(/^breaks\[(\d+)\]/.exec(field)?.[1] ?? -1)];
    if (price === undefined)
      return {
        place: 0,
        error: reader.errorAt(field.startsWith('breaks') ? 'unitPrice' : field, message, first.cells),
      };
    const { cells } = lines[price.place];
    const error = reader.errorAt('unitPrice', message, cells);
    return {
      place: price.place,
      error: { ...error, column: price.column, value: cells[price.column] ?? '' },
    };
  });
}

/** The faulty rows with their errors; the others of the offer are refused with them. */
function refusals(
  reader: PriceRowReader,
  lines: readonly QuotedLine[],
  faults: readonly Fault[],
): LineVerdict[] {
  const culprit = lines[faults[0].place].line;
  return lines.map(({ cells }, place) => {
    const own = faults.filter((fault) => fault.place === place).map(({ error }) => error);
    const why = `line ${culprit} of the same offer is refused`;
    return { ...REFUSED, errors: own.length > 0 ? own : [reader.errorAt('partNumber', why, cells)] };
  });
}

function verdictOf(
  existing: OfferTerms | null,
  terms: OfferTerms,
  breaks: readonly PlacedBreak[],
  place: number,
): LineVerdict {
  const places = new Map(breaks.map((price) => [breakPath(price.minimumQuantity), price.place]));
  const isOwn = ({ field }: { field: string | null }) => (places.get(field ?? '') ?? 0) === place;
  const changes = offerChanges(existing, terms).filter(isOwn);
  const doubts = priceDoubts(existing, terms).filter(isOwn);
  const state = existing === null ? 'new' : changes.length === 0 ? 'unchanged' : 'changed';
  return {
    state: state !== 'unchanged' && doubts.length > 0 ? 'doubtful' : state,
    changes,
    doubts,
    errors: [],
  };
}

function repeatOf(line: number): LineVerdict {
  const doubts = [{ code: 'repeated' as const, field: null, message: `the same as line ${line}` }];
  return { state: 'unchanged', changes: [], doubts, errors: [] };
}

/** In the wide form an offer has one row: a second one says the same, or is refused. */
function withSecondRows(
  reader: PriceRowReader,
  lines: readonly QuotedLine[],
  judged: readonly LineVerdict[],
): LineVerdict[] {
  const [first] = lines;
  const others = lines.slice(judged.length).map(({ cells }) => {
    if (cells.join('\n') === first.cells.join('\n')) return repeatOf(first.line);
    const why = `stands on line ${first.line} too, with other values`;
    return {
      ...REFUSED,
      errors: [{ ...reader.errorAt('partNumber', why, cells), expected: 'each offer once' }],
    };
  });
  return [...judged, ...others];
}
