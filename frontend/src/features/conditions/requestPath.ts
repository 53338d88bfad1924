import type { RankingRequest } from '@roothertz/common/conditions';

type Branch = Record<string, unknown>;

/** The value at a path such as `conditions.band.upper`; undefined where there is none. */
export function valueAt(request: RankingRequest, path: string): unknown {
  return path.split('.').reduce<unknown>((value, key) => (value as Branch | undefined)?.[key], request);
}

/** The request with another value at a path; undefined takes the value away, and what is left empty with it. */
export function withValue(request: RankingRequest, path: string, value: unknown): RankingRequest {
  return replace(request as unknown as Branch, path.split('.'), value) as unknown as RankingRequest;
}

function replace(branch: Branch, [key, ...rest]: string[], value: unknown): Branch {
  const next = rest.length === 0 ? value : replace((branch[key] ?? {}) as Branch, rest, value);
  const others = Object.fromEntries(Object.entries(branch).filter(([other]) => other !== key));
  return isNothing(next) ? others : { ...others, [key]: next };
}

function isNothing(value: unknown): boolean {
  if (value === undefined || value === '') return true;
  return typeof value === 'object' && value !== null && Object.keys(value).length === 0;
}
