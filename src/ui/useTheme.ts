import { useCallback, useSyncExternalStore } from "react";

export type Theme = "auto" | "sun" | "night";

const storageKey = "theme";
const listeners = new Set<() => void>();

/**
 * The theme chosen on this device for the stall and grow screens, and how to change it.
 * The server and the first paint know only "auto"; put `data-theme={theme}` on the screen's outermost element.
 */
export function useTheme(): [Theme, (theme: Theme) => void] {
  const theme = useSyncExternalStore(subscribe, readTheme, () => "auto" as const);
  const setTheme = useCallback((next: Theme) => {
    try {
      localStorage.setItem(storageKey, next);
    } catch {
      // A device that keeps nothing still follows the system.
    }
    for (const listener of listeners) listener();
  }, []);
  return [theme, setTheme];
}

function subscribe(listener: () => void): () => void {
  listeners.add(listener);
  return () => listeners.delete(listener);
}

function readTheme(): Theme {
  try {
    const stored = localStorage.getItem(storageKey);
    return stored === "sun" || stored === "night" ? stored : "auto";
  } catch {
    return "auto";
  }
}
