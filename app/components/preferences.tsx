// What a browser remembers of a person's wishes: theme and units. Cookies, so that the first paint is right already.
import { createContext, type ReactNode, useCallback, useContext, useMemo, useState } from "react";

export const themes = ["system", "light", "dark"] as const;
export type Theme = (typeof themes)[number];
export const unitNames = ["mm", "in"] as const;
export type UnitName = (typeof unitNames)[number];

export interface Preferences {
  readonly theme: Theme;
  readonly units: UnitName;
}

/** From a Cookie header; what is missing or unknown takes its usual value. */
export function readPreferences(cookies: string | null): Preferences {
  const valueOf = (name: string) => cookies?.split(/;\s*/).find((pair) => pair.startsWith(`${name}=`))?.slice(name.length + 1);
  return {
    theme: themes.find((theme) => theme === valueOf("theme")) ?? "system",
    units: unitNames.find((unit) => unit === valueOf("units")) ?? "mm",
  };
}

interface Kept extends Preferences {
  setTheme(theme: Theme): void;
  setUnits(units: UnitName): void;
}

const PreferencesContext = createContext<Kept>({ theme: "system", units: "mm", setTheme: () => undefined, setUnits: () => undefined });

export const usePreferences = () => useContext(PreferencesContext);

const aYear = 60 * 60 * 24 * 365;
const keep = (name: string, value: string) => {
  document.cookie = `${name}=${value}; path=/; max-age=${aYear}; samesite=lax`;
};

export function PreferencesProvider({ initial, children }: { initial: Preferences; children: ReactNode }) {
  const [preferences, setPreferences] = useState(initial);
  const setTheme = useCallback((theme: Theme) => {
    keep("theme", theme);
    if (theme === "system") delete document.documentElement.dataset.theme;
    else document.documentElement.dataset.theme = theme;
    setPreferences((before) => ({ ...before, theme }));
  }, []);
  const setUnits = useCallback((units: UnitName) => {
    keep("units", units);
    setPreferences((before) => ({ ...before, units }));
  }, []);
  const kept = useMemo(() => ({ ...preferences, setTheme, setUnits }), [preferences, setTheme, setUnits]);
  return <PreferencesContext value={kept}>{children}</PreferencesContext>;
}
