import { THEME_CHOICES, THEME_CHOICE_LABELS, useThemeChoice } from '../theme/theme-choice';

const SIGNS = {
  system: <path d="M8 2a6 6 0 1 0 0 12zM8 2a6 6 0 1 1 0 12" fill="none" />,
  light: (
    <>
      <circle cx="8" cy="8" r="3" fill="none" />
      <path d="M8 .8v2.4M8 12.8v2.4M.8 8h2.4M12.8 8h2.4M2.9 2.9l1.7 1.7M11.4 11.4l1.7 1.7M2.9 13.1l1.7-1.7M11.4 4.6l1.7-1.7" />
    </>
  ),
  dark: <path d="M13.4 9.6A6 6 0 0 1 6.4 2.6a6 6 0 1 0 7 7z" fill="none" />,
};

/** One button that goes round: as the system, light, dark. */
export function ThemeSwitch() {
  const { choice, choose } = useThemeChoice();
  const next = THEME_CHOICES[(THEME_CHOICES.indexOf(choice) + 1) % THEME_CHOICES.length] ?? 'system';
  const words = `Colours: ${THEME_CHOICE_LABELS[choice].toLowerCase()}. Change to: ${THEME_CHOICE_LABELS[next].toLowerCase()}`;
  return (
    <button
      type="button"
      className="plain-button theme-switch"
      aria-label={words}
      title={words}
      onClick={() => choose(next)}
    >
      <svg width="16" height="16" viewBox="0 0 16 16" stroke="currentColor" strokeWidth="1.4" aria-hidden="true">
        {SIGNS[choice]}
        {choice === 'system' && <path d="M8 2a6 6 0 0 0 0 12z" fill="currentColor" />}
      </svg>
    </button>
  );
}
