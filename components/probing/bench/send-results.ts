import { z } from "zod";
import { PROBING_LIMITS } from "@/lib/probing/schema";
import type { SaidResult } from "@/lib/probing/round-view";
import type { Held } from "./held-results";

const answerShape = z.object({
  closed: z.boolean(),
  results: z.array(
    z.object({
      id: z.string(),
      probe: z.number(),
      beeps: z.boolean().nullable(),
      ohm: z.number().nullable(),
      typed: z.string(),
      by: z.string().nullable(),
      at: z.string(),
    }),
  ),
});

export type Arrived = { kind: "arrived"; results: SaidResult[]; closed: boolean };
/** away: no network or the server is down, try again. refused: trying again changes nothing. */
export type Sent = Arrived | { kind: "away" } | { kind: "refused"; sentence: string };

const addressOf = (project: string, plan: string) =>
  `/api/projects/${encodeURIComponent(project)}/probings/${encodeURIComponent(plan)}/results`;

/** The first of what is held, as much as goes at once. */
export const batchOf = ({ results, voids }: Held): Held => ({
  results: results.slice(0, PROBING_LIMITS.batch),
  voids: voids.slice(0, PROBING_LIMITS.batch),
});

export async function sendResults(project: string, plan: string, held: Held): Promise<Sent> {
  return ask(addressOf(project, plan), {
    method: "POST",
    headers: { "content-type": "application/json" },
    body: JSON.stringify(held),
  });
}

export const fetchResults = (project: string, plan: string): Promise<Sent> => ask(addressOf(project, plan), {});

async function ask(address: string, init: RequestInit): Promise<Sent> {
  try {
    const response = await fetch(address, init);
    if (response.status >= 500 || response.status === 429) return { kind: "away" };
    const body: unknown = await response.json();
    if (!response.ok) return { kind: "refused", sentence: detailOf(body) };
    const read = answerShape.safeParse(body);
    return read.success ? { kind: "arrived", ...read.data } : { kind: "away" };
  } catch {
    return { kind: "away" };
  }
}

const detailOf = (body: unknown): string => {
  const said = z.object({ detail: z.string() }).safeParse(body);
  return said.success ? said.data.detail : "The server did not take it.";
};
