import { eq } from "drizzle-orm";
import { describe, expect, it, vi } from "vitest";
import { database } from "@/db/client";
import { findUserByEmail } from "@/db/queries/users";
import { sessions } from "@/db/schema/people";
import { changePassword } from "@/lib/account/change-password";
import { checkPassword } from "@/lib/account/check-password";
import { confirmAddress } from "@/lib/account/confirm-address";
import { lookAtLink } from "@/lib/account/look-at-link";
import { requestReset } from "@/lib/account/request-reset";
import { resetPassword } from "@/lib/account/reset-password";
import { endAllSessions, endSession, loadSessions } from "@/lib/account/sessions";
import { setTheme } from "@/lib/account/set-theme";
import { signUp } from "@/lib/account/sign-up";
import type * as EnvModule from "@/lib/env";
import {
  expireTokens,
  freshAddress,
  freshCall,
  mailedToken,
  makeAccount,
  PASSWORD,
  signedIn,
  tokensOf,
  writeId,
} from "../support/accounts";
import { useDatabase } from "../support/database";
import { makeViewer } from "../support/people";

const settings = vi.hoisted(() => ({ signUp: "open" }));
vi.mock("@/lib/env", async (original) => {
  const real = await original<typeof EnvModule>();
  return { ...real, env: () => ({ ...real.env(), SIGN_UP: settings.signUp }) };
});

useDatabase();

const NEW_PASSWORD = "a longer bodge wire 4";
const signUpAs = (email: string, password = PASSWORD) =>
  signUp({ writeId: writeId(), name: "Noor", email, password, timeZone: "Europe/Amsterdam" }, freshCall());

describe("signing up", () => {
  it("lets somebody in only with the link of the mail and the password together", async () => {
    const email = freshAddress("noor");
    expect(await signUpAs(email)).toEqual({ ok: true, value: null });
    expect(await checkPassword({ email, password: PASSWORD }, freshCall())).toMatchObject({
      error: { code: "forbidden" },
    });

    const token = await mailedToken(email, "confirm-address");
    const wrong = await confirmAddress({ token, password: "not the password" }, freshCall());
    expect(wrong).toMatchObject({ ok: false, error: { code: "invalid" } });
    expect((await findUserByEmail(database(), email))?.emailVerified).toBeNull();

    expect(await confirmAddress({ token, password: PASSWORD }, freshCall())).toEqual({ ok: true, value: { email } });
    expect(await checkPassword({ email, password: PASSWORD }, freshCall())).toMatchObject({ ok: true });
  });

  it("says of a confirmation link that it was used, and of an old one that it expired", async () => {
    const email = freshAddress("noor");
    await signUpAs(email);
    const token = await mailedToken(email, "confirm-address");
    await confirmAddress({ token, password: PASSWORD }, freshCall());
    const again = await confirmAddress({ token, password: PASSWORD }, freshCall());
    expect(again).toMatchObject({
      ok: false,
      error: { code: "gone", message: expect.stringContaining("used already") },
    });

    const late = await makeAccount({ isConfirmed: false });
    await signUpAs(late.email);
    const lateToken = await mailedToken(late.email, "confirm-address");
    await expireTokens(late.userId);
    const refused = await confirmAddress({ token: lateToken, password: PASSWORD }, freshCall());
    expect(refused).toMatchObject({ ok: false, error: { code: "gone", message: expect.stringContaining("expired") } });
  });

  it("is of no use to a stranger who signed the address up first", async () => {
    const email = freshAddress("victim");
    await signUpAs(email, "the stranger's own 1");
    await signUpAs(email, "the owner's own 2");
    const token = await mailedToken(email, "confirm-address");
    expect(await confirmAddress({ token, password: "the owner's own 2" }, freshCall())).toMatchObject({ ok: true });
    expect(await checkPassword({ email, password: "the stranger's own 1" }, freshCall())).toMatchObject({ ok: false });
  });

  it("answers the same for an address that has an account, keeps its password, and mails its owner a way in", async () => {
    const owner = await makeAccount();
    const known = await signUpAs(owner.email, NEW_PASSWORD);
    const unknown = await signUpAs(freshAddress(), NEW_PASSWORD);
    expect(known).toEqual(unknown);
    expect((await tokensOf(owner.email)).map((token) => token.purpose)).toEqual(["reset-password"]);
    expect(await checkPassword({ email: owner.email, password: PASSWORD }, freshCall())).toMatchObject({ ok: true });
  });

  it("is refused where people come in by invitation only", async () => {
    settings.signUp = "invitation";
    const email = freshAddress();
    expect(await signUpAs(email)).toMatchObject({
      error: { code: "forbidden", message: expect.stringContaining("invitation") },
    });
    expect(await findUserByEmail(database(), email)).toBeUndefined();
    settings.signUp = "open";
  });
});

