import { useState } from "react";
import { setTheme, storedTheme, type Theme, themes } from "./theme";

const words: Record<Theme, string> = { system: "as the system", light: "light", dark: "dark" };

/** Light, dark or as the system has it. */
export function ThemeSwitch() {
  const [theme, keep] = useState(storedTheme);
  return (
    <label className="inline-flex items-center gap-2">
      Board
      <select
        className="min-h-8 cursor-pointer border-b border-edge bg-transparent text-ink"
        value={theme}
        onChange={(event) => {
          const chosen = event.target.value as Theme;
          setTheme(chosen);
          keep(chosen);
        }}
      >
        {themes.map((name) => (
          <option key={name} value={name} className="bg-sheet text-ink">
            {words[name]}
          </option>
        ))}
      </select>
    </label>
  );
}
