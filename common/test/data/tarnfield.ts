import type { RankingRequest } from '../../src/conditions/index.js';
import { readData } from './readCsv.js';

/** The demo team as `data/demo/tarnfield.json` describes it. */
export interface DemoTeam {
  team: { name: string; plan: string };
  members: { email: string; name: string; roles: string[] }[];
  conditions: { name: string; ranking: RankingRequest }[];
}

export const tarnfield = JSON.parse(readData('demo/tarnfield.json')) as DemoTeam;
