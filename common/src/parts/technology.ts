/** How a resistor is made; it decides how much excess noise it has. */
export const TECHNOLOGIES = [
  'metal-foil',
  'thin-film',
  'metal-film',
  'wirewound',
  'thick-film',
  'carbon-film',
  'carbon-composition',
] as const;
export type Technology = (typeof TECHNOLOGIES)[number];

export const TECHNOLOGY_LABELS: Record<Technology, string> = {
  'metal-foil': 'metal foil',
  'thin-film': 'thin film',
  'metal-film': 'metal film',
  wirewound: 'wirewound',
  'thick-film': 'thick film',
  'carbon-film': 'carbon film',
  'carbon-composition': 'carbon composition',
};
