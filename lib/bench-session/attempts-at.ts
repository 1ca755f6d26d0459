import type { findAttemptTimes } from "@/db/queries/bench-sessions";
import type { AttemptAt } from "@/lib/calc/forecast";

type Row = Awaited<ReturnType<typeof findAttemptTimes>>[number];

/** Attempts as the calculations take them. Those of people who deleted their account belong to one builder without a name. */
export const attemptsAt = (rows: readonly Row[]): AttemptAt[] =>
  rows.map(({ at, checkId, stage, userId }) => ({ atMs: at.getTime(), checkId, stage, builder: userId ?? "" }));
