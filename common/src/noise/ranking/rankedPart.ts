import type { PartFilter, RankingTarget } from '../../conditions/index.js';
import type { StageFigures } from '../figures.js';
import { stageAmplifier } from '../stageAmplifier.js';
import { stageCautions } from '../stageCautions.js';
import { figuresFrom, type ComputedFigures } from '../stageFigures.js';
import { amplifierAt } from './columns.js';
import type { Field } from './entrants.js';
import type { RowPlace } from './page.js';
import { isInQuietSet, type Quietest } from './quietSet.js';
import type { Scores } from './scores.js';
import type { PartPlace } from './sift.js';

export interface RankedPart extends PartPlace {
  rank: number;
  figures: StageFigures;
  quietSet: boolean;
  /** null where there is no target */
  meetsTarget: boolean | null;
}

/** All figures of a scored row. */
export function figuresAt(
  { conditions, model, libraries }: Field,
  { rows, groups, groupOf, atReference }: Scores,
  { library, position }: RowPlace,
): ComputedFigures {
  const amplifier = stageAmplifier(conditions, amplifierAt(libraries[library], rows[position]));
  return figuresFrom(conditions, model, amplifier, groups[groupOf[position]].evaluate, atReference);
}

/** A scored row as an item of the ranking. */
export function toRankedPart(
  { filter, target }: { filter: PartFilter; target: RankingTarget },
  field: Field,
  scores: readonly Scores[],
  quietest: Quietest,
  place: RowPlace,
): Omit<RankedPart, 'rank'> {
  const { conditions, model, libraries } = field;
  const { library, position } = place;
  const scored = scores[library];
  const row = scored.rows[position];
  const figures = figuresAt(field, scored, place);
  const cautions = stageCautions(conditions, model, amplifierAt(libraries[library], row), filter);
  return {
    library,
    row,
    figures: { ...figures, cautions },
    quietSet: isInQuietSet(scored, position, quietest),
    meetsTarget: target.inputNoiseRms === undefined ? null : figures.inputNoiseRms <= target.inputNoiseRms,
  };
}
