import { theme as antdTheme, type ThemeConfig } from 'antd';

export type ThemeMode = 'light' | 'dark';

/** Every colour of the product. The `…Ink` colours are for text where the plain one is too pale to read. */
export interface Tokens {
  paper: string;
  sheet: string;
  ink: string;
  muted: string;
  rule: string;
  damson: string;
  damsonWash: string;
  slate: string;
  ochre: string;
  ochreInk: string;
  verdigris: string;
  rust: string;
  hover: string;
}

export const TOKENS: Record<ThemeMode, Tokens> = {
  light: {
    paper: '#FBFAF6',
    sheet: '#FFFFFF',
    ink: '#22252B',
    muted: '#646973',
    rule: '#DEDACF',
    damson: '#6A2C5B',
    damsonWash: '#F3ECF1',
    slate: '#8A94A6',
    ochre: '#C07A12',
    ochreInk: '#8F5808',
    verdigris: '#2C7F70',
    rust: '#A33D24',
    hover: '#F3EFE6',
  },
  dark: {
    paper: '#17181B',
    sheet: '#1F2125',
    ink: '#E9E7E1',
    muted: '#A2A6AE',
    rule: '#34373D',
    damson: '#C58AB5',
    damsonWash: '#32262F',
    slate: '#79839A',
    ochre: '#E0A64B',
    ochreInk: '#E0A64B',
    verdigris: '#62B5A5',
    rust: '#E07F66',
    hover: '#282A2F',
  },
};

export const FONT_FAMILY = "'Source Sans 3', system-ui, sans-serif";

/** The custom property that holds a token, such as `--damson-wash`. */
export function variableOf(token: keyof Tokens): string {
  return `--${token.replace(/[A-Z]/g, (letter) => `-${letter.toLowerCase()}`)}`;
}

/** Puts a theme's colours on the document, where style sheets, drawings and charts read them. */
export function showTheme(mode: ThemeMode): void {
  const { style, dataset } = document.documentElement;
  dataset.theme = mode;
  style.colorScheme = mode;
  for (const [token, colour] of Object.entries(TOKENS[mode]))
    style.setProperty(variableOf(token as keyof Tokens), colour);
}

/** `isStill` = without motion, so that nothing waits for the end of one. */
export function antdThemeOf(mode: ThemeMode, { isStill }: { isStill: boolean }): ThemeConfig {
  const tokens = TOKENS[mode];
  return {
    algorithm: mode === 'dark' ? antdTheme.darkAlgorithm : antdTheme.defaultAlgorithm,
    token: {
      ...colourTokens(tokens),
      fontFamily: FONT_FAMILY,
      fontSize: 15,
      borderRadius: 4,
      borderRadiusLG: 4,
      borderRadiusSM: 4,
      controlHeight: 34,
      motion: !isStill,
    },
    components: {
      Button: {
        primaryColor: tokens.paper,
        primaryShadow: 'none',
        defaultShadow: 'none',
        dangerShadow: 'none',
      },
      Form: { itemMarginBottom: 16, labelColor: tokens.muted, verticalLabelPadding: '0 0 4px' },
      Select: { optionSelectedBg: tokens.damsonWash, optionActiveBg: tokens.hover },
      Segmented: {
        itemSelectedBg: tokens.damsonWash,
        itemSelectedColor: tokens.damson,
        trackBg: tokens.hover,
      },
    },
  };
}

function colourTokens(tokens: Tokens): ThemeConfig['token'] {
  return {
    colorPrimary: tokens.damson,
    colorLink: tokens.damson,
    colorLinkHover: tokens.damson,
    colorError: tokens.rust,
    colorErrorText: tokens.rust,
    colorWarning: tokens.ochre,
    colorSuccess: tokens.verdigris,
    colorInfo: tokens.slate,
    colorText: tokens.ink,
    colorTextSecondary: tokens.muted,
    colorTextDescription: tokens.muted,
    colorTextPlaceholder: tokens.muted,
    colorBgLayout: tokens.paper,
    colorBgContainer: tokens.sheet,
    colorBgElevated: tokens.sheet,
    controlItemBgActive: tokens.damsonWash,
    controlItemBgActiveHover: tokens.damsonWash,
    colorBorder: tokens.rule,
    colorBorderSecondary: tokens.rule,
  };
}
