import { formatQuantity } from '@roothertz/common/units';
import type { QuietestMap } from '../../../api/quietestMap';
import type { Cell } from './territories';

/** "1 kΩ, 100 Hz: VR-1108 Vireo" */
export function cellText(
  { resistances, frequencies, parts, winners }: QuietestMap,
  { column, row }: Cell,
): string {
  const part = parts[winners[column][row]];
  const resistance = formatQuantity(resistances[column], 'resistance', { trim: true, digits: 2 });
  const frequency = formatQuantity(frequencies[row], 'frequency', { trim: true, digits: 2 });
  const name = part ? `${part.partNumber} ${part.manufacturer}` : 'no part is fast and stable enough';
  return `${resistance}, ${frequency}: ${name}`;
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
