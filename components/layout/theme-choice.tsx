"use client";

const CHOICES = [
  { value: "", word: "As the device" },
  { value: "light", word: "Light" },
  { value: "dark", word: "Dark" },
] as const;

export function ThemeChoice() {
  const choose = (value: string) => {
    if (value) {
      localStorage.setItem("theme", value);
      document.documentElement.dataset.theme = value;
    } else {
      localStorage.removeItem("theme");
      delete document.documentElement.dataset.theme;
    }
  };
  return (
    <fieldset className="flex flex-wrap gap-4">
      <legend className="mb-1 font-semibold">Appearance</legend>
      {CHOICES.map(({ value, word }) => (
        <label key={word} className="flex min-h-8 items-center gap-2">
          <input
            type="radio"
            name="theme"
            value={value}
            onChange={() => choose(value)}
            className="size-4 accent-settled"
          />
          {word}
        </label>
      ))}
    </fieldset>
  );
}
