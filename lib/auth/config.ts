import { CredentialsSignin, type NextAuthConfig } from "next-auth";
import { encode } from "next-auth/jwt";
import Credentials from "next-auth/providers/credentials";
import { database } from "@/db/client";
import { findUserByEmail } from "@/db/queries/users";
import { checkPassword } from "@/lib/account/check-password";
import { LINK_MINUTES } from "@/lib/account/link-minutes";
import { signInInput } from "@/lib/account/schema";
import { sendSignInLink } from "@/lib/account/send-sign-in-link";
import type { Refusal } from "@/lib/actions/answer";
import { env } from "@/lib/env";
import { showChosenTheme } from "@/lib/account/show-chosen-theme";
import { callFrom } from "@/lib/http/call";
import { log } from "@/lib/http/log";
import { sessionAdapter } from "./adapter";
import { openSession } from "./session";
import { SESSION_SECONDS } from "./session-cookie";

/** A sign-in that was refused for a reason that people are told. */
export class SignInRefused extends CredentialsSignin {
  constructor(readonly refusal: Refusal) {
    super(refusal.message);
  }
}

/**
 * Sessions are rows of the database: deleting the row signs out at once. The library makes such a row by itself for
 * links by mail only; for a password its token callback marks the sign-in and its encoder makes the row instead of a
 * signed token. Made on first use, so that a build without environment succeeds.
 */
export function authConfig(): NextAuthConfig {
  return {
    adapter: sessionAdapter(),
    secret: env().AUTH_SECRET,
    trustHost: true,
    useSecureCookies: env().APP_URL.startsWith("https:"),
    session: { strategy: "database", maxAge: SESSION_SECONDS },
    pages: { signIn: "/sign-in", error: "/sign-in", verifyRequest: "/check-email" },
    logger: { error: logUnlessExpected, warn: () => undefined, debug: () => undefined },
    providers: [
      Credentials({ id: "password", credentials: { email: {}, password: {} }, authorize: personWithPassword }),
      {
        id: "link",
        type: "email",
        name: "Link by e-mail",
        maxAge: LINK_MINUTES * 60,
        options: {},
        sendVerificationRequest: ({ identifier, url, token }) => sendSignInLink({ email: identifier, token, url }),
      },
    ],
    callbacks: {
      signIn: async ({ account, user, email }) => {
        if (account?.type !== "email") return true;
        const known = user.email ? await findUserByEmail(database(), user.email) : undefined;
        // Whoever is not known yet, or has not confirmed the address with the password, is told to look for mail too.
        return known?.emailVerified ? true : email?.verificationRequest ? "/check-email" : false;
      },
      jwt: ({ token, account, user }) =>
        account?.type === "credentials" ? { sub: user.id, opensSession: true } : token,
      redirect: ({ url }) => {
        const target = new URL(url, env().APP_URL);
        return target.origin === new URL(env().APP_URL).origin ? target.toString() : env().APP_URL;
      },
    },
    events: { signIn: ({ user }) => showChosenTheme(user.id) },
    jwt: {
      encode: (params) =>
        params.token?.opensSession && params.token.sub ? openSession(params.token.sub) : encode(params),
    },
  };
}

async function personWithPassword(raw: unknown, request: Request) {
  const given = signInInput.safeParse(raw);
  if (!given.success) return null;
  const answer = await checkPassword(given.data, callFrom(request.headers));
  if (!answer.ok) throw new SignInRefused(answer.error);
  return { id: answer.value.userId };
}

/** A refused sign-in and a link that was used up are answers, not failures. */
function logUnlessExpected(error: Error): void {
  if (!(error instanceof SignInRefused) && error.name !== "Verification")
    log().warn({ err: error }, "the session library reports an error");
}
