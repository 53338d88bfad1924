import { readFile } from 'node:fs/promises';
import type { Role } from '@roothertz/common/access';
import type { RankingRequest } from '@roothertz/common/conditions';

const DEMO_FILE = new URL('../../../../data/demo/tarnfield.json', import.meta.url);

interface DemoPart {
  manufacturer: string;
  partNumber: string;
}

/** The invented team that a new installation can be tried with. */
export interface DemoData {
  team: { name: string };
  subscription: { seats: number; customerId: string; subscriptionId: string };
  members: { email: string; name: string; roles: Role[] }[];
  conditions: { name: string; ranking: Required<RankingRequest>; chosen: DemoPart[] }[];
  prices: { currency: string; staleAfterDays: number; rates: { currency: string; rate: string }[] };
}

export async function readDemoData(): Promise<DemoData> {
  return JSON.parse(await readFile(DEMO_FILE, 'utf8')) as DemoData;
}
