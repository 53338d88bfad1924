import { formatQuantity } from '@roothertz/common/units';
import type { QuietestMap } from '../../../api/quietestMap';
import type { Cell } from './territories';

/** "1 kΩ, 100 Hz: VR-1108 Vireo" */
export function cellText(map: QuietestMap, cell: Cell): string {
  const [resistance, frequency] = [map.resistances[cell.column], map.frequencies[cell.row]];
  return `${placeText(resistance, frequency, 2)}: ${winnerText(map, cell)}`;
}

/** "Present conditions, 375 Ω, 30 Hz: VR-1108 Vireo" */
export function presentText(
  map: QuietestMap,
  cell: Cell,
  present: { resistance: number; frequency: number },
) {
  return `Present conditions, ${placeText(present.resistance, present.frequency, 3)}: ${winnerText(map, cell)}`;
}

function placeText(resistance: number, frequency: number, digits: number): string {
  const ohms = formatQuantity(resistance, 'resistance', { trim: true, digits });
  return `${ohms}, ${formatQuantity(frequency, 'frequency', { trim: true, digits })}`;
}

function winnerText({ parts, winners }: QuietestMap, { column, row }: Cell): string {
  const part = parts[winners[column][row]];
  return part ? `${part.partNumber} ${part.manufacturer}` : 'no part is fast and stable enough';
}

/** What share of the map's cells each part has, the largest first. */
export function mapShares({ parts, winners }: QuietestMap): { index: number; name: string; share: number }[] {
  const all = winners.flat();
  return parts
    .map(({ partNumber }, index) => ({
      index,
      name: partNumber,
      share: all.filter((winner) => winner === index).length / all.length,
    }))
    .sort((one, other) => other.share - one.share);
}
