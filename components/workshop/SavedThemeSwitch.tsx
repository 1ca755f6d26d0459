"use client";

import { useState } from "react";
import { THEME_COOKIE, type Theme } from "@/components/ui/theme";
import { ThemeSwitch } from "@/components/ui/ThemeSwitch";

const A_YEAR = 365 * 24 * 3600;

/** Kept on this device; the root layout reads the cookie, so the next page has its colours from the first byte. */
export function SavedThemeSwitch({ theme }: { theme: Theme }) {
  const [shown, setShown] = useState(theme);
  return (
    <ThemeSwitch
      value={shown}
      onChange={(chosen) => {
        setShown(chosen);
        document.cookie = `${THEME_COOKIE}=${chosen}; path=/; max-age=${A_YEAR}; samesite=lax`;
        document.documentElement.dataset.theme = chosen;
      }}
    />
  );
}
