import {
  createContext,
  use,
  useCallback,
  useLayoutEffect,
  useMemo,
  useState,
  useSyncExternalStore,
  type ReactNode,
} from 'react';
import type { ThemeName } from './palettes';

export const THEME_CHOICES = ['system', 'light', 'dark'] as const;
export type ThemeChoice = (typeof THEME_CHOICES)[number];
export const THEME_CHOICE_LABELS: Record<ThemeChoice, string> = {
  system: 'As the system',
  light: 'Light',
  dark: 'Dark',
};

const STORAGE_KEY = 'bellgap.theme';
const DARK = '(prefers-color-scheme: dark)';

function readChoice(): ThemeChoice {
  try {
    const kept = localStorage.getItem(STORAGE_KEY);
    return THEME_CHOICES.find((choice) => choice === kept) ?? 'system';
  } catch {
    return 'system';
  }
}

function keepChoice(choice: ThemeChoice): void {
  try {
    localStorage.setItem(STORAGE_KEY, choice);
  } catch {
    // A browser that keeps nothing still shows the choice until the page is left.
  }
}

function subscribeToSystem(changed: () => void): () => void {
  const query = matchMedia(DARK);
  query.addEventListener('change', changed);
  return () => query.removeEventListener('change', changed);
}

interface ThemeState {
  choice: ThemeChoice;
  theme: ThemeName;
  choose(choice: ThemeChoice): void;
}

const ThemeContext = createContext<ThemeState>({ choice: 'system', theme: 'light', choose: () => undefined });

export function ThemeChoiceProvider({ children }: { children: ReactNode }) {
  const [choice, setChoice] = useState(readChoice);
  const systemIsDark = useSyncExternalStore(subscribeToSystem, () => matchMedia(DARK).matches);
  const theme: ThemeName = choice === 'system' ? (systemIsDark ? 'dark' : 'light') : choice;

  useLayoutEffect(() => {
    document.documentElement.dataset.theme = theme;
  }, [theme]);

  const choose = useCallback((next: ThemeChoice) => {
    keepChoice(next);
    setChoice(next);
  }, []);
  const state = useMemo(() => ({ choice, theme, choose }), [choice, theme, choose]);
  return <ThemeContext value={state}>{children}</ThemeContext>;
}

export function useThemeChoice(): ThemeState {
  return use(ThemeContext);
}
