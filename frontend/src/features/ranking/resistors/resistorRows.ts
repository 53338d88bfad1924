import type { ResistorCaution } from '@roothertz/common/noise';
import { TECHNOLOGY_LABELS } from '@roothertz/common/parts';
import { formatQuantity } from '@roothertz/common/units';
import type { ResistorItem } from '../../../api/resistorRanking';
import { libraryOf, sharedNumbers } from '../libraryWords';
import { commonUnit, inUnit } from '../noiseUnit';
import { amountText, priceHeading } from '../priceWords';
import type { ShownResistors } from './useResistors';

export interface ResistorRow {
  id: string;
  place: number;
  part: { id: string; name: string; library: string | null; maker: string; cautions: ResistorCaution[] };
  technology: string;
  value: string;
  thermal: string;
  excess: string;
  total: string;
  aboveThermal: string;
  dissipation: string;
  price: string;
}

export interface ResistorRows {
  unit: string;
  /** The heading of the price column; null where there is none. */
  priceHeading: string | null;
  rows: ResistorRow[];
}

/** The rows of the resistors, all noise in one unit. */
export function resistorRows({ items, request }: Pick<ShownResistors, 'items' | 'request'>): ResistorRows {
  const unit = commonUnit(items[0]?.thermalRms ?? 1, 'voltage');
  const shared = sharedNumbers(items.map(({ part }) => part));
  const heading = priceHeading(items, request.quantity ?? 1);
  return { unit, priceHeading: heading, rows: items.map((item) => rowOf(item, unit, shared)) };
}

function rowOf(item: ResistorItem, unit: string, shared: ReadonlySet<string>): ResistorRow {
  const { part, rank, excessRms, aboveThermal, cautions } = item;
  const { technology } = part.resistor;
  return {
    id: part.id,
    place: rank,
    part: {
      id: part.id,
      name: part.partNumber,
      library: libraryOf(part, shared),
      maker: part.manufacturer,
      cautions,
    },
    technology: technology === null ? 'unknown' : TECHNOLOGY_LABELS[technology],
    value: valueText(part.resistor),
    thermal: inUnit(item.thermalRms, unit),
    excess: excessRms === null ? 'unknown' : inUnit(excessRms, unit),
    total: excessRms === null ? `≥\u2009${inUnit(item.totalRms, unit)}` : inUnit(item.totalRms, unit),
    aboveThermal: excessRms === null ? '–' : formatQuantity(aboveThermal, 'decibel'),
    dissipation: dissipationText(item),
    price: item.unitPrice ? amountText(item.unitPrice) : 'no price',
  };
}

function valueText({ resistance, tolerance }: ResistorItem['part']['resistor']): string {
  const value = formatQuantity(resistance, 'resistance', { trim: true, digits: 4 });
  return tolerance === null ? value : `${value} ±${formatQuantity(tolerance, 'fraction', { trim: true })}`;
}

/** "4.05 mW of 300 mW" */
function dissipationText({ dissipation, part: { resistor } }: ResistorItem): string {
  const made = formatQuantity(dissipation, 'power');
  if (resistor.powerRating === null) return `${made}, rating unknown`;
  return `${made} of ${formatQuantity(resistor.powerRating, 'power', { trim: true })}`;
}
