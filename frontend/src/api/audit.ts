import { keepPreviousData, queryOptions } from '@tanstack/react-query';
import type { AuditAction, AuditObject } from '@roothertz/common/audit';
import { answer, client } from './client';
import type { components } from './schema';

export type AuditEntry = components['schemas']['AuditEntryResponseDto'];

/** What narrows the trail; days as `2026-12-31`. */
export interface AuditFilter {
  action?: AuditAction[];
  objectKind?: AuditObject;
  userId?: string;
  from?: string;
  to?: string;
}

export const AUDIT_PAGE = 50;

/** A page of the trail, counted from 1; the newest entries come first. */
export function auditQuery(filter: AuditFilter, page: number) {
  const query = { ...filter, limit: AUDIT_PAGE, offset: (page - 1) * AUDIT_PAGE };
  return queryOptions({
    queryKey: ['audit', filter, page],
    queryFn: ({ signal }) => answer(client.GET('/api/audit', { params: { query }, signal })),
    staleTime: 0,
    placeholderData: keepPreviousData,
  });
}

/** Where all that the filter leaves is exported. */
export function auditExportAddress(filter: AuditFilter): string {
  const params = new URLSearchParams();
  for (const [key, value] of Object.entries(filter))
    if (value !== undefined && value.length > 0) params.set(key, String(value));
  const query = params.toString();
  return `/api/audit/export.csv${query === '' ? '' : `?${query}`}`;
}
