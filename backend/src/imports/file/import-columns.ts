import { createHash } from 'node:crypto';
import {
  type ColumnMapping,
  type ListColumns,
  type ProposedColumn,
  readHeading,
} from '@roothertz/common/imports';
import { normaliseWord } from '@roothertz/common/parts';
import Fuse from 'fuse.js';
import { shortened } from '../../shared/text/shortened.js';
import type { DetectedDialect } from './detect-dialect.js';

/** What a column is proposed to become. */
export interface ColumnProposal extends ColumnMapping {
  /** From 0 to 1; 1 = its heading is a name that the catalogue knows. */
  confidence: number;
  /** The file names no unit: the catalogue's is assumed. */
  unitAssumed: boolean;
}

/** A column of an uploaded list. */
export interface ImportColumn {
  column: number;
  heading: string;
  /** The first cells under the heading. */
  samples: string[];
  proposed: ColumnProposal | null;
}

export const MOST_COLUMNS = 1000;
/** What stands behind the columns of a list where its refused rows are given back. */
export const REASONS: readonly string[] = ['line of the file', 'why refused', 'what was needed'];
const SAMPLES = 5;
const LONGEST_TEXT = 200;
const LEAST_CONFIDENCE = 0.7;
const SHORTEST_WORD = 4;
const PERHAPS = 0.8;
const MOST_RESEMBLING = 5;
/** So much of the longer of two words must the shorter one be. */
const LEAST_LENGTH = 0.6;
/** A range is no value of any field. */
const RANGE = /(?:range|bereich|plage)/i;
const MOST_SPOTS = 2;

/** The columns of a list with what each is proposed to become. */
export function importColumns(list: ListColumns, { header, sample }: DetectedDialect): ImportColumn[] {
  const proposals = withoutRivals(proposalsFor(list, header.cells));
  return header.cells.map((heading, column) => ({
    column,
    heading: shown(heading),
    samples: samplesOf(sample.map(({ cells }) => cells[column] ?? '')),
    proposed: proposals[column],
  }));
}

/** The same for lists of the same headings, however their case and punctuation, and for the refused rows of them. */
export function headerKey(headings: readonly string[]): string {
  const words = withoutReasons(headings).map((heading) => normaliseWord(heading) || heading.trim());
  return createHash('sha256').update(JSON.stringify(words)).digest('hex');
}

function withoutReasons(headings: readonly string[]): readonly string[] {
  const isRefused = REASONS.every((reason, index) => headings.at(index - REASONS.length) === reason);
  return isRefused ? headings.slice(0, -REASONS.length) : headings;
}

function shown(text: string): string {
  return shortened(text.trim(), LONGEST_TEXT);
}

function samplesOf(cells: readonly string[]): string[] {
  return cells
    .filter((cell) => cell.trim() !== '')
    .slice(0, SAMPLES)
    .map(shown);
}

function proposalsFor(list: ListColumns, headings: readonly string[]): (ColumnProposal | null)[] {
  const propose = list.proposer();
  const guess = fieldGuesser(list);
  return headings.map((heading, column) => {
    if (heading.length > LONGEST_TEXT) return null;
    const exact = propose(heading);
    if (exact !== null) return toProposal(exact, column, 1);
    const guessed = guess(heading);
    return guessed && toProposal(list.proposeField(guessed.field, heading), column, guessed.confidence);
  });
}

function toProposal(proposed: ProposedColumn, column: number, confidence: number): ColumnProposal {
  return { column, ...proposed, confidence };
}

/** Finds the field whose names a heading resembles, and what one that may mean a field means. */
function fieldGuesser({ names }: ListColumns) {
  const words = names.map(({ name, ...field }) => ({ ...field, word: normaliseWord(name) }));
  const perhaps = new Map(words.filter(({ isSure }) => !isSure).map(({ word, field }) => [word, field]));
  const known = words.filter(({ word }) => word.length >= SHORTEST_WORD);
  const fuse = new Fuse(known, { keys: ['word'], includeScore: true, threshold: 1 - LEAST_CONFIDENCE });
  return (heading: string): { field: string; confidence: number } | null => {
    const word = normaliseWord(readHeading(heading).name);
    const field = perhaps.get(word);
    if (field !== undefined) return { field, confidence: PERHAPS };
    if (word.length < SHORTEST_WORD || RANGE.test(heading)) return null;
    const best = fuse.search(word, { limit: MOST_RESEMBLING }).find(({ item }) => isAsLong(item.word, word));
    const confidence = Math.round((1 - (best?.score ?? 1)) * 100) / 100;
    return best === undefined || confidence < LEAST_CONFIDENCE
      ? null
      : { field: best.item.field, confidence };
  };
}

/** A few letters stand in many a long name without meaning it. */
function isAsLong(name: string, heading: string): boolean {
  const [short, long] = [name.length, heading.length].sort((one, other) => one - other);
  return short >= long * LEAST_LENGTH;
}

/**
 * Of several columns for one value the surest stays, the first of equals; of several spots the outermost two; of
 * several prices from one quantity on none, for “Qty 1” and “Price 1” are something else.
 */
function withoutRivals(proposals: (ColumnProposal | null)[]): (ColumnProposal | null)[] {
  const kept = new Set<ColumnProposal>();
  const groups = new Map<string, ColumnProposal[]>();
  for (const proposal of proposals) {
    if (proposal === null) continue;
    const name = `${proposal.field} ${proposal.form} ${proposal.quantity ?? ''}`;
    groups.set(name, [...(groups.get(name) ?? []), proposal]);
  }
  for (const rivals of groups.values()) for (const proposal of keptOf(rivals)) kept.add(proposal);
  return proposals.map((proposal) => (proposal !== null && kept.has(proposal) ? proposal : null));
}

function keptOf(rivals: readonly ColumnProposal[]): readonly ColumnProposal[] {
  if (rivals[0].form === 'spot') return outermost(rivals);
  return rivals[0].form === 'break' && rivals.length > 1 ? [] : [surest(rivals)];
}

function surest(rivals: readonly ColumnProposal[]): ColumnProposal {
  return [...rivals].sort((one, other) => other.confidence - one.confidence)[0];
}

function outermost(spots: readonly ColumnProposal[]): ColumnProposal[] {
  const once = spots.filter(
    ({ frequency }, index) => spots.findIndex((spot) => spot.frequency === frequency) === index,
  );
  const sorted = [...once].sort((one, other) => one.frequency! - other.frequency!);
  return sorted.length <= MOST_SPOTS ? sorted : [sorted[0], sorted.at(-1)!];
}
