import type { AuditFilter } from '../../api/audit';
import { useAddress } from '../../components/useAddress';
import { readFilter, writeFilter } from './trailFilter';

/** What the trail is narrowed to; it lives in the page's address. */
export function useTrailFilter() {
  const { params, change } = useAddress();
  return {
    filter: readFilter(params),
    narrow: (changes: AuditFilter) =>
      change((before) => writeFilter({ ...readFilter(before), ...changes }), true),
    showAll: () => change(() => new URLSearchParams()),
  };
}
