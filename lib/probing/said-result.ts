import type { findResults } from "@/db/queries/probing";
import type { SaidResult } from "./round-view";

type Row = Awaited<ReturnType<typeof findResults>>[number];

export const saidResult = ({ id, probe, beeps, ohm, typed, by, performedAt }: Row): SaidResult => {
  return { id, probe, beeps, ohm, typed, by, at: performedAt.toISOString() };
};

/** The last word on each probe, where two people probed the same one. */
export function lastWords<Said extends { probe: number }>(results: readonly Said[]): Map<number, Said> {
  return new Map(results.map((said) => [said.probe, said]));
}
