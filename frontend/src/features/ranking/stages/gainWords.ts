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
  if (nearest === null)
    return `The chosen libraries hold no resistors that keep the network’s limits: ${LIMITS}, tick more lifecycles and approvals under Parts, or add resistors.`;
  const off = Math.abs(nearest / wantedGain(stage) - 1);
  const told = `The nearest that the library can give within the network’s limits is ${gainText(stage, nearest)}, ${percent(off)} off`;
  return off > WIDEST
    ? `${told}: ${LIMITS}, or ask for that.`
    : `${told}: widen the tolerance to ${percent(nextRound(off))}, or ${LIMITS}.`;
}

/** The next number of one digit, so that what is typed from the text is wide enough. */
function nextRound(value: number): number {
  const step = 10 ** Math.floor(Math.log10(value));
  return Math.min(WIDEST, Number((Math.ceil(value / step) * step).toPrecision(1)));
}

function percent(value: number): string {
  return formatQuantity(value, 'fraction', { digits: 2, trim: true });
}
