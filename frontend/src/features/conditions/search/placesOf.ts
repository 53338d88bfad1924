import type { RankingRequest } from '@roothertz/common/conditions';
import { feedbackResistanceOf } from '../schematic/feedbackResistanceOf';

/** A resistor of the schematic whose value the place can take over. */
export interface CircuitPlace {
  symbol: 'R_g' | 'R_f' | 'R_L' | 'R_b';
  /** Ω */
  resistance: number;
}

/** The resistors of the stage that have a value. */
export function placesOf({ conditions }: RankingRequest): CircuitPlace[] {
  const { gainResistance, feedbackResistance, loadResistance, biasResistance } = conditions.stage;
  const values: [CircuitPlace['symbol'], number | null | undefined][] = [
    ['R_g', gainResistance],
    ['R_f', feedbackResistance ?? feedbackResistanceOf(conditions)],
    ['R_L', loadResistance],
    ['R_b', biasResistance],
  ];
  return values.flatMap(([symbol, resistance]) => (resistance ? [{ symbol, resistance }] : []));
}
