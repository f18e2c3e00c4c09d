import { useState } from "react";

type Theme = "system" | "light" | "dark";
const next: Readonly<Record<Theme, Theme>> = { system: "light", light: "dark", dark: "system" };

export function restoreTheme(): Theme {
  const kept = localStorage.getItem("theme");
  const theme: Theme = kept === "light" || kept === "dark" ? kept : "system";
  show(theme);
  return theme;
}

function show(theme: Theme): void {
  if (theme === "system") delete document.documentElement.dataset.theme;
  else document.documentElement.dataset.theme = theme;
}

/** Light, dark, or as the system has it. */
export function ThemeButton() {
  const [theme, setTheme] = useState<Theme>(restoreTheme);
  return (
    <button
      type="button"
      title="light, dark, or as the system has it"
      aria-label={`theme: ${theme}`}
      onClick={() => {
        const chosen = next[theme];
        localStorage.setItem("theme", chosen);
        show(chosen);
        setTheme(chosen);
      }}
    >
      theme: {theme}
    </button>
  );
}
