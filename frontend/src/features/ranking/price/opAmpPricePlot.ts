import type { PartName, RankingItem } from '../../../api/ranking';
import { noiseKind } from '../noiseUnit';
import { numberOf, sharedNumbers } from '../libraryWords';
import type { ShownRanking } from '../useRanking';
import { pricePlot, type PricePlot } from './pricePlot';

type Priced = Pick<RankingItem, 'inputNoiseRms' | 'unitPrice'> & { part: PartName };

/** The ranked op-amps by price and noise. */
export function opAmpPricePlot({ first, items, request }: ShownRanking): PricePlot {
  const shared = sharedNumbers([...items, ...first.frontier].map(({ part }) => part));
  const point = ({ part, inputNoiseRms, unitPrice }: Priced) => ({
    id: part.id,
    name: numberOf(part, shared),
    partNumber: numberOf(part, shared),
    noise: inputNoiseRms,
    unitPrice,
  });
  return pricePlot(items.map(point), first.frontier.map(point), {
    quantity: request.quantity ?? 1,
    kind: noiseKind(request.conditions.stage.topology),
    floor: first.floor.inputNoiseRms,
  });
}
