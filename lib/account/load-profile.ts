import { database } from "@/db/client";
import { findUser } from "@/db/queries/users";
import type { Theme } from "@/db/schema/people";
import type { OwnScope } from "@/lib/access/scope";

export type Profile = {
  name: string;
  email: string;
  timeZone: string;
  theme: Theme;
  speakAloud: boolean;
  mailOnReopen: boolean;
  hasPassword: boolean;
  /** Mail to the address came back; no digest is sent until a mailed link was used again. */
  mailBounced: boolean;
};

export async function loadProfile(scope: OwnScope): Promise<Profile> {
  const user = await findUser(database(), scope.viewer.userId);
  if (!user) throw new Error("the signed-in person has no row");
  const { email, timeZone, theme, speakAloud, mailOnReopen } = user;
  return {
    name: user.name ?? "",
    email,
    timeZone,
    theme,
    speakAloud,
    mailOnReopen,
    hasPassword: user.passwordHash !== null,
    mailBounced: user.mailBouncedAt !== null,
  };
}
