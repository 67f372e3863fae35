export const THEME_KEY = "theme";

export const THEMES = [
  { value: "device", word: "As the device" },
  { value: "light", word: "Light" },
  { value: "dark", word: "Dark" },
] as const;

export type ThemeChoice = (typeof THEMES)[number]["value"];

export const isTheme = (value: unknown): value is "light" | "dark" => value === "light" || value === "dark";

/** Sets the chosen theme before the first paint; without a choice the device decides. */
const script = `try{const t=localStorage.getItem("${THEME_KEY}");if(t==="light"||t==="dark")document.documentElement.dataset.theme=t}catch{}`;

export function ThemeScript() {
  // biome-ignore lint/security/noDangerouslySetInnerHtml: a constant of ours; it must run before the page is painted
  return <script dangerouslySetInnerHTML={{ __html: script }} />;
}
