import { cookies } from "next/headers";
import type { Theme } from "@/db/schema/people";

/** Read by the root layout, so that the first byte already has the right colours. */
const THEME_COOKIE = "theme";
const A_YEAR = 365 * 24 * 3600;

export async function keepTheme(theme: Theme): Promise<void> {
  (await cookies()).set(THEME_COOKIE, theme, { path: "/", maxAge: A_YEAR, sameSite: "lax" });
}
