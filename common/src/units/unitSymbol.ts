/** Lists in Windows-1252 have no `√`: programs write `v` or `?` for it. */
const ROOT_HERTZ = /\/(?:√|sqrt|root|rt|v|\?)-?\(?hz\)?$/i;
const HERTZ_TO_HALF = /\/\(?hz\)?\^?\(?(?:0[.,]5|1[/⁄]2)\)?$/i;
const HERTZ_TO_MINUS_HALF = /[·⋅*]?\(?hz\)?\^\(?-(?:0[.,]5|1[/⁄]2)\)?$/i;
const RMS = /(?<=[va])\(?rms\)?/i;

/**
 * A unit's text in one spelling: no spaces, no `rms`, every form of the root of hertz (`rtHz`, `sqrt(Hz)`, `Hz^0.5`,
 * `Hz½`) as `√Hz`, and `ghz`, `thz` with their capital.
 */
export function unitSymbol(normalised: string): string {
  return normalised
    .replace(/\s/g, '')
    .replace(RMS, '')
    .replace(ROOT_HERTZ, '/√Hz')
    .replace(HERTZ_TO_HALF, '/√Hz')
    .replace(HERTZ_TO_MINUS_HALF, '/√Hz')
    .replace(/^[gt](?=hz$)/i, (prefix) => prefix.toUpperCase());
}

/** Whether a unit is `mhz`, in which nobody can tell milli from mega. */
export function isAmbiguousHertz(unitText: string): boolean {
  return unitSymbol(unitText) === 'mhz';
}
