const BROWSERS: [RegExp, string][] = [
  [/Edg\//, 'Edge'],
  [/OPR\//, 'Opera'],
  [/Firefox\//, 'Firefox'],
  [/Chrom(e|ium)\//, 'Chrome'],
  [/Safari\//, 'Safari'],
];

const SYSTEMS: [RegExp, string][] = [
  [/Android/, 'Android'],
  [/iPhone|iPad/, 'iOS'],
  [/Windows/, 'Windows'],
  [/Mac OS X|Macintosh/, 'macOS'],
  [/Linux|X11/, 'Linux'],
];

/** What a person calls the browser and machine that a session runs on. */
export function deviceWords(userAgent: string): string {
  const named = (list: [RegExp, string][]) => list.find(([pattern]) => pattern.test(userAgent))?.[1];
  const [browser, system] = [named(BROWSERS), named(SYSTEMS)];
  if (browser === undefined) return userAgent.slice(0, 60) || 'Unknown program';
  return system === undefined ? browser : `${browser} on ${system}`;
}
