"use client";

import type { IconName } from "./Icon";
import { IconButton } from "./IconButton";
import { Menu } from "./Menu";
import { asTheme, type Theme } from "./theme";

const CHOICES: Record<Theme, { label: string; icon: IconName }> = {
  system: { label: "As the system", icon: "screen" },
  light: { label: "Light", icon: "lamp" },
  dark: { label: "Dark", icon: "night" },
};

/** Presentational: the caller stores the choice in the cookie THEME_COOKIE and sets data-theme. */
export function ThemeSwitch({ value, onChange }: { value: Theme; onChange: (theme: Theme) => void }) {
  return (
    <Menu
      label="Colours"
      trigger={<IconButton icon={CHOICES[value].icon} label="Colours" tooltip={false} />}
      entries={Object.entries(CHOICES).map(([id, choice]) => ({ id, ...choice }))}
      selected={value}
      onSelect={(id) => onChange(asTheme(id))}
    />
  );
}
