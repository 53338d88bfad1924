import { STAGE_SEARCH_FIELDS, type SoughtStage } from '@roothertz/common/noise';
import { formatQuantity } from '@roothertz/common/units';

/** What the network is to give: a gain, in a transimpedance stage its feedback resistance. */
export function wantedGain({ topology, gain, feedbackResistance }: SoughtStage): number {
  return (topology === 'transimpedance' ? feedbackResistance : gain)!;
}

/** "a gain of 100", "1 GΩ" */
export function gainText(stage: Pick<SoughtStage, 'topology'>, gain: number): string {
  const figure = gainFigure(stage, gain);
  return stage.topology === 'transimpedance' ? figure : `a gain of ${figure}`;
}

export function gainFigure({ topology }: Pick<SoughtStage, 'topology'>, gain: number): string {
  const kind = topology === 'transimpedance' ? 'resistance' : 'gain';
  return formatQuantity(gain, kind, { trim: true, digits: 6 });
}

const WIDEST = STAGE_SEARCH_FIELDS['conditions.stage.gainTolerance'].bounds.to;
const LIMITS = 'raise “network at most” or lower “output drives at least”';

/** What to change where no network of the library gives the gain. */
export function nearestGainAdvice(stage: SoughtStage, nearest: number | null): string {
  if (nearest === null) return emptyLibraryAdvice(stage);
  const off = Math.abs(nearest / wantedGain(stage) - 1);
  const told = `The nearest that the library can give${isLimited(stage) ? ' within the network’s limits' : ''} is ${gainText(stage, nearest)}, ${percent(off)} off`;
  const other = isLimited(stage) ? `${LIMITS}, or ask for that` : 'ask for that, or add resistors';
  return off > WIDEST
    ? `${told}: ${other}.`
    : `${told}: widen the tolerance to ${percent(nextRound(off))}, or ${isLimited(stage) ? LIMITS : other}.`;
}

function emptyLibraryAdvice(stage: SoughtStage): string {
  const more =
    'tick more lifecycles and approvals under Parts, choose more technologies or wider tolerances, or add resistors';
  return isLimited(stage)
    ? `The chosen libraries hold no resistors that keep the network’s limits: ${LIMITS}, ${more}.`
    : `The chosen libraries hold no resistors: ${more}.`;
}

/** The one resistor of a transimpedance stage is only held against the wanted value. */
function isLimited({ topology }: SoughtStage): boolean {
  return topology !== 'transimpedance';
}

/** The next number of one digit, so that what is typed from the text is wide enough. */
function nextRound(value: number): number {
  const step = 10 ** Math.floor(Math.log10(value));
  return Math.min(WIDEST, Number((Math.ceil(value / step) * step).toPrecision(1)));
}

function percent(value: number): string {
  return formatQuantity(value, 'fraction', { digits: 2, trim: true });
}
