import {
  USUAL_DIFFERENCE_RESISTANCE,
  type OperatingConditions,
  type StageConditions,
} from '@roothertz/common/conditions';
import { evaluateStage, type Contributor, type StageFigures } from '@roothertz/common/noise';
import type { Amplifier } from '@roothertz/common/parts';
import { formatQuantity } from '@roothertz/common/units';
import { percentText, sharesOf } from '../../components/charts/shares';

interface Explained {
  conditions: OperatingConditions;
  amplifier: Amplifier;
  share: string;
}

/** A sentence on what makes most of the noise, and what would lower it. */
export function explainDominant(
  conditions: OperatingConditions,
  amplifier: Amplifier,
  { dominant, contributions }: Pick<StageFigures, 'dominant' | 'contributions'>,
): string {
  const share = percentText(sharesOf(contributions)[dominant]);
  return SENTENCES[dominant]({ conditions, amplifier, share });
}

const SENTENCES: Record<Contributor, (explained: Explained) => string> = {
  source: ({ share }) =>
    `The source itself makes ${share} of the noise: no amplifier takes that away, a cooler source or a narrower band does.`,
  amplifierVoltage: ({ share, conditions, amplifier }) =>
    `The amplifier’s voltage noise makes ${share} of the noise${flickerNote(conditions, amplifier)}: a part with a lower e_n would help.`,
  amplifierCurrentSource: ({ share, conditions }) =>
    conditions.stage.topology === 'difference'
      ? `The amplifier’s current noise at the + input makes ${share} of the noise: a lower network or a part with a lower i_n would help.`
      : `The amplifier’s current noise in the source’s impedance makes ${share} of the noise: a part with a lower i_n would help, such as one with a JFET or CMOS input.`,
  amplifierCurrentFeedback: ({ share }) =>
    `The amplifier’s current noise in the feedback network makes ${share} of the noise: a lower network or a part with a lower i_n would help.`,
  feedback: ({ share, conditions, amplifier }) =>
    `The feedback network makes ${share} of the noise: ${networkAdvice(conditions, amplifier)}.`,
  bias: ({ share, conditions }) =>
    conditions.stage.topology === 'inverting'
      ? `The bias resistor makes ${share} of the noise: a lower one, or none, would help.`
      : `The load resistor makes ${share} of the noise: a higher one would help.`,
  excess: ({ share }) =>
    `Excess noise of the resistors makes ${share} of the noise: less direct voltage, or resistors with a lower noise index, would help.`,
};

function flickerNote({ band }: OperatingConditions, { voltageNoiseCorner }: Amplifier): string {
  const middle = Math.sqrt(band.lower * band.upper);
  return (voltageNoiseCorner ?? 0) > middle ? ', most of it 1/f noise' : '';
}

function networkAdvice(conditions: OperatingConditions, amplifier: Amplifier): string {
  const { topology, gainResistance = 0, feedbackResistance = 0 } = conditions.stage;
  if (topology === 'transimpedance')
    return advice(conditions, amplifier, 'feedbackResistance', feedbackResistance, feedbackResistance * 10);
  const difference = louderDifference(conditions.stage);
  if (difference !== null)
    return advice(conditions, amplifier, 'differenceResistance', difference, difference / 10);
  return advice(conditions, amplifier, 'gainResistance', gainResistance, gainResistance / 10);
}

/** The difference resistance in Ω where those four make more noise than the network of the input pair. */
function louderDifference({ topology, gain = 1, gainResistance = 0, ...stage }: StageConditions) {
  const { differenceResistance = USUAL_DIFFERENCE_RESISTANCE } = stage;
  const isLouder = 4 * differenceResistance > gainResistance * gain * (gain - 1);
  return topology === 'instrumentation' && isLouder ? differenceResistance : null;
}

function advice(
  conditions: OperatingConditions,
  amplifier: Amplifier,
  field: keyof StageConditions,
  present: number,
  other: number,
): string {
  const changed = { ...conditions, stage: { ...conditions.stage, [field]: other } };
  const { feedback } = sharesOf(evaluateStage(changed, amplifier).contributions);
  const text = (value: number) => formatQuantity(value, 'resistance', { trim: true });
  return `${text(other)} instead of ${text(present)} would bring it to ${percentText(feedback)}`;
}
