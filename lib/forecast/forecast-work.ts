import type { WorkHistory } from "@/db/queries/work-history";
import { forecast, type Forecast } from "@/lib/calc/forecast";
import { countSessions } from "./count-sessions";

const DAY_MS = 86_400_000;

type Work = { projectId: string; history: WorkHistory; remaining: number; now: Date };

/**
 * When the rest of a project will hold. It looks out from the beginning of the day (UTC) with a seed that belongs to the
 * project, so that whoever looks twice on one day at the same work reads the same dates.
 */
export function forecastWork({ projectId, history, remaining, now }: Work): Forecast {
  const nowMs = Math.floor(now.getTime() / DAY_MS) * DAY_MS;
  const events = history.turns.map(([atMs, check, what]) => ({ atMs, checkId: String(check), what }));
  const seed = Number.parseInt(projectId.replaceAll("-", "").slice(0, 8), 16);
  return forecast({ events, sessions: countSessions(history), remaining, nowMs, seed });
}
