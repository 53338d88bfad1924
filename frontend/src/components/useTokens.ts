import { createContext, use } from 'react';
import { TOKENS, type ThemeMode, type Tokens } from '../theme';

export type ThemeChoice = ThemeMode | 'system';

export interface ThemeState {
  choice: ThemeChoice;
  mode: ThemeMode;
  choose: (choice: ThemeChoice) => void;
}

export const ThemeContext = createContext<ThemeState>({
  choice: 'system',
  mode: 'light',
  choose: () => undefined,
});

export function useTheme(): ThemeState {
  return use(ThemeContext);
}

/** The colours of the theme that is shown, for drawings that can't use the custom properties. */
export function useTokens(): Tokens {
  return TOKENS[useTheme().mode];
}
