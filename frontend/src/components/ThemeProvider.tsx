import { App, ConfigProvider } from 'antd';
import enGB from 'antd/locale/en_GB';
import { useLayoutEffect, useMemo, useState, useSyncExternalStore, type ReactNode } from 'react';
import { antdThemeOf, showTheme, type ThemeMode } from '../theme';
import { ThemeContext, type ThemeChoice } from './useTokens';

const STORAGE_KEY = 'roothertz.theme';

/** Clear of the bar at the foot of a page, where changes are saved. */
const NOTICES = { bottom: 76 };

/** Shows the theme that the member chose in this browser, else the system's. */
export function ThemeProvider({ children }: { children: ReactNode }) {
  const [choice, setChoice] = useState(storedChoice);
  const system = useSystemMode();
  const mode = choice === 'system' ? system : choice;
  useLayoutEffect(() => showTheme(mode), [mode]);
  const state = useMemo(
    () => ({
      choice,
      mode,
      choose: (next: ThemeChoice) => {
        localStorage.setItem(STORAGE_KEY, next);
        setChoice(next);
      },
    }),
    [choice, mode],
  );
  const antdTheme = useMemo(() => antdThemeOf(mode), [mode]);
  return (
    <ThemeContext value={state}>
      <ConfigProvider theme={antdTheme} locale={enGB} button={{ autoInsertSpace: false }}>
        <App notification={NOTICES}>{children}</App>
      </ConfigProvider>
    </ThemeContext>
  );
}

function storedChoice(): ThemeChoice {
  const stored = localStorage.getItem(STORAGE_KEY);
  return stored === 'light' || stored === 'dark' ? stored : 'system';
}

function useSystemMode(): ThemeMode {
  return useSyncExternalStore(subscribeToSystem, () => (darkQuery().matches ? 'dark' : 'light'));
}

function subscribeToSystem(onChange: () => void): () => void {
  const query = darkQuery();
  query.addEventListener('change', onChange);
  return () => query.removeEventListener('change', onChange);
}

function darkQuery(): MediaQueryList {
  return window.matchMedia('(prefers-color-scheme: dark)');
}
