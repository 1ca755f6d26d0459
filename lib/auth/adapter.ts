import { DrizzleAdapter } from "@auth/drizzle-adapter";
import type { Adapter } from "next-auth/adapters";
import { database } from "@/db/client";
import { accounts, sessions, users, verificationTokens } from "@/db/schema/people";
import { keepSession } from "./session";
import { sessionKey } from "./session-cookie";

/** The library's adapter on our tables, with one difference: session tokens are kept as hashes. */
export function sessionAdapter(): Adapter {
  const plain = DrizzleAdapter(database(), {
    usersTable: users,
    accountsTable: accounts,
    sessionsTable: sessions,
    verificationTokensTable: verificationTokens,
  });
  return {
    ...plain,
    createSession: async ({ sessionToken, userId, expires }) => {
      await keepSession(userId, sessionToken, expires);
      return { sessionToken, userId, expires };
    },
    getSessionAndUser: async (token) => {
      const found = await plain.getSessionAndUser?.(sessionKey(token));
      return found ? { ...found, session: { ...found.session, sessionToken: token } } : null;
    },
    updateSession: (session) => plain.updateSession?.({ ...session, sessionToken: sessionKey(session.sessionToken) }),
    deleteSession: (token) => plain.deleteSession?.(sessionKey(token)),
  };
}
