import { formatQuantity } from '@roothertz/common/units';
import type { WholeStage } from '../../../api/stages';
import { priceText } from '../../../components/priceText';

/** A part of a stage with what a piece of it costs. */
export interface StagePart {
  /** What stands before its name, such as "22 Ω"; empty for the op-amp. */
  symbols: string;
  name: string;
  path: string;
  /** "2 ×" */
  pieces: string;
  price: string;
}

export function stageParts(stage: WholeStage): StagePart[] {
  return stage.pieces.map(({ places, pieces, unitPrice }) => ({
    ...namedPart(stage, places[0]),
    pieces: `${pieces} ×`,
    price: unitPrice ? priceText(unitPrice) : 'no price',
  }));
}

type Place = WholeStage['pieces'][number]['places'][number];

function namedPart({ part, network }: WholeStage, place: Place) {
  const resistor = { 'op-amp': null, gain: network.gainResistor, feedback: network.feedbackResistor }[place];
  if (resistor === null) return { symbols: '', name: part.partNumber, path: `/parts/${part.id}` };
  const symbols = formatQuantity(resistor.resistance, 'resistance', { trim: true, digits: 4 });
  return { symbols, name: resistor.partNumber, path: `/parts/resistors/${resistor.id}` };
}
