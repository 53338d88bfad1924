import type { NetworkResistor } from './stageSearch.js';
import type { NetworkCosts } from './stageCosts.js';

/** A resistor in one place of the network. */
interface Choice {
  resistor: number;
  noiseIndex?: number;
  price: number;
}

/** The usable resistors of one value. */
export interface Value {
  resistance: number;
  /** how many there are */
  count: number;
  /** all of them, as both places of a network may take them */
  all: Choice[];
  gain: Choice[];
  feedback: Choice[];
}

/** R_g and R_f of the library, as one choice among those of equal values. */
export interface PairChoice {
  gain: Choice;
  feedback: Choice;
  price: number;
}

/**
 * The values of the library's resistors in ascending order. Of those with equal values only what another
 * doesn't beat in noise index and price is kept for each place, the first of equals; without a direct voltage
 * the noise index doesn't count, with one resistors of unknown noise index don't.
 */
export function distinctValues(
  resistors: readonly NetworkResistor[],
  hasExcess: boolean,
  costs: NetworkCosts,
): Value[] {
  const byResistance = new Map<number, Choice[]>();
  resistors.forEach(({ resistance, noiseIndex }, resistor) => {
    if (hasExcess && noiseIndex === null) return;
    const choice = { resistor, price: 0, ...(hasExcess && { noiseIndex: noiseIndex! }) };
    const known = byResistance.get(resistance);
    if (known) known.push(choice);
    else byResistance.set(resistance, [choice]);
  });
  return [...byResistance]
    .map(([resistance, all]) => ({
      resistance,
      count: all.length,
      all,
      gain: unbeaten(priced(all, costs.gain), measuresOf),
      feedback: unbeaten(priced(all, costs.feedback), measuresOf),
    }))
    .sort((a, b) => a.resistance - b.resistance);
}

/** The choices of R_g and R_f of two values that no other choice beats. */
export function pairChoices(gain: Value, feedback: Value, costs: NetworkCosts): PairChoice[] {
  if (gain !== feedback)
    return gain.gain.flatMap((one) =>
      feedback.feedback.map((other) => ({ gain: one, feedback: other, price: one.price + other.price })),
    );
  const pairs = gain.all.flatMap((one) =>
    gain.all.map((other) => ({ gain: one, feedback: other, price: priceOf(one, other, costs) })),
  );
  return unbeaten(pairs, (pair) => [pair.gain.noiseIndex ?? 0, pair.feedback.noiseIndex ?? 0, pair.price]);
}

/** Pieces of one part in both places are bought together. */
function priceOf(one: Choice, other: Choice, costs: NetworkCosts): number {
  if (one.resistor === other.resistor) return costs.both(one.resistor);
  return costs.gain(one.resistor) + costs.feedback(other.resistor);
}

function priced(choices: readonly Choice[], cost: (resistor: number) => number): Choice[] {
  return choices.map((choice) => ({ ...choice, price: cost(choice.resistor) }));
}

function measuresOf({ noiseIndex = 0, price }: Choice): number[] {
  return [noiseIndex, price];
}

/** Those that no other beats or equals in every measure; of equals the first. */
function unbeaten<Kind>(choices: readonly Kind[], measures: (choice: Kind) => readonly number[]): Kind[] {
  const kept: { choice: Kind; by: readonly number[] }[] = [];
  for (const choice of choices) {
    const by = measures(choice);
    if (kept.some((other) => isNoWorse(other.by, by))) continue;
    for (let i = kept.length - 1; i >= 0; i--) if (isNoWorse(by, kept[i].by)) kept.splice(i, 1);
    kept.push({ choice, by });
  }
  return kept.map(({ choice }) => choice);
}

function isNoWorse(one: readonly number[], other: readonly number[]): boolean {
  return one.every((measure, i) => measure <= other[i]);
}
