import { NextRequest } from "next/server";
import { beforeEach, describe, expect, it, vi } from "vitest";
import { GET } from "@/app/api/auth/[...nextauth]/route";
import { database } from "@/db/client";
import { findSessionUser } from "@/db/queries/sessions";
import { requestSignInLink } from "@/lib/account/request-sign-in-link";
import { handlers } from "@/lib/auth/auth";
import { sessionCookieName, sessionKey } from "@/lib/auth/session-cookie";
import { env } from "@/lib/env";
import { freshAddress, freshCall, makeAccount } from "../support/accounts";
import { useDatabase } from "../support/database";

const mailed = vi.hoisted(() => ({ links: [] as { to: string; link: string }[] }));
vi.mock("@/lib/account/mail-sign-in-link", () => ({
  mailSignInLink: async (to: string, link: string) => void mailed.links.push({ to, link }),
}));

useDatabase();
beforeEach(() => void mailed.links.splice(0));

const at = (path: string) => new URL(path, env().APP_URL);

/** What the action does through the library inside a request, here through its handlers. */
async function askLibrary({ email, next }: { email: string; next: string }) {
  const csrf = await handlers.GET(new NextRequest(at("/api/auth/csrf")));
  const cookie = csrf.headers
    .getSetCookie()
    .map((one) => one.split(";")[0])
    .join("; ");
  const { csrfToken } = await csrf.json();
  return handlers.POST(
    new NextRequest(at("/api/auth/signin/link"), {
      method: "POST",
      headers: { "content-type": "application/x-www-form-urlencoded", cookie },
      body: new URLSearchParams({ email, csrfToken, callbackUrl: next }),
    }),
  );
}

/** The press on the page that the mail leads to. */
function press(link: string, headers: Record<string, string> = { "sec-fetch-site": "same-origin" }) {
  const { token = "", email = "", next = "" } = Object.fromEntries(new URL(link).searchParams);
  const address = at("/api/auth/callback/link");
  address.search = new URLSearchParams({ token, email, callbackUrl: next }).toString();
  return GET(new NextRequest(address, { headers }));
}

function sessionOf(response: Response): string | undefined {
  const cookie = response.headers.getSetCookie().find((one) => one.startsWith(`${sessionCookieName()}=`));
  return cookie?.split(";")[0]?.split("=")[1];
}

async function linkFor(email: string): Promise<string> {
  await requestSignInLink({ email, next: "/projects/tide/log" }, freshCall(), askLibrary);
  const mail = mailed.links.find((one) => one.to === email);
  if (!mail) throw new Error("no link was mailed");
  return mail.link;
}

describe("a link by mail", () => {
  it("leads to our own page, signs in with one press and goes on to where one was", async () => {
    const { email, userId } = await makeAccount();
    const link = await linkFor(email);
    expect(new URL(link).pathname).toBe("/sign-in/link");
    const answer = await press(link);
    expect(answer.headers.get("location")).toBe(at("/projects/tide/log").toString());
    const user = await findSessionUser(database(), sessionKey(sessionOf(answer) ?? ""));
    expect(user?.id).toBe(userId);
  });

  it("works once", async () => {
    const { email } = await makeAccount();
    const link = await linkFor(email);
    await press(link);
    const again = await press(link);
    expect(again.headers.get("location")).toContain("/sign-in?error=Verification");
    expect(sessionOf(again)).toBeUndefined();
  });

  it("cannot be pressed from another site, which leads to the page instead", async () => {
    const { email } = await makeAccount();
    const link = await linkFor(email);
    const answer = await press(link, { "sec-fetch-site": "cross-site" });
    expect(new URL(answer.headers.get("location") ?? "").pathname).toBe("/sign-in/link");
    expect(sessionOf(answer)).toBeUndefined();
    expect(sessionOf(await press(link))).toBeDefined();
  });

  it("is asked for with the same answer whoever has an account, and mailed only to confirmed addresses", async () => {
    const known = await makeAccount();
    const unconfirmed = await makeAccount({ isConfirmed: false });
    const next = "/projects";
    const answers = [];
    for (const email of [known.email, unconfirmed.email, freshAddress()]) {
      answers.push(await requestSignInLink({ email, next }, freshCall(), askLibrary));
    }
    expect(answers).toEqual(Array.from({ length: 3 }, () => ({ ok: true, value: null })));
    expect(mailed.links.map((one) => one.to)).toEqual([known.email]);
  });

  it("does not go on to another site", async () => {
    const { email } = await makeAccount();
    await requestSignInLink({ email, next: "/projects" }, freshCall(), askLibrary);
    const link = new URL(mailed.links[0]?.link ?? "");
    link.searchParams.set("next", "//elsewhere.example/login");
    const answer = await press(link.toString());
    expect(new URL(answer.headers.get("location") ?? "").origin).toBe(new URL(env().APP_URL).origin);
  });
});

describe("the session library's own addresses", () => {
  it.each(["session", "csrf", "providers", "signin", "signout", "callback/password", "error"])(
    "%s is closed",
    async (name) => {
      const answer = await GET(new NextRequest(at(`/api/auth/${name}`)));
      expect(answer.status).toBe(404);
    },
  );
});
