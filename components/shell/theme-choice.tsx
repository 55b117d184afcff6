'use client';

import { useTheme } from 'next-themes';
import { useId } from 'react';

const THEMES = [
  { value: 'system', name: 'As the device' },
  { value: 'light', name: 'Light' },
  { value: 'dark', name: 'Dark' },
] as const;

/** Light, dark, or as the device says; kept in this browser. */
export const ThemeChoice = () => {
  const { theme, setTheme } = useTheme();
  const name = useId();
  return (
    <fieldset>
      <legend className="mb-1 text-sm text-ink-2">Appearance</legend>
      <div className="flex border border-edge">
        {THEMES.map((choice) => (
          <label
            key={choice.value}
            className="flex min-h-11 flex-auto cursor-pointer items-center justify-center px-2 text-sm has-checked:bg-ink has-checked:text-sheet has-focus-visible:outline-3 has-focus-visible:outline-offset-2 has-focus-visible:outline-act pointer-fine:min-h-9"
          >
            <input
              type="radio"
              name={name}
              value={choice.value}
              checked={theme === choice.value}
              onChange={() => setTheme(choice.value)}
              className="sr-only"
            />
            {choice.name}
          </label>
        ))}
      </div>
    </fieldset>
  );
};
