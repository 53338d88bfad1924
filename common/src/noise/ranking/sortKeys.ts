import { addedPower } from '../budget.js';
import { STANDARD_NOISE_TEMPERATURE } from '../constants.js';
import { sourcePowerDensity } from '../sourceNoise.js';
import { INTEGRAL, INTEGRALS } from '../stage/model.js';
import { closedLoopBandwidth, referenceEvaluation } from '../stageFigures.js';
import type { Entrants, Field } from './entrants.js';
import { prepareGenerators } from './generators.js';
import { preparedColumns } from './preparedColumns.js';
import { figuresAt } from './rankedPart.js';
import type { Scores } from './scores.js';

/** The figures by which a ranking can be sorted; `-` in front = descending. */
export const RANKING_SORTS = [
  'inputNoiseRms',
  'inputNoiseDensity',
  'outputNoiseRms',
  'noiseFigure',
  'aboveFloor',
  'closedLoopBandwidth',
] as const;

/** What a ranking of parts with prices can be sorted by. */
export const PRICED_RANKING_SORTS = [...RANKING_SORTS, 'unitPrice'] as const;
export type RankingSort = (typeof PRICED_RANKING_SORTS)[number];

/** What a row is sorted by; NaN where there is nothing. */
export type RowKey = (row: number, position: number) => number;

/** What each library's rows are sorted by; null where the figure is a sum over the band. */
export function spotKeys(
  sort: RankingSort,
  entrants: Field,
  prices: readonly Float64Array[] = [],
): ((library: number) => RowKey) | null {
  switch (sort) {
    case 'unitPrice':
      return (library) => (row) => prices[library]?.[row] ?? NaN;
    case 'closedLoopBandwidth':
      return (library) => bandwidthKey(entrants, library);
    case 'noiseFigure':
      return hasNoiseFigure(entrants) ? (library) => addedDensity2(entrants, library) : () => () => NaN;
    case 'inputNoiseDensity':
      return (library) => addedDensity2(entrants, library);
    default:
      return null;
  }
}

/** What each library's scored rows are sorted by. */
export function scoredKeys(
  sort: RankingSort,
  entrants: Entrants,
  scores: readonly Scores[],
): (library: number) => RowKey {
  if (sort === 'inputNoiseRms') return (library) => (_, position) => scores[library].inputNoiseRms[position];
  return (library) => (_, position) => {
    const place = { library, position };
    const figures: Partial<Record<RankingSort, number | null>> = figuresAt(entrants, scores[library], place);
    return figures[sort] ?? NaN;
  };
}

function bandwidthKey({ conditions, model, libraries }: Field, library: number): RowKey {
  const { gainBandwidth, inputCapacitance } = preparedColumns(libraries[library]);
  return (row) => {
    const amplifier = { gainBandwidth: gainBandwidth[row], inputCapacitance: inputCapacitance[row] };
    return closedLoopBandwidth(conditions, model, amplifier) ?? NaN;
  };
}

/** What is added to the source's squared density: input noise density and noise figure rise with it. */
function addedDensity2({ conditions, model, libraries }: Field, library: number): RowKey {
  const { gainBandwidth, inputCapacitance } = preparedColumns(libraries[library]);
  const generatorsAt = prepareGenerators(conditions, libraries[library]);
  const atReference = referenceEvaluation(conditions, model);
  const spot = new Float64Array(INTEGRALS);
  return (row) => {
    atReference(gainBandwidth[row], inputCapacitance[row], spot);
    return addedPower(spot, generatorsAt(row)) / spot[INTEGRAL.source];
  };
}

function hasNoiseFigure({ conditions }: Field): boolean {
  const { referenceFrequency } = conditions;
  return sourcePowerDensity(conditions, STANDARD_NOISE_TEMPERATURE, referenceFrequency) > 0;
}
