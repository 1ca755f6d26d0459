export const THEMES = ["system", "light", "dark"] as const;

export type Theme = (typeof THEMES)[number];

/** The cookie that the root layout reads, so that the first byte already has the right colours. */
export const THEME_COOKIE = "theme";

export function asTheme(value: string | undefined): Theme {
  return THEMES.find((theme) => theme === value) ?? "system";
}
