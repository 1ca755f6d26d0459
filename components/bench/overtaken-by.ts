import type { CheckView } from "@/lib/traveler/traveler-view";

/** An attempt of this person that the server has taken. */
export type OwnAttempt = { checkId: string; arrival: number; at: number };

/** The server's number of the attempt that it just took. */
export function arrivalIn(answer: unknown): number | undefined {
  if (typeof answer !== "object" || answer === null || !("arrival" in answer)) return undefined;
  return typeof answer.arrival === "number" ? answer.arrival : undefined;
}

/** What the server tells when two people recorded the same check: both are kept, the later one counts. */
export function overtakenBy(answer: unknown): string | undefined {
  if (typeof answer !== "object" || answer === null || !("overtook" in answer)) return undefined;
  const { overtook } = answer;
  if (typeof overtook !== "object" || overtook === null || !("by" in overtook) || !("summary" in overtook))
    return undefined;
  return `${String(overtook.by)} recorded this check just before you: ${String(overtook.summary)}. Both are kept; yours came later and counts.`;
}

type Seen = Pick<CheckView, "id" | "title"> & {
  attempts: readonly Pick<CheckView["attempts"][number], "arrival" | "by" | "summary" | "voided">[];
};

/** The same for the one who came first: somebody's attempt stands above one's own. */
export function overtakenSince(
  checks: readonly Seen[],
  own: readonly OwnAttempt[],
  viewerId: string,
): string | undefined {
  for (const check of checks) {
    const mine = Math.max(-1, ...own.filter(({ checkId }) => checkId === check.id).map(({ arrival }) => arrival));
    const [newest] = check.attempts.filter(({ voided }) => !voided);
    if (mine < 0 || !newest || newest.arrival <= mine || newest.by.id === viewerId) continue;
    return `${check.title}: ${newest.by.name} recorded this check just after you: ${newest.summary}. Both are kept; theirs came later and counts.`;
  }
  return undefined;
}
