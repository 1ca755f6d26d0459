import type { BenchSession, CheckEvent } from "./history";

/** Seven days of history. */
export type Week = {
  startMs: number;
  /** Checks that began to hold. */
  gained: number;
  /** Checks that ceased to hold: failed on repeat, reopened, doubtful. */
  lost: number;
  /** Attempts at checks that had been attempted before. */
  repeats: number;
  sessions: number;
};

export type ForecastInput = {
  events: readonly CheckEvent[];
  sessions: readonly BenchSession[];
  /** Checks that do not hold now: not the number that ever were. */
  remaining: number;
  nowMs: number;
  /** The same seed gives the same dates. */
  seed: number;
};

/** When, and after how many sessions from now; null: sessions are not known. */
type By = { atMs: number; sessions: number | null };

export type Forecast =
  | {
      kind: "forecast";
      weeks: Week[];
      /** Checks a week, gained less lost, over the weeks looked at. */
      perWeek: number;
      /** In half of all cases done by then. */
      half: By;
      /** In 85 % of all cases; null: later than the years that are looked at. */
      most: By | null;
      sentence: string;
    }
  | { kind: "done"; sentence: string }
  | { kind: "not enough history"; weeks: Week[]; sentence: string }
  | { kind: "standing still"; weeks: Week[]; sentence: string };
