import type { FindingsLine } from "@/emails/parts/digest-mail-props";
import { appLink } from "@/lib/mail/app-link";
import type { ProjectWeek, Span } from "./project-week";

const MOST_NEW = 4;
const counted = (count: number, one: string, many = `${one}s`) => `${count} ${count === 1 ? one : many}`;

/** What is open in the wiring, how much of it is new, and the new ones by name; null when nothing is open. */
export function wiringLines({ project, findings }: ProjectWeek, { since, until }: Span): FindingsLine | null {
  if (findings.length === 0) return null;
  const count = (weight: string) => findings.filter((one) => one.weight === weight).length;
  const [must, should, look] = [count("must"), count("should"), count("look")];
  const parts = [
    must > 0 ? `${must} must be mended` : "",
    should > 0 ? `${should} should be` : "",
    look > 0 ? counted(look, "is worth a look", "are worth a look") : "",
  ].filter((part) => part !== "");
  const fresh = findings.filter(({ foundAt }) => foundAt >= since && foundAt < until);
  const news = fresh.length === 0 ? "None of them is new." : `${counted(fresh.length, "is", "are")} new.`;
  return {
    sentence: `${counted(findings.length, "finding is", "findings are")} open in the wiring: ${parts.join(", ")}. ${news}`,
    link: appLink(`/projects/${encodeURIComponent(project.slug)}/wiring/findings`),
    fresh: fresh.slice(0, MOST_NEW).map(({ title }) => title),
    more: Math.max(0, fresh.length - MOST_NEW),
  };
}
