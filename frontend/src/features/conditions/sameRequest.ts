import type { RankingRequest } from '@roothertz/common/conditions';
import { readAddress } from './address/readAddress';
import { writeAddress } from './address/writeAddress';

/** Whether two requests ask the same, defaults and what their stage doesn't have left aside. */
export function sameRequest(one: RankingRequest, other: RankingRequest): boolean {
  return canonical(one) === canonical(other);
}

function canonical(request: RankingRequest): string {
  return writeAddress(readAddress(writeAddress(request))!.request).toString();
}
