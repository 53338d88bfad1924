import type { RankingRequest } from '@roothertz/common/conditions';
import type { Contributions } from '@roothertz/common/noise';
import { formatQuantity } from '@roothertz/common/units';
import type { Ranking, RankingItem } from '../../api/ranking';
import { percentText, sharesOf } from '../../components/charts/shares';
import { noiseKind, rmsText } from './noiseUnit';
import { priceText } from '../../components/priceText';

/** A piece of a sentence; figures that matter are strong. */
export interface Piece {
  text: string;
  strong?: boolean;
}

/** "Quietest is VR-1108: 67.8 nV rms, 1.47 dB above what the source itself makes." */
export function leadSentence(leader: RankingItem, { conditions }: RankingRequest): Piece[] {
  const figure = `${leader.part.partNumber}: ${rmsText(leader.inputNoiseRms, conditions.stage.topology)}`;
  const rest =
    leader.aboveFloor === null
      ? ', from a source that makes no noise itself.'
      : `, ${formatQuantity(leader.aboveFloor, 'decibel')} above what the source itself makes.`;
  return [{ text: 'Quietest is ' }, { text: figure, strong: true }, { text: rest }];
}

/** What the leader's lead is worth: how many stand beside it, what is left to gain, what meets the target. */
export function followingSentences(
  ranking: Pick<Ranking, 'total' | 'quietSet' | 'floor' | 'cheapest'>,
  items: readonly RankingItem[],
  request: RankingRequest,
): string {
  const [leader] = items;
  const sentences = [
    quietSetSentence(ranking),
    cheapestSentence(ranking, leader),
    gainSentence(leader),
    targetSentence(ranking, items, request),
  ];
  return sentences.filter(Boolean).join(' ');
}

function quietSetSentence({ quietSet, total }: Pick<Ranking, 'quietSet' | 'total'>): string {
  const others = quietSet.total - 1;
  if (total === 1) return 'It is the only part that is ranked.';
  if (others <= 0) return 'It stands out from all others.';
  return others === 1
    ? '1 part can’t be told apart from it.'
    : `${others} parts can’t be told apart from it.`;
}

function cheapestSentence(
  { quietSet, cheapest }: Pick<Ranking, 'quietSet' | 'cheapest'>,
  leader: RankingItem,
): string {
  if (cheapest === null) return '';
  const price = priceText(cheapest.unitPrice);
  if (quietSet.total === 1) return `It costs ${price}.`;
  return cheapest.part.id === leader.part.id
    ? `None of them is cheaper than it, at ${price}.`
    : `The cheapest of them is ${cheapest.part.partNumber} at ${price}.`;
}

function gainSentence({ contributions }: RankingItem): string {
  const gain = formatQuantity(leftToGain(contributions), 'decibel');
  const { source } = sharesOf(contributions);
  const share = source > 0 ? `${percentText(source)} of the noise is the source’s: a` : 'A';
  return `${share} better amplifier gains at most ${gain}.`;
}

/** What an amplifier without noise would gain over this one in the same stage, in dB. */
export function leftToGain(contributions: Contributions): number {
  const shares = sharesOf(contributions);
  const amplifier = shares.amplifierVoltage + shares.amplifierCurrentSource + shares.amplifierCurrentFeedback;
  return -10 * Math.log10(1 - amplifier);
}

function targetSentence(
  { total, floor }: Pick<Ranking, 'total' | 'floor'>,
  items: readonly RankingItem[],
  { target, conditions }: RankingRequest,
): string {
  const limit = target?.inputNoiseRms;
  if (limit === undefined) return '';
  const kind = noiseKind(conditions.stage.topology);
  const limitText = formatQuantity(limit, kind);
  const met = items.filter(({ inputNoiseRms }) => inputNoiseRms <= limit).length;
  if (met === 0 && floor.inputNoiseRms > limit)
    return `No part can meet the target of ${limitText}: the source alone makes ${formatQuantity(floor.inputNoiseRms, kind)}.`;
  const more = met === items.length && items.length < total;
  return `${countText(met, more)} the target of ${limitText}.`;
}

function countText(met: number, more: boolean): string {
  if (met === 0) return 'No part meets';
  if (more) return `${met} parts or more meet`;
  return met === 1 ? '1 part meets' : `${met} parts meet`;
}

/** A text whose figures stay on one line with their units. */
export function unbroken(text: string): string {
  return text.replaceAll('\u2009', '\u202f');
}

export function plainText(pieces: readonly Piece[]): string {
  return pieces.map(({ text }) => text).join('');
}
