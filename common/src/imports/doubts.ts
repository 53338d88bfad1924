import { shotPowerDensity } from '../noise/shot.js';
import type { Amplifier, LibraryPart, ListedFields, ParameterDefinition } from '../parts/index.js';
import { formatQuantity } from '../units/index.js';
import type { Doubt } from './rowVerdict.js';

/** V/√Hz; the quietest op-amps are made with about three times as much (common practice, no source). */
const QUIETEST = 3e-10;
/** A figure that is so many times another's has slipped by an SI prefix. */
const SLIP = 300;

/**
 * What makes a part suspicious that could be kept: current noise under the shot noise √(2·q·I_b) of its stated
 * bias current, voltage noise under 0.3 nV/√Hz, a figure about a thousand times or a thousandth of what
 * another record of the same part says.
 */
export function doubtsOf<Part extends LibraryPart>(
  catalogue: ListedFields,
  part: Part,
  others: readonly (Part | null)[],
): Doubt[] {
  const slips = others.flatMap((other) => (other === null ? [] : unitSlips(catalogue, part, other)));
  const once = slips.filter(
    (doubt, index) => slips.findIndex(({ field }) => field === doubt.field) === index,
  );
  return [...(catalogue.group === 'amplifier' ? amplifierDoubts(figuresOf(catalogue, part)) : []), ...once];
}

function amplifierDoubts(figures: Readonly<Record<string, number | null>>): Doubt[] {
  const { voltageNoise, currentNoise, inputBiasCurrent } = figures as unknown as Amplifier;
  const doubts: Doubt[] = [];
  const shot = inputBiasCurrent === null ? 0 : Math.sqrt(shotPowerDensity(inputBiasCurrent));
  if (currentNoise !== null && currentNoise < shot)
    doubts.push({
      code: 'below-shot-noise',
      field: 'amplifier.currentNoise',
      message: `below the shot noise of its bias current, ${formatQuantity(shot, 'currentNoiseDensity')}`,
    });
  if (voltageNoise < QUIETEST)
    doubts.push({
      code: 'implausibly-quiet',
      field: 'amplifier.voltageNoise',
      message: `${formatQuantity(voltageNoise, 'voltageNoiseDensity')} is quieter than any op-amp: is the unit right?`,
    });
  return doubts;
}

function unitSlips<Part extends LibraryPart>(catalogue: ListedFields, part: Part, other: Part): Doubt[] {
  const [here, there] = [figuresOf(catalogue, part), figuresOf(catalogue, other)];
  return catalogue.parameters
    .filter(({ key }) => isSlip(here[key], there[key]))
    .map((parameter) => ({
      code: 'factor-of-1000' as const,
      field: `${catalogue.group}.${parameter.key}`,
      message: slipMessage(parameter, there[parameter.key]!),
    }));
}

function isSlip(one: number | null, other: number | null): boolean {
  if (!one || !other) return false;
  const ratio = Math.abs(one / other);
  return ratio >= SLIP || ratio <= 1 / SLIP;
}

function slipMessage({ label, kind }: ParameterDefinition, known: number): string {
  return `the library says ${label} ${formatQuantity(known, kind, { trim: true })}: is it a factor of 1000?`;
}

function figuresOf(catalogue: ListedFields, part: object): Readonly<Record<string, number | null>> {
  return (part as Record<string, Record<string, number | null>>)[catalogue.group];
}
