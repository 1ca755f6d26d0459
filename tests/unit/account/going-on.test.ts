import { describe, expect, it } from "vitest";
import { browserOf } from "@/lib/account/browser-of";
import { HOME, safeNext } from "@/lib/account/safe-next";
import { email } from "@/lib/account/schema";
import { invitationState } from "@/lib/invitation/invitation-state";

describe("going on after signing in", () => {
  it.each(["/projects/tide/rack?as=table", "/invitation/abc", "/"])("keeps a path of ours: %s", (path) => {
    expect(safeNext(path)).toBe(path);
  });

  it.each([
    "//elsewhere.example",
    "/\\elsewhere.example",
    "https://elsewhere.example",
    "javascript:alert(1)",
    "/a\nb",
    "/a\\b",
    "projects",
    "",
    undefined,
  ])("never leads to another site: %s", (path) => {
    expect(safeNext(path)).toBe(HOME);
  });
});

describe("an e-mail address", () => {
  it("is kept as one however it was typed", () => {
    expect(email.parse("  Ada@Example.ORG ")).toBe("ada@example.org");
    expect(email.parse("ada＠example.org")).toBe("ada@example.org");
  });

  it.each([
    "ada",
    "ada@",
    "@example.org",
    "a b@example.org",
    "ada@example.org, eve@example.org",
    `${"a".repeat(250)}@example.org`,
  ])("that is none is refused with a sentence: %s", (typed) => {
    expect(email.safeParse(typed).error?.issues[0]?.message).toMatch(/\.$/);
  });
});

describe("the name of a session", () => {
  it.each([
    ["Mozilla/5.0 (X11; Linux x86_64; rv:140.0) Gecko/20100101 Firefox/140.0", "Firefox on Linux"],
    [
      "Mozilla/5.0 (iPhone; CPU iPhone OS 19_0 like Mac OS X) AppleWebKit/605.1.15 (KHTML, like Gecko) Version/19.0 Mobile/15E148 Safari/604.1",
      "Safari on iPhone",
    ],
    [
      "Mozilla/5.0 (Windows NT 10.0; Win64; x64) AppleWebKit/537.36 (KHTML, like Gecko) Chrome/140.0.0.0 Safari/537.36 Edg/140.0",
      "Edge on Windows",
    ],
    [
      "Mozilla/5.0 (Linux; Android 16) AppleWebKit/537.36 (KHTML, like Gecko) Chrome/140.0.0.0 Mobile Safari/537.36",
      "Chrome on Android",
    ],
    ["curl/8.0", "A browser that did not say its name"],
  ])("is what the browser says of itself: %s", (userAgent, name) => {
    expect(browserOf(userAgent)).toBe(name);
  });
});

describe("an invitation", () => {
  const at = new Date("2026-02-03T12:00:00Z");
  const open = { acceptedAt: null, withdrawnAt: null, expiresAt: new Date("2026-02-03T12:00:01Z") };

  it("works until the very second it expires", () => {
    expect(invitationState(open, at)).toBe("open");
    expect(invitationState({ ...open, expiresAt: at }, at)).toBe("expired");
  });

  it("that was used says so even when it has expired since", () => {
    expect(invitationState({ ...open, acceptedAt: at, expiresAt: at }, at)).toBe("used");
    expect(invitationState({ ...open, withdrawnAt: at, expiresAt: at }, at)).toBe("withdrawn");
  });
});