describe("signing in", () => {
  it("answers a wrong password and an unknown address in the same words", async () => {
    const { email } = await makeAccount();
    const wrong = await checkPassword({ email, password: "something else entirely" }, freshCall());
    const unknown = await checkPassword({ email: freshAddress(), password: PASSWORD }, freshCall());
    expect(wrong).toMatchObject({ ok: false, error: { code: "invalid" } });
    expect(unknown).toEqual(wrong);
  });

  it("does not say that an address is unconfirmed to who does not know the password", async () => {
    const { email } = await makeAccount({ isConfirmed: false });
    const wrong = await checkPassword({ email, password: "something else entirely" }, freshCall());
    expect(wrong).toMatchObject({ ok: false, error: { code: "invalid" } });
    expect(await tokensOf(email)).toEqual([]);
  });

  it("keeps no session token that could be used from the table", async () => {
    const { userId } = await makeAccount();
    const { token, isOpen } = await signedIn(userId);
    expect(await isOpen()).toBe(true);
    const rows = await database().select().from(sessions).where(eq(sessions.userId, userId));
    expect(rows.map((row) => row.sessionToken)).not.toContain(token);
  });
});

describe("changing the password", () => {
  it("stops every other session at once and keeps the one it was changed in", async () => {
    const { userId, scope, email } = await makeAccount();
    const [shed, desk] = [await signedIn(userId), await signedIn(userId)];
    const input = { writeId: writeId(), current: PASSWORD, password: NEW_PASSWORD };
    expect(await changePassword(scope, input, desk.key)).toEqual({ ok: true, value: { ended: 1 } });
    expect([await shed.isOpen(), await desk.isOpen()]).toEqual([false, true]);
    expect(await checkPassword({ email, password: PASSWORD }, freshCall())).toMatchObject({ ok: false });
    expect(await checkPassword({ email, password: NEW_PASSWORD }, freshCall())).toMatchObject({ ok: true });
  });

  it("wants the present password, and changes nothing without it", async () => {
    const { userId, scope } = await makeAccount();
    const shed = await signedIn(userId);
    const input = { writeId: writeId(), current: "guessed wrongly", password: NEW_PASSWORD };
    expect(await changePassword(scope, input, undefined)).toMatchObject({
      ok: false,
      error: { fields: { current: expect.any(String) } },
    });
    expect(await shed.isOpen()).toBe(true);
  });

  it("refuses the address itself as a password", async () => {
    const { scope, email } = await makeAccount();
    const input = { writeId: writeId(), current: PASSWORD, password: email };
    expect(await changePassword(scope, input, undefined)).toMatchObject({
      ok: false,
      error: { fields: { password: expect.any(String) } },
    });
  });
});

