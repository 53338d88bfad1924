import type { Caution } from '@roothertz/common/noise';
import { CONTRIBUTORS, type Contributions } from '@roothertz/common/noise';
import { sourceTemperature } from './sourceTemperature';
import type { RankingRequest } from '@roothertz/common/conditions';
import { formatQuantity } from '@roothertz/common/units';
import type { Ranking, RankingItem } from '../../api/ranking';
import { barOf, barScale, type Bar } from './barScale';
import { cautionsOfPart } from './cautionsOf';
import { libraryOf, sharedNumbers } from './libraryWords';
import { commonUnit, inUnit, noiseKind } from './noiseUnit';
import { amountText, priceHeading } from './priceWords';

/** Where a row stands in the bracket around the quiet set. */
export type Bracket = 'only' | 'first' | 'middle' | 'last' | null;

export interface GridRow {
  id: string;
  place: { rank: number | null; bracket: Bracket };
  part: { name: string; library: string | null; maker: string; cautions: Caution[]; approval: string | null };
  noise: { text: string; meetsTarget: boolean | null };
  aboveFloor: string;
  budget: { bar: Bar; contributions: Contributions };
  price: string;
}

export interface GridRows {
  /** The unit of the noise column. */
  unit: string;
  /** The heading of the price column; null where there is none. */
  priceHeading: string | null;
  floor: GridRow;
  rows: GridRow[];
}

export const FLOOR_ID = 'floor';

/** The grid's rows: the source floor on top, all figures in one unit, all bars in one scale. */
export function gridRows(
  { floor }: Pick<Ranking, 'floor'>,
  items: readonly RankingItem[],
  request: RankingRequest,
): GridRows {
  const quietest = items[0]?.inputNoiseRms ?? floor.inputNoiseRms;
  const unit = commonUnit(floor.inputNoiseRms || quietest, noiseKind(request.conditions.stage.topology));
  const scale = barScale(floor.inputNoiseRms, quietest);
  const shared = sharedNumbers(items.map(({ part }) => part));
  const rows = items.map((item, index) => {
    const row = rowOf(item, bracketOf(items, index), unit, scale);
    return { ...row, part: { ...row.part, library: libraryOf(item.part, shared) } };
  });
  return {
    unit,
    priceHeading: priceHeading(items, request.quantity ?? 1),
    floor: floorRow(floor.inputNoiseRms, request, unit, scale),
    rows,
  };
}

function rowOf(item: RankingItem, bracket: Bracket, unit: string, scale: number): GridRow {
  const { part, rank, contributions, aboveFloor, meetsTarget } = item;
  return {
    id: part.id,
    place: { rank, bracket },
    part: {
      name: part.partNumber,
      library: null,
      maker: part.manufacturer,
      cautions: cautionsOfPart(item.cautions),
      approval: part.approval === 'approved' ? null : part.approval,
    },
    noise: { text: inUnit(item.inputNoiseRms, unit), meetsTarget },
    aboveFloor: aboveFloor === null ? '–' : formatQuantity(aboveFloor, 'decibel'),
    budget: { bar: barOf(contributions, scale), contributions },
    price: item.unitPrice ? amountText(item.unitPrice) : 'no price',
  };
}

function floorRow(rms: number, { conditions }: RankingRequest, unit: string, scale: number): GridRow {
  const nothing = Object.fromEntries(CONTRIBUTORS.map((contributor) => [contributor, 0])) as Contributions;
  const contributions = { ...nothing, source: rms };
  const resistance = formatQuantity(conditions.source.resistance, 'resistance', { trim: true });
  const temperature = formatQuantity(sourceTemperature(conditions), 'temperature');
  return {
    id: FLOOR_ID,
    place: { rank: null, bracket: null },
    part: {
      name: '',
      library: null,
      maker: `source floor, ${resistance} at ${temperature}`,
      cautions: [],
      approval: null,
    },
    noise: { text: inUnit(rms, unit), meetsTarget: null },
    aboveFloor: rms > 0 ? formatQuantity(0, 'decibel') : '–',
    budget: { bar: barOf(contributions, scale), contributions },
    price: '',
  };
}

function bracketOf(items: readonly RankingItem[], index: number): Bracket {
  if (!items[index].quietSet) return null;
  const begins = !items[index - 1]?.quietSet;
  const ends = !items[index + 1]?.quietSet;
  if (begins) return ends ? 'only' : 'first';
  return ends ? 'last' : 'middle';
}
