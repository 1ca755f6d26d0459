import { cookies } from "next/headers";
import type { ReactNode } from "react";
import { AppHeader } from "@/components/shell/AppHeader";
import { asTheme, THEME_COOKIE } from "@/components/ui/theme";
import { SavedThemeSwitch } from "@/components/workshop/SavedThemeSwitch";

export default async function EntryLayout({ children }: { children: ReactNode }) {
  const theme = asTheme((await cookies()).get(THEME_COOKIE)?.value);
  return (
    <>
      <AppHeader home="/" theme={<SavedThemeSwitch theme={theme} />} />
      {children}
    </>
  );
}
