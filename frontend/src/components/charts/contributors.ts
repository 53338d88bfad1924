import type { Contributor } from '@roothertz/common/noise';
import type { Tokens } from '../../theme';

/** How a contributor looks wherever it is drawn: its colour, its text's colour, its pattern and its short name. */
export interface ContributorStyle {
  colour: keyof Tokens;
  textColour: keyof Tokens;
  pattern: 'plain' | 'rising' | 'falling' | 'dots' | 'bars' | 'crossed';
  /** For legends and table rows. */
  name: string;
  /** The symbol that stands at its disc; empty where the element itself tells. */
  symbol: '' | 'e' | 'i';
}

export const CONTRIBUTOR_STYLES: Record<Contributor, ContributorStyle> = {
  source: { colour: 'slate', textColour: 'muted', pattern: 'plain', name: 'source', symbol: '' },
  amplifierVoltage: {
    colour: 'damson',
    textColour: 'damson',
    pattern: 'plain',
    name: 'amplifier voltage',
    symbol: 'e',
  },
  amplifierCurrentSource: {
    colour: 'ochre',
    textColour: 'ochreInk',
    pattern: 'rising',
    name: 'amplifier current, + input',
    symbol: 'i',
  },
  amplifierCurrentFeedback: {
    colour: 'ochre',
    textColour: 'ochreInk',
    pattern: 'falling',
    name: 'amplifier current, − input',
    symbol: 'i',
  },
  feedback: {
    colour: 'verdigris',
    textColour: 'verdigris',
    pattern: 'dots',
    name: 'feedback network',
    symbol: '',
  },
  bias: {
    colour: 'verdigris',
    textColour: 'verdigris',
    pattern: 'bars',
    name: 'bias and load',
    symbol: '',
  },
  excess: { colour: 'rust', textColour: 'rust', pattern: 'crossed', name: 'excess', symbol: '' },
};
