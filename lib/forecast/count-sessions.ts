import type { WorkHistory } from "@/db/queries/work-history";
import type { BenchSession } from "@/lib/calc/forecast";

/**
 * Sessions as the forecast counts them: those that somebody started by hand, and the visits that lie in none of them.
 * What a session brought is in the turns of the history, so that it stays empty here.
 */
export function countSessions({ visits, typed }: Pick<WorkHistory, "visits" | "typed">): BenchSession[] {
  const session = (builder: string, startMs: number, endMs: number, isTyped: boolean): BenchSession => {
    return { builder, startMs, endMs, typed: isTyped, attempts: [], stages: [] };
  };
  const isWithin = ([builder, startMs, endMs]: WorkHistory["visits"][number]) =>
    typed.some(([other, from, to]) => other === builder && startMs <= (to ?? Infinity) && endMs >= from);
  return [
    ...typed.map(([builder, startMs, endMs]) => session(builder, startMs, endMs ?? startMs, true)),
    ...visits.filter((visit) => !isWithin(visit)).map((visit) => session(...visit, false)),
  ].sort((a, b) => a.startMs - b.startMs);
}
