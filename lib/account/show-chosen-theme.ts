import { database } from "@/db/client";
import { findUser } from "@/db/queries/users";
import { keepTheme } from "./theme-cookie";

/** A device that somebody signs in on shows the colours of their settings. Outside a request there is no cookie to set. */
export async function showChosenTheme(userId: string | undefined): Promise<void> {
  const user = userId ? await findUser(database(), userId) : undefined;
  if (user && user.theme !== "system") await keepTheme(user.theme).catch(() => undefined);
}
