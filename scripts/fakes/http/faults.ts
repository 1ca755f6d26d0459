import { setTimeout as delay } from "node:timers/promises";
import { z } from "zod";
import { Refusal } from "./refusal";
import type { Call } from "./serve-loopback";

/**
 * 500 and 429 are answered before anything is done; hang never answers; drop cuts the connection; slow answers after
 * `ms`; lost does the work and then cuts the connection, so that the caller cannot know.
 */
const faultSchema = z.object({
  mode: z.enum(["500", "429", "hang", "drop", "slow", "lost"]),
  count: z.coerce.number().int().min(1).max(1_000_000).default(1),
  ms: z.coerce.number().int().min(0).max(600_000).default(1000),
  on: z.string().default("any"),
});

type Fault = z.infer<typeof faultSchema>;

const codes = { "500": "application_error", "429": "rate_limit_exceeded" } as const;

/** Faults that tests order for the next requests of one kind. */
export function createFaults(kinds: string[]) {
  let waiting: Fault[] = [];

  const take = (kind: string): Fault | undefined => {
    const found = waiting.find((fault) => fault.on === "any" || fault.on === kind);
    if (!found) return undefined;
    found.count -= 1;
    waiting = waiting.filter((fault) => fault.count > 0);
    return found;
  };

  return {
    order(query: URLSearchParams): Fault {
      const parsed = faultSchema.safeParse(Object.fromEntries(query));
      const known = parsed.success && ["any", ...kinds].includes(parsed.data.on);
      if (!known)
        throw new Refusal(
          400,
          "validation_error",
          `Say mode=500|429|hang|drop|slow|lost, count=N, ms=N, on=any|${kinds.join("|")}.`,
        );
      waiting.push({ ...parsed.data });
      return parsed.data;
    },
    clear: () => (waiting = []),
    waiting: () => waiting.map((fault) => ({ ...fault })),

    /** Runs the work under the next ordered fault, if there is one. */
    async during(kind: string, { request, response }: Call, work: () => Promise<void>): Promise<void> {
      const fault = take(kind);
      if (!fault) return work();
      console.log(`ordered fault: ${fault.mode} on ${kind}`);
      switch (fault.mode) {
        case "500":
        case "429":
          throw new Refusal(
            Number(fault.mode),
            codes[fault.mode],
            "Ordered by a test.",
            fault.mode === "429" ? { "retry-after": "1" } : {},
          );
        case "hang":
          await new Promise<void>((resolve) => response.once("close", resolve));
          return;
        case "drop":
          request.destroy();
          return;
        case "slow":
          await delay(fault.ms);
          return work();
        case "lost": {
          // The answer is swallowed: whatever the work writes goes nowhere.
          response.writeHead = () => response;
          response.end = () => response.destroy();
          return work();
        }
      }
    },
  };
}

export type Faults = ReturnType<typeof createFaults>;
