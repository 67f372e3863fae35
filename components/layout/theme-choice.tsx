"use client";

import { Choice, ChoiceGroup, Radio } from "@/components/ui/choice";
import { THEMES } from "./theme";
import { useTheme } from "./use-theme";

export function ThemeChoice({ legend = "Appearance" }: { legend?: string }) {
  const [theme, choose] = useTheme();
  return (
    <ChoiceGroup legend={legend} className="flex flex-wrap">
      {THEMES.map(({ value, word }) => (
        <Choice key={value}>
          <Radio name="theme" value={value} checked={value === theme} onChange={() => choose(value)} />
          {word}
        </Choice>
      ))}
    </ChoiceGroup>
  );
}
