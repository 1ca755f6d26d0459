import { z } from "zod";

/** What waits on this device for the network, in the order in which it was said. */
const heldShape = z.object({
  results: z.array(
    z.object({
      id: z.string(),
      probe: z.number(),
      beeps: z.boolean().nullable(),
      typed: z.string(),
      performedAt: z.string(),
    }),
  ),
  voids: z.array(z.string()),
});
export type Held = z.infer<typeof heldShape>;
export type HeldResult = Held["results"][number];

export const NOTHING_HELD: Held = { results: [], voids: [] };

const keyOf = (plan: string, userId: string) => `boardwake-probing-${plan}-${userId}`;

export function readHeld(plan: string, userId: string): Held {
  try {
    const read = heldShape.safeParse(JSON.parse(localStorage.getItem(keyOf(plan, userId)) ?? "null"));
    return read.success ? read.data : NOTHING_HELD;
  } catch {
    return NOTHING_HELD;
  }
}

export function writeHeld(plan: string, userId: string, held: Held): void {
  try {
    if (held.results.length + held.voids.length === 0) localStorage.removeItem(keyOf(plan, userId));
    else localStorage.setItem(keyOf(plan, userId), JSON.stringify(held));
  } catch {
    // Without room it is held as long as the page.
  }
}

/** One answer more; it takes back the one before it. A result that never left this device is simply forgotten. */
export function withAnswer(held: Held, result: HeldResult, replaces: string | undefined): Held {
  const isHere = held.results.some(({ id }) => id === replaces);
  return {
    results: [...held.results.filter(({ id }) => id !== replaces), result],
    voids: replaces === undefined || isHere ? held.voids : [...held.voids, replaces],
  };
}

/** What is left after some of it arrived; more may have been said in the meantime. */
export function without(held: Held, sent: Held): Held {
  const [results, voids] = [new Set(sent.results.map(({ id }) => id)), new Set(sent.voids)];
  return {
    results: held.results.filter(({ id }) => !results.has(id)),
    voids: held.voids.filter((id) => !voids.has(id)),
  };
}
