import { isFollower, type SoughtStage } from '@roothertz/common/noise';
import { formatQuantity } from '@roothertz/common/units';
import type { StageItem, StageRequest, WholeStage } from '../../../api/stages';
import type { Piece } from '../answer';
import type { AnswerWords } from '../AnswerBlock';
import { emptyAdvice } from '../exclusionWords';
import { rmsText } from '../noiseUnit';
import { priceText } from '../../../components/priceText';
import { gainFigure, gainText, nearestGainAdvice, wantedGain } from './gainWords';
import type { ShownStages } from './useStages';

/** Which whole stage is quietest, or why there is none and what to change. */
export function stageAnswer({ first, items, request }: ShownStages): AnswerWords {
  const { stage } = request.conditions;
  if (first.pairs === 0)
    return {
      lead: [{ text: `No ${networkNoun(stage)} gives ${gainText(stage, wantedGain(stage))}.`, strong: true }],
      following: nearestGainAdvice(stage, first.nearestGain),
    };
  if (items.length === 0)
    return {
      lead: [{ text: 'No stage is ranked.', strong: true }],
      following: emptyAdvice(first.excluded, request.filter?.search),
    };
  return { lead: leadSentence(items[0], request), following: followingSentences({ first, items, request }) };
}

/** "Quietest is VR-1108 with 22 Ω and 2.18 kΩ: 67.8 nV rms, 1.47 dB above what the source itself makes." */
function leadSentence(leader: StageItem, { conditions, sort, within }: StageRequest): Piece[] {
  const { part, channelsInParallel, inputNoiseRms, aboveFloor, unitPrice } = leader;
  const several = channelsInParallel > 1 ? `, ${channelsInParallel} channels in parallel` : '';
  const rms = rmsText(inputNoiseRms, conditions.stage.topology);
  const isByPrice = sort === 'unitPrice' && unitPrice !== null;
  const rest =
    aboveFloor === null
      ? ', from a source that makes no noise itself.'
      : `, ${formatQuantity(aboveFloor, 'decibel')} above what the source itself makes.`;
  const subject = isByPrice ? `Cheapest within ${decibelText(within!)} of the quietest is ` : 'Quietest is ';
  const cost = isByPrice ? `${priceText(unitPrice)}, ` : '';
  return [
    { text: subject },
    { text: `${part.partNumber}${networkText(leader)}${several}: ${cost}${rms}`, strong: true },
    { text: rest },
  ];
}

function decibelText(value: number): string {
  return formatQuantity(value, 'decibel', { trim: true });
}

/** " with 22 Ω and 2.18 kΩ", nothing where the stage has no network. */
export function networkText({ network: { gainResistor, feedbackResistor } }: WholeStage): string {
  const values = [gainResistor, feedbackResistor].flatMap((resistor) =>
    resistor ? [formatQuantity(resistor.resistance, 'resistance', { trim: true, digits: 4 })] : [],
  );
  return values.length === 0 ? '' : ` with ${values.join(' and ')}`;
}

function followingSentences({ items, first, request }: ShownStages): string {
  const { stage } = request.conditions;
  const [leader] = items;
  const sentences = [
    isFollower(stage) ? '' : gainSentence(leader.network.gain, stage),
    priceSentence(leader, first.frontier, request),
    rankedSentence(first, request),
  ];
  return sentences.filter(Boolean).join(' ');
}

function rankedSentence(
  { total, pairs }: Pick<ShownStages['first'], 'total' | 'pairs'>,
  { conditions: { stage }, sort, within }: StageRequest,
): string {
  const isByPrice = sort === 'unitPrice';
  const count = total === 1 ? '1 op-amp' : `${total} op-amps`;
  const parts = isByPrice
    ? `${count} ${total === 1 ? 'makes' : 'make'} a stage within ${decibelText(within!)}`
    : `${count} ${total === 1 ? 'is' : 'are'} ranked`;
  if (isFollower(stage)) return `${parts}, as ${total === 1 ? 'a follower' : 'followers'} without a network.`;
  const each = total === 1 ? '' : ' each';
  return `${parts},${each} with ${choiceText(pairs, stage, isByPrice)}.`;
}

/** What the leader costs, and what the cheapest stage of all would save and spoil. */
function priceSentence(leader: StageItem, frontier: readonly WholeStage[], { sort }: StageRequest): string {
  const cheapest = frontier.at(-1);
  if (cheapest === undefined) return sort === 'unitPrice' ? 'None of these stages has a price.' : '';
  const own =
    sort !== 'unitPrice' &&
    (leader.unitPrice ? `The stage costs ${priceText(leader.unitPrice)}` : 'The stage has no price');
  const louder = 20 * Math.log10(cheapest.inputNoiseRms / leader.inputNoiseRms);
  const isSame = leader.unitPrice?.amount === cheapest.unitPrice?.amount;
  const other = `the cheapest stage of all costs ${priceText(cheapest.unitPrice!)} and is ${formatQuantity(louder, 'decibel')} noisier`;
  if (isSame) return own ? `${own}: no stage is cheaper.` : 'No stage is cheaper.';
  return own ? `${own}; ${other}.` : `T${other.slice(1)}.`;
}

function choiceText(pairs: number, stage: SoughtStage, isByPrice: boolean): string {
  const noun = networkNoun(stage);
  return pairs === 1
    ? `the only ${noun} that gives it`
    : `the ${isByPrice ? 'cheapest' : 'quietest'} of ${grouped(pairs)} ${noun}s that give it`;
}

function gainSentence(gain: number, stage: SoughtStage): string {
  const off = gain / wantedGain(stage) - 1;
  const subject = stage.topology === 'transimpedance' ? 'R_f' : 'The gain';
  if (Math.abs(off) < EXACT) return `${subject} is just as wanted.`;
  const side = off > 0 ? 'above' : 'below';
  const far = formatQuantity(Math.abs(off), 'fraction', { digits: 2 });
  return `${subject} is ${gainFigure(stage, gain)}, ${far} ${side} the wanted one.`;
}

/** What rounding leaves of a gain that two decimal values give exactly. */
const EXACT = 1e-9;

function networkNoun({ topology }: Pick<SoughtStage, 'topology'>): string {
  return topology === 'transimpedance' ? 'resistor' : 'resistor pair';
}

function grouped(count: number): string {
  return formatQuantity(count, 'count', { digits: 12 });
}
