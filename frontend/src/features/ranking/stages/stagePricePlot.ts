import type { WholeStage } from '../../../api/stages';
import { numberOf, sharedNumbers } from '../libraryWords';
import { noiseKind } from '../noiseUnit';
import { pricePlot, type PricePlot } from '../price/pricePlot';
import { networkText } from './stageAnswer';
import { stageKey } from './stageKey';
import type { ShownStages } from './useStages';

/** The ranked whole stages by price and noise. */
export function stagePricePlot({ first, items, request }: ShownStages): PricePlot {
  const shared = sharedNumbers([...items, ...first.frontier].map(({ part }) => part));
  const point = (stage: WholeStage) => ({
    id: stageKey(stage),
    name: `${numberOf(stage.part, shared)}${networkText(stage)}`,
    partNumber: numberOf(stage.part, shared),
    noise: stage.inputNoiseRms,
    unitPrice: stage.unitPrice,
  });
  return pricePlot(items.map(point), first.frontier.map(point), {
    quantity: request.quantity ?? 1,
    kind: noiseKind(request.conditions.stage.topology),
    floor: first.floor.inputNoiseRms,
  });
}
