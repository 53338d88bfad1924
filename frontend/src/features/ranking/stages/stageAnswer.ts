import { isFollower, type SoughtStage } from '@roothertz/common/noise';
import { formatQuantity } from '@roothertz/common/units';
import type { StageItem, StageRequest } from '../../../api/stages';
import type { Piece } from '../answer';
import type { AnswerWords } from '../AnswerBlock';
import { emptyAdvice } from '../exclusionWords';
import { rmsText } from '../noiseUnit';
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
  return { lead: leadSentence(items[0], request), following: followingSentences(items[0], first, stage) };
}

/** "Quietest is VR-1108 with 22 Ω and 2.18 kΩ: 67.8 nV rms, 1.47 dB above what the source itself makes." */
function leadSentence(leader: StageItem, { conditions }: StageRequest): Piece[] {
  const { part, channelsInParallel, inputNoiseRms, aboveFloor } = leader;
  const several = channelsInParallel > 1 ? `, ${channelsInParallel} channels in parallel` : '';
  const rms = rmsText(inputNoiseRms, conditions.stage.topology);
  const rest =
    aboveFloor === null
      ? ', from a source that makes no noise itself.'
      : `, ${formatQuantity(aboveFloor, 'decibel')} above what the source itself makes.`;
  return [
    { text: 'Quietest is ' },
    { text: `${part.partNumber}${networkText(leader)}${several}: ${rms}`, strong: true },
    { text: rest },
  ];
}

/** " with 22 Ω and 2.18 kΩ", nothing where the stage has no network. */
export function networkText({ network: { gainResistor, feedbackResistor } }: StageItem): string {
  const values = [gainResistor, feedbackResistor].flatMap((resistor) =>
    resistor ? [formatQuantity(resistor.resistance, 'resistance', { trim: true, digits: 4 })] : [],
  );
  return values.length === 0 ? '' : ` with ${values.join(' and ')}`;
}

function followingSentences(
  { network }: StageItem,
  { total, pairs }: Pick<ShownStages['first'], 'total' | 'pairs'>,
  stage: SoughtStage,
): string {
  const parts = total === 1 ? '1 op-amp is ranked,' : `${total} op-amps are ranked,`;
  if (isFollower(stage)) return `${parts} as ${total === 1 ? 'a follower' : 'followers'} without a network.`;
  const each = total === 1 ? '' : ' each';
  return `${gainSentence(network.gain, stage)} ${parts}${each} with ${choiceText(pairs, stage)}.`;
}

function choiceText(pairs: number, stage: SoughtStage): string {
  const noun = networkNoun(stage);
  return pairs === 1
    ? `the only ${noun} that gives it`
    : `the quietest of ${grouped(pairs)} ${noun}s that give it`;
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
