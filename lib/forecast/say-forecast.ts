import { tz } from "@date-fns/tz";
import { format } from "date-fns";
import type { Forecast } from "@/lib/calc/forecast";

export type Outlook = {
  kind: Forecast["kind"];
  /** "16 Jan to 2 Feb 2027"; empty when there is no date. */
  span: string;
  /** "About 9 evenings left: 50 % by Sat 16 Jan 2027, 85 % by Tue 2 Feb 2027." */
  line: string;
  /** What it rests upon, in a sentence; empty when the line says it all. */
  basis: string;
};

const LEAST_WEEKS = 3;

/** The forecast as somebody in this zone reads it. */
export function sayForecast(found: Forecast, zone: string): Outlook {
  const { kind } = found;
  if (found.kind === "done") return { kind, span: "", line: "Every check holds.", basis: "" };
  if (found.kind === "not enough history") {
    const line = `Not enough history: ${found.weeks.length} of ${LEAST_WEEKS} weeks.`;
    return { kind, span: "", line, basis: "A date appears three weeks after the first attempt." };
  }
  if (found.kind === "standing still") return { kind, span: "", line: found.sentence, basis: "" };
  const { half, most, weeks, sentence } = found;
  const write = (atMs: number, form: string) => format(new Date(atMs), form, { in: tz(zone) });
  const evenings = half.sessions === null ? "" : `About ${counted(half.sessions, "evening")} left: `;
  const late = most === null ? "no date for 85 %" : `85 % by ${write(most.atMs, DAY)}`;
  const line = `${evenings}50 % by ${write(half.atMs, DAY)}, ${late}.`;
  return { kind, span: span(half.atMs, most?.atMs ?? null, write), line, basis: basisOf(sentence, weeks.length) };
}

const DAY = "EEE d MMM yyyy";

const counted = (count: number, word: string) => `${count} ${word}${count === 1 ? "" : "s"}`;

const basisOf = (sentence: string, weeks: number) =>
  `${sentence} Drawn from what ${counted(weeks, "week")} brought and took away.`;

/** "16 Jan to 2 Feb 2027", with each year where they differ. */
function span(fromMs: number, toMs: number | null, write: (atMs: number, form: string) => string): string {
  const from = write(fromMs, "d MMM yyyy");
  if (toMs === null) return `from ${from}`;
  const to = write(toMs, "d MMM yyyy");
  if (from === to) return from;
  const isOneYear = write(fromMs, "yyyy") === write(toMs, "yyyy");
  const isOneMonth = isOneYear && write(fromMs, "MMM") === write(toMs, "MMM");
  return `${isOneMonth ? write(fromMs, "d") : isOneYear ? write(fromMs, "d MMM") : from} to ${to}`;
}
