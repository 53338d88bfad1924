import type { Technology } from '../parts/index.js';
import type { BandConditions, PartFilter } from './conditions.js';

/** The place in a circuit for which a resistor is sought. */
export interface ResistorConditions {
  /** Ω, the value wanted */
  resistance: number;
  /** how far a part's value may lie from it; 0.02 = 2 % */
  resistanceTolerance: number;
  /** V across the resistor, either sign */
  dcVoltage: number;
  /** K */
  ambientTemperature: number;
  band: BandConditions;
}

/** Which resistors are considered at all, and which of them are excluded with a reason. */
export type ResistorFilter = Pick<PartFilter, 'search' | 'library' | 'lifecycle' | 'approval' | 'package'> & {
  technology?: Technology[];
  /** at most so wide; a part of unknown tolerance isn't considered then. 0.01 = 1 % */
  tolerance?: number;
};

/** What resistors are ranked by, and what the page's address holds. */
export interface ResistorRankingRequest {
  conditions: ResistorConditions;
  filter?: ResistorFilter;
  quantity?: number;
}
