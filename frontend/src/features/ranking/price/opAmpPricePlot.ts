import type { PartName, RankingItem } from '../../../api/ranking';
import { noiseKind } from '../noiseUnit';
import type { ShownRanking } from '../useRanking';
import { pricePlot, type PricePlot } from './pricePlot';

type Priced = Pick<RankingItem, 'inputNoiseRms' | 'unitPrice'> & { part: PartName };

/** The ranked op-amps by price and noise. */
export function opAmpPricePlot({ first, items, request }: ShownRanking): PricePlot {
  const point = ({ part, inputNoiseRms, unitPrice }: Priced) => ({
    id: part.id,
    name: part.partNumber,
    partNumber: part.partNumber,
    noise: inputNoiseRms,
    unitPrice,
  });
  return pricePlot(items.map(point), first.frontier.map(point), {
    quantity: request.quantity ?? 1,
    kind: noiseKind(request.conditions.stage.topology),
    floor: first.floor.inputNoiseRms,
  });
}
