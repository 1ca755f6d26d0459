import type { UserRow } from "@/db/queries/users";
import type { Viewer } from "@/lib/access/scope";

/** What the rest of the program may know of the person who asks: never the password hash. */
export function viewerOf(user: UserRow): Viewer {
  return {
    userId: user.id,
    email: user.email,
    name: user.name ?? user.email,
    emailVerified: user.emailVerified !== null,
    timeZone: user.timeZone,
  };
}
