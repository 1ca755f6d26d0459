import { randomUUID } from "node:crypto";
import { like, sql } from "drizzle-orm";
import { describe, expect, it } from "vitest";
import { database } from "@/db/client";
import { rateLimits } from "@/db/schema/people";
import { checkPassword } from "@/lib/account/check-password";
import { requestReset } from "@/lib/account/request-reset";
import { problem } from "@/lib/http/problem";
import { limit, LIMITS, type LimitName } from "@/lib/http/rate-limit";
import { freshAddress, freshCall, makeAccount, PASSWORD } from "../support/accounts";
import { useDatabase } from "../support/database";

useDatabase();

const times = (n: number) => Array.from({ length: n });

describe("a limit", () => {
  it.each(Object.keys(LIMITS) as LimitName[])(
    "%s lets exactly as many through as it says, then names the wait",
    async (name) => {
      const key = randomUUID();
      const { points, seconds } = LIMITS[name];
      const answers = await Promise.all(times(points + 3).map(() => limit(name, key)));
      expect(answers.filter((answer) => answer.ok)).toHaveLength(points);
      const refused = answers.find((answer) => !answer.ok);
      expect(refused).toMatchObject({
        error: { code: "too-many", message: expect.stringMatching(/Try again in (a minute|\d+ minutes)\.$/) },
      });
      const wait = refused && !refused.ok ? refused.error.details?.retryAfterSeconds : undefined;
      expect(wait).toBeGreaterThan(seconds - 60);
      expect(wait).toBeLessThanOrEqual(seconds);
    },
  );

  it("counts each key for itself and is over when its time is", async () => {
    const [worn, fresh] = [randomUUID(), randomUUID()];
    await Promise.all(times(LIMITS.link.points).map(() => limit("link", worn)));
    expect((await limit("link", worn)).ok).toBe(false);
    expect((await limit("link", fresh)).ok).toBe(true);
    await database()
      .update(rateLimits)
      .set({ expire: sql`now() - interval '1 second'` })
      .where(like(rateLimits.key, "link:%"));
    expect((await limit("link", worn)).ok).toBe(true);
  });

  it("keeps neither addresses nor connections in the table", async () => {
    const secret = `secret-${randomUUID()}`;
    await limit("reset", secret);
    const rows = await database()
      .select()
      .from(rateLimits)
      .where(like(rateLimits.key, `%${secret}%`));
    expect(rows).toEqual([]);
  });

  it("becomes a 429 with Retry-After at the API", async () => {
    const key = randomUUID();
    await Promise.all(times(LIMITS.link.points).map(() => limit("link", key)));
    const refused = await limit("link", key);
    if (refused.ok) throw new Error("it should be used up");
    const response = problem(refused.error, "test");
    expect(response.status).toBe(429);
    expect(Number(response.headers.get("retry-after"))).toBeGreaterThan(0);
  });
});

describe("guessing a password", () => {
  it("is stopped for that address and connection, even for the right one, and for nobody else", async () => {
    const { email } = await makeAccount();
    const call = freshCall();
    for (const _try of times(LIMITS["sign-in"].points)) {
      expect(await checkPassword({ email, password: "wrong every time" }, call)).toMatchObject({
        error: { code: "invalid" },
      });
    }
    expect(await checkPassword({ email, password: PASSWORD }, call)).toMatchObject({ error: { code: "too-many" } });
    expect(await checkPassword({ email, password: PASSWORD }, freshCall())).toMatchObject({ ok: true });
  });

  it("of an unknown address is stopped after as many tries as of a known one", async () => {
    const email = freshAddress();
    const call = freshCall();
    for (const _try of times(LIMITS["sign-in"].points)) await checkPassword({ email, password: PASSWORD }, call);
    expect(await checkPassword({ email, password: PASSWORD }, call)).toMatchObject({ error: { code: "too-many" } });
  });

  it("on many addresses from one connection is stopped", async () => {
    const call = freshCall();
    const tries = times(LIMITS["sign-in-ip"].points).map(() =>
      checkPassword({ email: freshAddress(), password: PASSWORD }, call),
    );
    await Promise.all(tries);
    expect(await checkPassword({ email: freshAddress(), password: PASSWORD }, call)).toMatchObject({
      error: { code: "too-many" },
    });
  });

  it("never adds up for who signs in rightly, however often", async () => {
    const { email } = await makeAccount();
    const call = freshCall();
    for (const _time of times(LIMITS["sign-in"].points + 2)) {
      expect(await checkPassword({ email, password: PASSWORD }, call)).toMatchObject({ ok: true });
    }
  });
});

describe("asking for mail", () => {
  it("is limited by the address, whether or not it has an account", async () => {
    for (const email of [(await makeAccount()).email, freshAddress()]) {
      for (const _time of times(LIMITS.reset.points)) await requestReset({ email }, freshCall());
      expect(await requestReset({ email }, freshCall())).toMatchObject({ error: { code: "too-many" } });
    }
  });
});
