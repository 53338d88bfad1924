import type { ResistorConditions } from '@roothertz/common/conditions';
import { formatQuantity } from '@roothertz/common/units';
import type { AnswerWords } from '../AnswerBlock';
import { emptyResistorAdvice } from '../exclusionWords';
import type { ShownResistors } from './useResistors';

/** Which resistor is quietest at its place, or why there is none and what to change. */
export function resistorAnswer({ first, items, request: { conditions } }: ShownResistors): AnswerWords {
  const [leader] = items;
  if (!leader) return emptyWords(first.excluded, conditions);
  const { part, totalRms, aboveThermal } = leader;
  const figure = `${part.partNumber}: ${formatQuantity(totalRms, 'voltage')} rms`;
  return {
    lead: [
      { text: 'Quietest is ' },
      { text: figure, strong: true },
      { text: `, ${formatQuantity(aboveThermal, 'decibel')} above its thermal noise.` },
    ],
    following: `${countText(first.total)} within ${windowText(conditions)}. ${excessSentence(conditions)}`,
  };
}

function emptyWords(
  excluded: ShownResistors['first']['excluded'],
  conditions: ResistorConditions,
): AnswerWords {
  if (excluded.total > 0)
    return {
      lead: [{ text: 'No resistor is ranked.', strong: true }],
      following: emptyResistorAdvice(excluded),
    };
  return {
    lead: [{ text: `No resistor lies within ${windowText(conditions)}.`, strong: true }],
    following:
      'Widen the window, ask for another value, choose both libraries under Parts, or add resistors.',
  };
}

function countText(total: number): string {
  return total === 1 ? '1 resistor lies' : `${total} resistors lie`;
}

/** "2 % of 1 kΩ" */
function windowText({ resistance, resistanceTolerance }: ResistorConditions): string {
  const value = formatQuantity(resistance, 'resistance', { trim: true, digits: 4 });
  return `${formatQuantity(resistanceTolerance, 'fraction', { trim: true })} of ${value}`;
}

function excessSentence({ dcVoltage }: ResistorConditions): string {
  if (dcVoltage === 0)
    return 'Without a direct voltage a resistor makes no excess noise: only its value and temperature count.';
  const voltage = formatQuantity(Math.abs(dcVoltage), 'voltage', { trim: true });
  return `The excess noise that ${voltage} makes tells them apart.`;
}
