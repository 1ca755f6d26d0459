import type { DigestEvent } from "@/db/queries/digest-week";
import { countPasses, passCounts, type attemptsOf } from "./week-attempts";

const counted = (count: number, one: string, many: string) => `${count} ${count === 1 ? one : many}`;
const present = (parts: (string | false)[]) => parts.filter((part) => part !== false);

const DECISIONS: Record<string, string> = {
  "check.reopened": "reopened",
  "concession.granted": "conceded",
  "hold.lifted": "hold lifted",
  "check.doubted": "in doubt",
};

export type Summary = {
  /** For the subject: "8 checks passed, 2 did not conform" */
  headline: string;
  /** The week in a few sentences. */
  summary: string;
  isQuiet: boolean;
};

export function summarise(
  week: { attempts: ReturnType<typeof attemptsOf>; events: readonly DigestEvent[] },
  entries: number,
  others: number,
): Summary {
  const failed = week.attempts.filter((attempt) => attempt.verdict === "does-not-conform").length;
  const passes = countPasses(week.attempts);
  const decided = Object.entries(DECISIONS).flatMap(([kind, word]) => {
    const times = week.events.filter((event) => event.kind === kind).length;
    return times > 0 ? [`${times} ${word}`] : [];
  });
  const passed = `${counted(passes.checks, "check", "checks")} passed`;
  const written = counted(entries, "new log entry", "new log entries");
  const sentences = present([
    passes.checks > 0 && `${passed}: ${passCounts(passes)}.`,
    failed > 0 && `${counted(failed, "attempt", "attempts")} did not conform.`,
    decided.length > 0 && `${decided.join(", ")}.`,
    entries > 0 && `${written}.`,
  ]);
  const headline = present([
    passes.checks > 0 && passed,
    failed > 0 && `${failed} did not conform`,
    passes.checks + failed === 0 && decided.length > 0 && decided.join(", "),
    entries > 0 && written,
  ]);
  if (sentences.length > 0) return { headline: headline.join(", "), summary: sentences.join(" "), isQuiet: false };
  if (others > 0)
    return { headline: "news", summary: "Nothing was measured this week, but the project moved.", isQuiet: false };
  return { headline: "a quiet week", summary: "Nothing happened on the bench this week.", isQuiet: true };
}
