import { THEMES, chooseTheme, useThemeChoice } from '../../../lib/theme/theme.ts';

const NAMES = {
  system: 'As the system',
  light: 'Light: paper and ink',
  dark: 'Dark: slate and chalk',
} as const;

export function ThemeChoices() {
  const choice = useThemeChoice();
  return (
    <fieldset className="m-0 flex flex-wrap gap-x-6 gap-y-2 border-0 p-0">
      <legend className="sr-only">Theme</legend>
      {THEMES.map((theme) => (
        <label key={theme} className="flex min-h-8 cursor-pointer items-center gap-2">
          <input
            type="radio"
            name="theme"
            value={theme}
            checked={choice === theme}
            onChange={() => {
              chooseTheme(theme);
            }}
            className="m-0 size-4 accent-(--accent)"
          />
          {NAMES[theme]}
        </label>
      ))}
    </fieldset>
  );
}
