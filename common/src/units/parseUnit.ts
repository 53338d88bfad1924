import type { QuantityKind } from './kinds.js';
import { normaliseText } from './normaliseText.js';
import { PREFIXES, TYPED_PREFIXES } from './prefixes.js';
import { CELSIUS, FAHRENHEIT, linearUnit, type Unit } from './unit.js';
import { isAmbiguousHertz, unitSymbol } from './unitSymbol.js';

const PREFIXED_UNITS: readonly [RegExp, QuantityKind][] = [
  [/^(?:Ω|R|ohms?)$/i, 'resistance'],
  [/^(?:F|farads?)$/i, 'capacitance'],
  [/^(?:H|henrys?|henries)$/i, 'inductance'],
  [/^(?:Hz|hertz)$/i, 'frequency'],
  [/^(?:K|kelvins?)$/, 'temperature'],
  [/^(?:V|volts?)$/i, 'voltage'],
  [/^(?:A|amps?|amperes?)$/i, 'current'],
  [/^V\/√Hz$/i, 'voltageNoiseDensity'],
  [/^A\/√Hz$/i, 'currentNoiseDensity'],
  [/^(?:W|watts?)$/i, 'power'],
];

const OTHER_UNITS: readonly [RegExp, Unit][] = [
  [/^$/, linearUnit(null)],
  [/^(?:(?:°|deg)?C|celsius)$/i, CELSIUS],
  [/^(?:(?:°|deg)?F|fahrenheit)$/i, FAHRENHEIT],
  [/^(?:K|kelvins?|(?:°|deg)C)$/, linearUnit('temperatureDifference')],
  [/^(?:1?\/(?:K|(?:°|deg)?C)|K\^-1)$/, linearUnit('temperatureCoefficient')],
  [/^%\/(?:K|(?:°|deg)?C)$/, linearUnit('temperatureCoefficient', -2)],
  [/^ppm\/(?:K|(?:°|deg)?C)$/i, linearUnit('temperatureCoefficient', -6)],
  [/^(?:%|percent)$/i, linearUnit('fraction', -2)],
  [/^ppm$/i, linearUnit('fraction', -6)],
  [/^dB$/i, linearUnit('decibel')],
  [/^(?:V\/V|×|x)$/i, linearUnit('gain')],
  [/^(?:pcs|pieces)$/i, linearUnit('count')],
];

/**
 * Reads a unit such as `nV/√Hz`, `MHz`, `kOhm`, `°C`, `%` or the empty unit; null for anything else.
 * `m` is milli and `M` mega; `mhz` in lower case is refused, since it may be either.
 * @param text any spelling that `parseQuantity` takes behind a number
 * @param expected the kind that decides where a letter has two meanings (`F`: farad, or degree Fahrenheit)
 * @returns the unit's kind, and factor and offset with SI value = value · factor + offset
 */
export function parseUnit(text: string, expected?: QuantityKind): Unit | null {
  const normalised = normaliseText(text);
  if (isAmbiguousHertz(normalised)) return null;
  const found = matchingUnits(unitSymbol(normalised));
  return found.find((unit) => unit.kind === expected) ?? found[0] ?? null;
}

function matchingUnits(symbol: string): Unit[] {
  const prefixed = prefixSplits(symbol).flatMap(([exponent, rest]) =>
    PREFIXED_UNITS.filter(([pattern]) => pattern.test(rest)).map(([, kind]) => linearUnit(kind, exponent)),
  );
  return [...prefixed, ...OTHER_UNITS.filter(([pattern]) => pattern.test(symbol)).map(([, unit]) => unit)];
}

function prefixSplits(symbol: string): [number, string][] {
  const splits: [number, string][] = [[0, symbol]];
  const exponent = TYPED_PREFIXES[symbol.charAt(0)];
  if (exponent !== undefined && canPrefix(symbol)) splits.push([exponent, symbol.slice(1)]);
  if (/^meg/i.test(symbol)) splits.push([PREFIXES.M, symbol.slice(3)]);
  return splits;
}

/** A unit of one letter in lower case counts behind a common prefix only: `pf` is a farad's, `Pa` no ampere's. */
function canPrefix(symbol: string): boolean {
  return /^[fpnuµmkKM]/.test(symbol) || !/^.[a-z](?:\/|$)/.test(symbol);
}
