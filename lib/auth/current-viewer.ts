import { cache } from "react";
import { database } from "@/db/client";
import { findSessionUser } from "@/db/queries/sessions";
import type { Viewer } from "@/lib/access/scope";
import { orDatabaseAway } from "@/lib/actions/unexpected";
import { currentSessionKey } from "./session-cookie";
import { viewerOf } from "./viewer";

/**
 * Who is signed in, from the session row; the same answer for the whole request. The row is read here and not by the
 * session library, which would answer "signed out" while the database is away: that must show as what it is.
 */
export const currentViewer = cache(async (): Promise<Viewer | undefined> => {
  const key = await currentSessionKey();
  if (!key) return undefined;
  const user = await orDatabaseAway(() => findSessionUser(database(), key));
  return user ? viewerOf(user) : undefined;
});
