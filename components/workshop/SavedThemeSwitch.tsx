"use client";

import { useState } from "react";
import { reach, type Reply } from "@/components/ui/form/reply";
import { THEME_COOKIE, type Theme } from "@/components/ui/theme";
import { ThemeSwitch } from "@/components/ui/ThemeSwitch";
import { toast } from "@/components/ui/toast-store";

const A_YEAR = 365 * 24 * 3600;

type Props = {
  theme: Theme;
  /** Keeps the choice for the person's other devices; without it nobody is signed in. */
  save?: (input: { writeId: string; theme: Theme }) => Promise<Reply<null>>;
};

/** Kept on this device; the root layout reads the cookie, so the next page has its colours from the first byte. */
export function SavedThemeSwitch({ theme, save }: Props) {
  const [shown, setShown] = useState(theme);

  async function choose(chosen: Theme) {
    setShown(chosen);
    document.cookie = `${THEME_COOKIE}=${chosen}; path=/; max-age=${A_YEAR}; samesite=lax`;
    document.documentElement.dataset.theme = chosen;
    if (!save) return;
    const reply = await reach(() => save({ writeId: crypto.randomUUID(), theme: chosen }));
    if (!reply.ok) toast({ text: `The colours are kept on this device only. ${reply.error.message}`, kind: "error" });
  }

  return <ThemeSwitch value={shown} onChange={(chosen) => void choose(chosen)} />;
}
