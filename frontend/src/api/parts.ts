import { keepPreviousData, queryOptions } from '@tanstack/react-query';
import type {
  Approval,
  DuplicateReason,
  InputType,
  Library,
  LibraryPart,
  Lifecycle,
  ParameterGroup,
  Standing,
  Technology,
} from '@roothertz/common/parts';
import { answer, client } from './client';
import type { components } from './schema';

/** The figures of a part and the choice of words among them, by their key. */
export type Figures = Readonly<Record<string, number | string | null>>;

/** A part of any kind as the server keeps it; its figures stand under the group of its kind. */
export interface StoredPart extends LibraryPart, Partial<Record<ParameterGroup, Figures>> {
  id: string;
  library: Library;
  version: number;
  updatedAt: string;
}

/** What a list of parts is narrowed and sorted by; each kind takes its own share of it. */
export interface PartListQuery {
  search?: string;
  library?: Library[];
  inputType?: InputType[];
  technology?: Technology[];
  lifecycle?: Lifecycle[];
  approval?: Approval[];
  /** Keys of parameters, one of which the parts lack. */
  missing?: string[];
  resistanceFrom?: number;
  resistanceTo?: number;
  sort?: string;
  limit?: number;
  offset?: number;
}

/** How a part is to stand; what is left out stays. */
export interface StandingChange extends Partial<Standing> {
  id: string;
  version: number;
}

/** What narrows a list of parts, as the server takes it. */
export type PartListFilter = Omit<PartListQuery, 'sort' | 'limit' | 'offset'>;

/** What would become of all parts of a filter that are to stand otherwise. */
export type StandingOutcome = components['schemas']['StandingOutcomeDto'];

/** How all parts of a filter are to stand, of the library of which the outcome was said. */
export interface MatchingChange extends Partial<Standing> {
  libraryRevision: number;
}

interface Page {
  limit: number;
  offset: number;
}

/** Two parts that may be one, the team's own first. */
export interface Duplicate<Stored extends StoredPart = StoredPart> {
  likelihood: number;
  reasons: DuplicateReason[];
  one: Stored;
  other: Stored;
}

/** The calls that read and change parts of a kind. */
export interface PartsReader<Stored extends StoredPart = StoredPart> {
  /** As the server calls them: `op-amps`. */
  name: string;
  list: (query: PartListQuery, signal: AbortSignal) => Promise<{ items: Stored[]; total: number }>;
  find: (id: string, signal: AbortSignal) => Promise<Stored>;
  duplicates: (page: Page, signal: AbortSignal) => Promise<{ items: Duplicate<Stored>[]; total: number }>;
  gapCounts: (query: PartListQuery, signal: AbortSignal) => Promise<GapCounts>;
  /** All of them or none; the answer holds them in the same order. */
  changeStandings: (changes: StandingChange[]) => Promise<{ items: Stored[] }>;
  standingOutcome: (
    filter: PartListFilter,
    wanted: Partial<Standing>,
    signal: AbortSignal,
  ) => Promise<StandingOutcome>;
  /** All own parts of the filter or none. */
  changeMatching: (
    filter: PartListFilter,
    change: MatchingChange,
  ) => Promise<components['schemas']['MatchingChangedDto']>;
  undoMatching: (id: string) => Promise<components['schemas']['StandingsBackDto']>;
  remove: (id: string, version: number) => Promise<void>;
}

/** All calls for parts of a kind. */
export interface PartsApi<Part extends LibraryPart, Stored extends StoredPart> extends PartsReader<Stored> {
  create: (part: Part) => Promise<Stored>;
  update: (id: string, version: number, part: Part) => Promise<Stored>;
}

/** How many parts lack what. */
export type GapCounts = components['schemas']['GapCountsDto'];

export function gapCountsQuery(reader: PartsReader, query: PartListQuery) {
  return queryOptions({
    queryKey: [reader.name, 'gaps', query],
    queryFn: ({ signal }) => reader.gapCounts(query, signal),
    placeholderData: keepPreviousData,
  });
}

export function standingOutcomeQuery(reader: PartsReader, filter: PartListFilter, wanted: Partial<Standing>) {
  return queryOptions({
    queryKey: [reader.name, 'standing-outcome', filter, wanted],
    queryFn: ({ signal }) => reader.standingOutcome(filter, wanted, signal),
    enabled: wanted.lifecycle !== undefined || wanted.approval !== undefined,
  });
}

export type PartUses = components['schemas']['PartUsesDto'];

export function duplicatesQuery(reader: PartsReader, page: Page) {
  return queryOptions({
    queryKey: [reader.name, 'duplicates', page],
    queryFn: ({ signal }) => reader.duplicates(page, signal),
    placeholderData: keepPreviousData,
  });
}

type PartPair = components['schemas']['PartPairDto'];

/** Two parts that look like one are kept both. */
export function keepBoth(pair: PartPair) {
  return answer(client.POST('/api/duplicates/keep-both', { body: pair }));
}

export function askAgain(pair: PartPair) {
  return answer(client.POST('/api/duplicates/ask-again', { body: pair }));
}

/** Where a part has been chosen. */
export function partUsesQuery(id: string) {
  return queryOptions({
    queryKey: ['part-uses', id],
    queryFn: ({ signal }) => answer(client.GET('/api/parts/{id}/uses', { params: { path: { id } }, signal })),
  });
}

/** The most that the server gives in one page. */
export const LONGEST_PAGE = 1000;

export function partKey({ name }: PartsReader, id: string) {
  return [name, 'one', id] as const;
}

export function partQuery<Stored extends StoredPart>(reader: PartsReader<Stored>, id: string) {
  return queryOptions({
    queryKey: partKey(reader, id),
    queryFn: ({ signal }) => reader.find(id, signal),
  });
}

export function partsQuery<Stored extends StoredPart>(reader: PartsReader<Stored>, query: PartListQuery) {
  return queryOptions({
    queryKey: [reader.name, 'list', query],
    queryFn: ({ signal }) => reader.list(query, signal),
    placeholderData: keepPreviousData,
  });
}
