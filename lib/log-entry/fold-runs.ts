type Row = { kind: string; at: Date; actorId: string | null; checkId: string | null; unitSerial: string | null };

/** Files attached within this time of one another belong to one sitting. */
const SITTING_MS = 15 * 60_000;

/** Each event by itself, except files that one person attached to one place in one sitting: those stand together. */
export function foldRuns<Event extends Row>(rows: readonly Event[]): [Event, ...Event[]][] {
  const runs: [Event, ...Event[]][] = [];
  for (const row of rows) {
    const run = runs.at(-1);
    const last = run?.at(-1);
    if (run && last && belongTogether(last, row)) run.push(row);
    else runs.push([row]);
  }
  return runs;
}

const belongTogether = (one: Row, other: Row) =>
  one.kind === "evidence.attached" &&
  other.kind === one.kind &&
  other.actorId === one.actorId &&
  other.checkId === one.checkId &&
  other.unitSerial === one.unitSerial &&
  Math.abs(one.at.getTime() - other.at.getTime()) <= SITTING_MS;
