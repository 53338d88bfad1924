import { App, ConfigProvider } from 'antd';
import enGB from 'antd/locale/en_GB';
import { useCallback, useLayoutEffect, useMemo, useState, useSyncExternalStore, type ReactNode } from 'react';
import { antdThemeOf, showTheme } from '../theme';
import { ThemeContext, type ThemeChoice } from './useTokens';

const STORAGE_KEY = 'roothertz.theme';

/** Clear of the bar at the foot of a page, where changes are saved. */
const NOTICES = { bottom: 76 };

/** Shows the theme that the member chose in this browser, else the system's. */
export function ThemeProvider({ children }: { children: ReactNode }) {
  const [choice, setChoice] = useState(storedChoice);
  const isDark = useMedia('(prefers-color-scheme: dark)');
  const isStill = useMedia('(prefers-reduced-motion: reduce)');
  const mode = choice !== 'system' ? choice : isDark ? 'dark' : 'light';
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
  const antdTheme = useMemo(() => antdThemeOf(mode, { isStill }), [mode, isStill]);
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

/** Whether what a media query asks holds, also when that changes. */
function useMedia(query: string): boolean {
  const subscribe = useCallback(
    (onChange: () => void) => {
      const media = window.matchMedia(query);
      media.addEventListener('change', onChange);
      return () => media.removeEventListener('change', onChange);
    },
    [query],
  );
  return useSyncExternalStore(subscribe, () => window.matchMedia(query).matches);
}
