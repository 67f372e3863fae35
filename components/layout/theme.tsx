/** Sets the chosen theme before the first paint; without a choice the device decides. */
const script = `try{const t=localStorage.getItem("theme");if(t)document.documentElement.dataset.theme=t}catch{}`;

export function ThemeScript() {
  // biome-ignore lint/security/noDangerouslySetInnerHtml: a constant of ours; it must run before the page is painted
  return <script dangerouslySetInnerHTML={{ __html: script }} />;
}
