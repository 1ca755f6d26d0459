import { DrizzleAdapter } from "@auth/drizzle-adapter";
import type { NextAuthConfig } from "next-auth";
import { encode } from "next-auth/jwt";
import Credentials from "next-auth/providers/credentials";
import { z } from "zod";
import { database } from "@/db/client";
import { findUser, findUserByEmail } from "@/db/queries/users";
import { accounts, sessions, users, verificationTokens } from "@/db/schema/people";
import { passwordFits } from "@/lib/account/password";
import { env } from "@/lib/env";
import { openSession, SESSION_SECONDS } from "./session";
import { linkProvider } from "./sign-in-link";
import { viewerOf } from "./viewer";

const credentials = z.object({ email: z.string(), password: z.string() });

/**
 * Sessions are rows of the database: deleting the row signs out at once. The library makes such a row by itself for
 * links by mail only; for a password its token callback marks the sign-in and its encoder makes the row instead of a
 * signed token. Made on first use, so that a build without environment succeeds.
 */
export function authConfig(): NextAuthConfig {
  const adapter = DrizzleAdapter(database(), {
    usersTable: users,
    accountsTable: accounts,
    sessionsTable: sessions,
    verificationTokensTable: verificationTokens,
  });
  return {
    adapter,
    secret: env().AUTH_SECRET,
    trustHost: true,
    useSecureCookies: env().APP_URL.startsWith("https:"),
    session: { strategy: "database", maxAge: SESSION_SECONDS },
    pages: { signIn: "/sign-in", error: "/sign-in", verifyRequest: "/check-email" },
    providers: [
      Credentials({ id: "password", credentials: { email: {}, password: {} }, authorize: personWithPassword }),
      linkProvider(async () => undefined),
    ],
    callbacks: {
      signIn: async ({ account, user }) =>
        account?.type !== "email" || Boolean(user.email && (await findUserByEmail(database(), user.email))),
      jwt: ({ token, account, user }) =>
        account?.type === "credentials" ? { sub: user.id, opensSession: true } : token,
      session: async ({ session, user }) => {
        const row = await findUser(database(), user.id);
        return { ...session, user: undefined, viewer: row ? viewerOf(row) : undefined };
      },
    },
    jwt: {
      encode: (params) =>
        params.token?.opensSession && params.token.sub ? openSession(params.token.sub) : encode(params),
    },
  };
}

async function personWithPassword(raw: unknown) {
  const given = credentials.safeParse(raw);
  if (!given.success) return null;
  const row = await findUserByEmail(database(), given.data.email.trim().toLowerCase());
  const fits = await passwordFits(row?.passwordHash, given.data.password);
  return row && fits ? { id: row.id, email: row.email, name: row.name } : null;
}
