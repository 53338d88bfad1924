import { formatQuantity } from '@roothertz/common/units';
import type { WholeStage } from '../../../api/stages';
import { priceText } from '../../../components/priceText';
import { LIBRARY_WORDS } from '../libraryWords';

/** A part of a stage with what a piece of it costs. */
export interface StagePart {
  /** What stands before its name, such as "22 Ω"; empty for the op-amp. */
  symbols: string;
  name: string;
  /** "own", "curated" */
  library: string;
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
  const { partNumber: name, library, id } = resistor ?? part;
  const words = { name, library: LIBRARY_WORDS[library] };
  if (resistor === null) return { ...words, symbols: '', path: `/parts/${id}` };
  return { ...words, symbols: resistorText(resistor), path: `/parts/resistors/${id}` };
}

/** "22 Ω ±1 %" */
function resistorText({ resistance, tolerance }: { resistance: number; tolerance: number | null }): string {
  const value = formatQuantity(resistance, 'resistance', { trim: true, digits: 4 });
  return tolerance === null ? value : `${value} ±${formatQuantity(tolerance, 'fraction', { trim: true })}`;
}

/** Equal parts that the search doesn't choose, and that no price has. */
export interface UnsoughtPart {
  /** "R_L 47 kΩ" */
  symbols: string;
  what: string;
  /** "4 ×" */
  pieces: string;
}

type Unsought = WholeStage['unsought'][number];

const UNSOUGHT: Record<
  Unsought['place'],
  { symbol: string; what: string; kind: 'resistance' | 'capacitance' }
> = {
  load: { symbol: 'R_L', what: 'from the input to ground', kind: 'resistance' },
  bias: { symbol: 'R_b', what: 'from the + input to ground', kind: 'resistance' },
  difference: { symbol: 'R_d', what: 'behind the input pair', kind: 'resistance' },
  'feedback-capacitor': { symbol: 'C_f', what: 'beside the feedback resistor', kind: 'capacitance' },
  averaging: { symbol: 'R', what: 'from each channel, to average the outputs', kind: 'resistance' },
};

export function unsoughtParts({ unsought }: WholeStage): UnsoughtPart[] {
  return unsought.map(({ place, pieces, value }) => {
    const { symbol, what, kind } = UNSOUGHT[place];
    const stated = value === null ? '' : ` ${formatQuantity(value, kind, { trim: true })}`;
    return { symbols: `${symbol}${stated}`, what, pieces: `${pieces} ×` };
  });
}
