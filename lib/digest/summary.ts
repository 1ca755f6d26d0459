import type { attemptsOf } from "./week-lists";
import { passCounts } from "./week-lists";

const counted = (count: number, one: string, many: string) => `${count} ${count === 1 ? one : many}`;

/** The week in a sentence or two, which also stands after the subject in a list of mails. */
export function summarise(
  attempts: ReturnType<typeof attemptsOf>,
  decisions: number,
  entries: number,
  others: number,
): { summary: string; isQuiet: boolean } {
  const failed = attempts.filter((attempt) => attempt.verdict === "does-not-conform").length;
  const passed = attempts.length - failed;
  const first = attempts.filter((attempt) => attempt.firstPass).length;
  const sentences: string[] = [];
  if (passed > 0) sentences.push(`${counted(passed, "check", "checks")} passed: ${passCounts(first, passed - first)}.`);
  if (failed > 0) sentences.push(`${counted(failed, "attempt does", "attempts do")} not conform.`);
  if (decisions > 0) sentences.push(`${counted(decisions, "decision or doubt", "decisions and doubts")} on checks.`);
  if (entries > 0) sentences.push(`${counted(entries, "new log entry", "new log entries")}.`);
  if (sentences.length === 0 && others > 0) sentences.push("Nothing was measured, but the project moved.");
  const isQuiet = sentences.length === 0;
  return { summary: isQuiet ? "Nothing happened on the bench this week." : sentences.join(" "), isQuiet };
}
