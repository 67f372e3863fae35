"use client";

import { useSyncExternalStore } from "react";
import { isTheme, THEME_KEY, type ThemeChoice } from "./theme";

const CHANGED = "themechange";

function subscribe(onChange: () => void): () => void {
  // `storage` speaks in the other tabs, our own event in this one.
  for (const event of ["storage", CHANGED]) window.addEventListener(event, onChange);
  return () => {
    for (const event of ["storage", CHANGED]) window.removeEventListener(event, onChange);
  };
}

/** Reads the choice and dresses the page in it, whichever tab it was made in. */
function chosen(): ThemeChoice {
  const kept = localStorage.getItem(THEME_KEY);
  const theme = isTheme(kept) ? kept : "device";
  if (theme === "device") delete document.documentElement.dataset.theme;
  else document.documentElement.dataset.theme = theme;
  return theme;
}

function choose(theme: ThemeChoice): void {
  if (theme === "device") localStorage.removeItem(THEME_KEY);
  else localStorage.setItem(THEME_KEY, theme);
  window.dispatchEvent(new Event(CHANGED));
}

export function useTheme(): [ThemeChoice, (theme: ThemeChoice) => void] {
  return [useSyncExternalStore(subscribe, chosen, () => "device"), choose];
}
