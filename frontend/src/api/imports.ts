import { keepPreviousData, queryOptions } from '@tanstack/react-query';
import { answer, client } from './client';
import type { components } from './schema';

type Schemas = components['schemas'];

export type ImportSummary = Schemas['ImportSummaryDto'];
export type Import = Schemas['ImportResponseDto'];
export type ImportKind = Import['kind'];
export type ImportState = Import['state'];
export type ImportColumn = Schemas['ImportColumnDto'];
export type ImportRow = Schemas['ImportRowDto'];
export type RowCounts = Schemas['RowCountsDto'];
export type RowList = ImportRow['state'] | 'kept';
export type Dialect = Import['dialect'];
export type DialectChoice = Omit<Schemas['MapImportDto'], 'columns' | 'wholeList' | 'version'>;
export type ImportDescription = Schemas['MapImportDto'];
export type PartListKind = Exclude<ImportKind, 'prices'>;

const POLL_MS = 1000;
const RUNNING: readonly ImportState[] = ['checking', 'waiting', 'applying', 'undoing'];
const HISTORY_PAGE = 50;
export const LARGEST_FILE = 100 * 1024 * 1024;

/** The server is at work on the import. */
export function isRunning({ state }: Pick<ImportSummary, 'state'>): boolean {
  return RUNNING.includes(state);
}

export function importsQuery(page: number) {
  const query = { limit: HISTORY_PAGE, offset: (page - 1) * HISTORY_PAGE };
  return queryOptions({
    queryKey: ['imports', 'list', page],
    queryFn: ({ signal }) => answer(client.GET('/api/imports', { params: { query }, signal })),
    staleTime: 0,
    placeholderData: keepPreviousData,
    refetchInterval: ({ state: { data } }) => data?.items.some(isRunning) === true && POLL_MS,
  });
}

export function importKey(id: string) {
  return ['imports', 'one', id] as const;
}

/** An import, asked for again and again while the server is at work on it. */
export function importQuery(id: string) {
  return queryOptions({
    queryKey: importKey(id),
    queryFn: ({ signal }) => answer(client.GET('/api/imports/{id}', { params: { path: { id } }, signal })),
    staleTime: 0,
    refetchInterval: ({ state: { data } }) => data !== undefined && isRunning(data) && POLL_MS,
  });
}

interface RowsPage {
  list: RowList;
  limit: number;
  offset: number;
}

/** Rows with their verdicts; the page before stays until the next is there. */
export function importRowsQuery(id: string, { list, limit, offset }: RowsPage) {
  const params = { path: { id }, query: { state: list, limit, offset } };
  return queryOptions({
    queryKey: ['imports', 'rows', id, list, limit, offset],
    queryFn: ({ signal }) => answer(client.GET('/api/imports/{id}/rows', { params, signal })),
    placeholderData: (before, query) => (query?.queryKey[3] === list ? before : undefined),
  });
}

export function uploadImport(kind: ImportKind, file: File, signal: AbortSignal): Promise<Import> {
  const form = new FormData();
  form.append('kind', kind);
  form.append('file', file);
  const body = { kind, file: file.name };
  return answer(client.POST('/api/imports', { body, bodySerializer: () => form, signal }));
}

export function mapImport(id: string, body: ImportDescription): Promise<Import> {
  return answer(client.PUT('/api/imports/{id}/mapping', { params: { path: { id } }, body }));
}

export function applyImport(id: string): Promise<Import> {
  return answer(client.POST('/api/imports/{id}/apply', { params: { path: { id } } }));
}

export function cancelImport(id: string): Promise<Import> {
  return answer(client.POST('/api/imports/{id}/cancel', { params: { path: { id } } }));
}

export function discardImport(id: string): Promise<unknown> {
  return answer(client.DELETE('/api/imports/{id}', { params: { path: { id } } }));
}

export function undoImport(id: string): Promise<Import> {
  return answer(client.POST('/api/imports/{id}/undo', { params: { path: { id } } }));
}

export function refusedRowsAddress(id: string): string {
  return `/api/imports/${id}/refused.csv`;
}

/** Where the team's own library is exported, for a spreadsheet of either decimal mark. */
export function libraryAddress(kind: PartListKind, decimalMark: Dialect['decimalMark']): string {
  const delimiter = decimalMark === 'comma' ? 'semicolon' : 'comma';
  return `/api/${kind}.csv?delimiter=${delimiter}&decimalMark=${decimalMark}`;
}
