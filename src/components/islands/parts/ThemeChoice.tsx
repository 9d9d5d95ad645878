import { useState } from "react";
import { chooseTheme } from "#src/components/choose-theme.ts";
import { type ThemeChoice as Choice, THEME_CHOICES } from "#src/components/theme.ts";
import { RadioGroup } from "./RadioGroup.tsx";

const WORDS: Record<Choice, string> = { light: "Light", dark: "Dark", system: "As this device is set" };

/** The theme of this browser, taken at once. `start` is what the cookie says. */
export default function ThemeChoice({ start }: { start: Choice }) {
  const [theme, setTheme] = useState(start);
  return (
    <RadioGroup
      legend="Colours"
      inline
      value={theme}
      choices={THEME_CHOICES.map((choice) => ({ value: choice, label: WORDS[choice] }))}
      onChoose={(value) => {
        const choice = THEME_CHOICES.find((one) => one === value) ?? "system";
        setTheme(choice);
        chooseTheme(choice, document, matchMedia("(prefers-color-scheme: dark)"));
      }}
    />
  );
}
