import { createHash } from "node:crypto";
import { RateLimiterDrizzle, RateLimiterRes } from "rate-limiter-flexible";
import { database } from "@/db/client";
import { rateLimits } from "@/db/schema/people";
import { ok, refuse, type Answer } from "@/lib/actions/answer";

const MINUTE = 60;
const HOUR = 60 * MINUTE;

/** How often what may be done, counted by which key. The counters are rows, so that several processes count together. */
export const LIMITS = {
  /** By address and peer: guessing the password of one account. */
  "sign-in": { points: 8, seconds: 15 * MINUTE, what: "Too many tries with this address." },
  /** By peer: trying one password on many accounts. */
  "sign-in-ip": { points: 60, seconds: 15 * MINUTE, what: "Too many tries from your connection." },
  /** By peer. */
  "sign-up": { points: 20, seconds: HOUR, what: "Too many accounts were asked for from your connection." },
  /** By address, whether or not it has an account. */
  reset: { points: 5, seconds: HOUR, what: "Too many links were asked for with this address." },
  link: { points: 5, seconds: 15 * MINUTE, what: "Too many links were asked for with this address." },
  confirm: { points: 5, seconds: HOUR, what: "Too many links were asked for with this address." },
  /** By peer: mailing many addresses. */
  "mail-ip": { points: 40, seconds: HOUR, what: "Too many mails were asked for from your connection." },
  /** By person who invites. */
  invitations: { points: 40, seconds: HOUR, what: "You have sent many invitations in the last hour." },
  /** By person who sends the weekly e-mail to themselves. */
  previews: { points: 20, seconds: HOUR, what: "You have sent yourself many previews in the last hour." },
  /** By peer: calculations without state. */
  calculations: { points: 600, seconds: 5 * MINUTE, what: "Many calculations were asked for from your connection." },
  /** By person who uploads. */
  uploads: { points: 300, seconds: 10 * MINUTE, what: "You have uploaded many files in the last ten minutes." },
} as const satisfies Record<string, { points: number; seconds: number; what: string }>;

export type LimitName = keyof typeof LIMITS;

function limiter(name: LimitName): RateLimiterDrizzle {
  const { points, seconds } = LIMITS[name];
  return new RateLimiterDrizzle({
    storeClient: database(),
    schema: rateLimits,
    keyPrefix: name,
    points,
    duration: seconds,
    // The worker's sweep removes old rows; a timer in every process would do it many times over.
    clearExpiredByTimeout: false,
  });
}

/** Addresses and peers are kept as hashes: the table says nothing about who tried. */
const keyOf = (parts: string) => createHash("sha256").update(parts).digest("base64url");

/** Counts one go against the limit; refuses with the time to wait when it is used up. */
export async function limit(name: LimitName, key: string): Promise<Answer<void>> {
  try {
    await limiter(name).consume(keyOf(key));
    return ok(undefined);
  } catch (reason) {
    if (!(reason instanceof RateLimiterRes)) throw reason;
    return refuse("too-many", `${LIMITS[name].what} Try again in ${waitOf(reason.msBeforeNext)}.`, {
      details: { retryAfterSeconds: Math.max(1, Math.ceil(reason.msBeforeNext / 1000)) },
    });
  }
}

/** Forgets what was counted, e.g. after a sign-in that succeeded: only failures are to add up. */
export async function forgive(name: LimitName, key: string): Promise<void> {
  await limiter(name).delete(keyOf(key));
}

/** Gives one go back and leaves the rest counted. */
export async function giveBack(name: LimitName, key: string): Promise<void> {
  await limiter(name).reward(keyOf(key));
}

function waitOf(milliseconds: number): string {
  const minutes = Math.max(1, Math.ceil(milliseconds / 60_000));
  return minutes === 1 ? "a minute" : `${minutes} minutes`;
}