describe("a forgotten password", () => {
  it("is set anew by the link of the mail, which also confirms the address and ends every session", async () => {
    const { userId, email } = await makeAccount({ isConfirmed: false });
    const shed = await signedIn(userId);
    await requestReset({ email }, freshCall());
    const token = await mailedToken(email, "reset-password");
    expect(await resetPassword({ writeId: writeId(), token, password: NEW_PASSWORD })).toEqual({
      ok: true,
      value: { email },
    });
    expect(await shed.isOpen()).toBe(false);
    expect(await checkPassword({ email, password: NEW_PASSWORD }, freshCall())).toMatchObject({ ok: true });
  });

  it("cannot be set twice with one link", async () => {
    const { email } = await makeAccount();
    await requestReset({ email }, freshCall());
    const token = await mailedToken(email, "reset-password");
    await resetPassword({ writeId: writeId(), token, password: NEW_PASSWORD });
    const again = await resetPassword({ writeId: writeId(), token, password: "yet another one 77" });
    expect(again).toMatchObject({
      ok: false,
      error: { code: "gone", message: expect.stringContaining("used already") },
    });
    expect(await checkPassword({ email, password: NEW_PASSWORD }, freshCall())).toMatchObject({ ok: true });
    expect(await lookAtLink("reset-password", token)).toEqual({ state: "used" });
  });

  it("is set once when the same press arrives twice", async () => {
    const { email } = await makeAccount();
    await requestReset({ email }, freshCall());
    const token = await mailedToken(email, "reset-password");
    const input = { writeId: writeId(), token, password: NEW_PASSWORD };
    const both = await Promise.all([resetPassword(input), resetPassword(input)]);
    expect(both).toEqual([
      { ok: true, value: { email } },
      { ok: true, value: { email } },
    ]);
  });

  it("is not set by a link that has expired or that a newer one replaced", async () => {
    const { userId, email } = await makeAccount();
    await requestReset({ email }, freshCall());
    const first = await mailedToken(email, "reset-password");
    await requestReset({ email }, freshCall());
    const second = await mailedToken(email, "reset-password");
    const replaced = await resetPassword({ writeId: writeId(), token: first, password: NEW_PASSWORD });
    expect(replaced).toMatchObject({
      ok: false,
      error: { code: "gone", message: expect.stringContaining("newer one") },
    });
    await expireTokens(userId);
    const late = await resetPassword({ writeId: writeId(), token: second, password: NEW_PASSWORD });
    expect(late).toMatchObject({ ok: false, error: { code: "gone", message: expect.stringContaining("expired") } });
    expect(await checkPassword({ email, password: PASSWORD }, freshCall())).toMatchObject({ ok: true });
  });

  it("is asked for with the same answer whether or not the address has an account", async () => {
    const { email } = await makeAccount();
    expect(await requestReset({ email: freshAddress() }, freshCall())).toEqual(
      await requestReset({ email }, freshCall()),
    );
  });

  it("cannot be set with a link made up by somebody", async () => {
    const made = await resetPassword({ writeId: writeId(), token: "x".repeat(43), password: NEW_PASSWORD });
    expect(made).toMatchObject({ ok: false, error: { code: "not-found" } });
  });
});

describe("sessions", () => {
  it("are listed without anything that opens them, and each can be ended", async () => {
    const { userId, scope } = await makeAccount();
    const [shed, desk] = [await signedIn(userId), await signedIn(userId)];
    const lines = await loadSessions(scope, desk.key);
    expect(lines.map((line) => line.isThis).sort()).toEqual([false, true]);
    expect(JSON.stringify(lines)).not.toContain(shed.key);
    const other = lines.find((line) => !line.isThis);
    expect(await endSession(scope, other?.id ?? "")).toMatchObject({ ok: true });
    expect([await shed.isOpen(), await desk.isOpen()]).toEqual([false, true]);
  });

  it("of other people cannot be ended", async () => {
    const [ada, eve] = [await makeAccount(), await makeAccount({ name: "Eve" })];
    const desk = await signedIn(ada.userId);
    const line = (await loadSessions(ada.scope, undefined))[0];
    expect(await endSession(eve.scope, line?.id ?? "")).toMatchObject({ ok: false, error: { code: "not-found" } });
    expect(await desk.isOpen()).toBe(true);
  });

  it("all end with one press, this one too", async () => {
    const { userId, scope } = await makeAccount();
    const both = [await signedIn(userId), await signedIn(userId)];
    expect(await endAllSessions(scope)).toEqual({ ok: true, value: { ended: 2 } });
    expect(await Promise.all(both.map((session) => session.isOpen()))).toEqual([false, false]);
  });
});

it("keeps the colours chosen in the header for the person's other devices", async () => {
  const viewer = await makeViewer();
  await setTheme({ viewer }, { writeId: writeId(), theme: "dark" });
  expect((await findUserByEmail(database(), viewer.email))?.theme).toBe("dark");
});
