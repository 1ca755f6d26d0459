import type { DigestItem, DigestList } from "@/emails/parts/digest-mail-props";
import { nextChecks } from "@/lib/check/next-checks";
import { eventPayloads } from "@/lib/event/schema";
import { checkLink } from "@/lib/mail/app-link";
import { writeDay } from "@/lib/mail/write-day";
import { stageName } from "@/lib/procedure/stages";
import type { ProjectWeek } from "./project-week";
import { cut, markOf, quoted, readingOf } from "./week-attempts";

const MOST_OPEN = 6;
const MOST_NEXT = 5;

/** Checks that fail now, whenever they were recorded. */
export function openItems({ project, failures }: ProjectWeek, zone: string): DigestList {
  const items = failures.map(({ checkId, serial, title, since, payload, note }): DigestItem => {
    const recorded = eventPayloads["attempt.recorded"].safeParse(payload);
    const reading = recorded.success ? readingOf(recorded.data.reading) : "";
    const open = `Open since ${writeDay(since, zone)}.`;
    const detail = [reading, quoted(note), open].filter((part) => part !== "").join(" ");
    return { mark: "failed", serial, title, link: checkLink(project.slug, serial, checkId), detail };
  });
  return cut(items, MOST_OPEN);
}

/** What the bench should do next, in the order of the rack's own list. */
export function nextItems({ project, checks }: ProjectWeek): DigestList {
  const items = nextChecks(checks).map(({ checkId, serial, stage, title, state, reason }): DigestItem => {
    const link = checkLink(project.slug, serial, checkId);
    return { mark: markOf(state), serial, title, link, detail: `${stageName(stage)}. ${reason}` };
  });
  return { items: items.slice(0, MOST_NEXT), more: 0 };
}

/** "104 of 178 checks hold. 1 fails, 5 in doubt." */
export function standingSentence({ checks }: ProjectWeek): string {
  if (checks.length === 0) return "No traveler has been started yet.";
  const count = (...states: string[]) => checks.filter((check) => states.includes(check.state)).length;
  const failing = count("failed");
  const rest = [
    failing > 0 ? `${failing} ${failing === 1 ? "fails" : "fail"}` : "",
    count("doubtful") > 0 ? `${count("doubtful")} in doubt` : "",
    count("reopened") > 0 ? `${count("reopened")} reopened` : "",
  ].filter((part) => part !== "");
  const held = `${count("passed", "conceded")} of ${checks.length} checks hold.`;
  return rest.length === 0 ? held : `${held} ${rest.join(", ")}.`;
}
