import type { CheckState } from "@/db/schema/travelers";
import { eventPayloads, type EventKind } from "./schema";

/** What the log can be filtered by. */
export const EVENT_GROUPS = [
  "entries",
  "attempts",
  "failures",
  "reopenings",
  "faults",
  "evidence",
  "structure",
  "plan",
  "people",
] as const;
export type EventGroup = (typeof EVENT_GROUPS)[number];

export const GROUP_LABELS: Record<EventGroup, string> = {
  entries: "Entries",
  attempts: "Attempts",
  failures: "Failures",
  reopenings: "Reopened and conceded",
  faults: "Faults and reworks",
  evidence: "Evidence",
  structure: "Boards and units",
  plan: "Wiring and parts",
  people: "People",
};

/** Failures are those attempts that do not conform; they are told apart by their payload. */
type Listed = Exclude<EventGroup, "failures">;

/** The family is the part of the kind before the dot; check, concession and hold together are what maintainers decide. */
const FAMILIES: Record<string, Listed> = {
  log: "entries",
  attempt: "attempts",
  check: "reopenings",
  concession: "reopenings",
  hold: "reopenings",
  fault: "faults",
  rework: "faults",
  punch: "faults",
  probing: "attempts",
  evidence: "evidence",
  project: "structure",
  board: "structure",
  revision: "structure",
  unit: "structure",
  slot: "structure",
  procedure: "structure",
  traveler: "structure",
  prerequisite: "structure",
  order: "structure",
  finding: "plan",
  signal: "plan",
  family: "plan",
  connector: "plan",
  "pin-map": "plan",
  netlist: "plan",
  block: "plan",
  part: "plan",
  plan: "plan",
  rail: "plan",
  power: "plan",
  delay: "plan",
  member: "people",
  invitation: "people",
};

export const groupOf = (kind: string): Listed | undefined => FAMILIES[kind.split(".")[0] ?? ""];

// Object.keys() gives the very keys of the record; the compiler widens them to string.
const KINDS = Object.keys(eventPayloads) as EventKind[];

export const kindsOf = (group: EventGroup): EventKind[] =>
  group === "failures" ? ["attempt.recorded"] : KINDS.filter((kind) => groupOf(kind) === group);

/** The state whose glyph stands before the sentence; undefined where no check is spoken of. */
export function glyphOf(kind: string, payload: unknown): CheckState | undefined {
  if (kind === "attempt.recorded") {
    const parsed = eventPayloads["attempt.recorded"].safeParse(payload);
    return parsed.success && parsed.data.verdict === "does-not-conform" ? "failed" : "passed";
  }
  return GLYPHS[kind];
}

const GLYPHS: Record<string, CheckState> = {
  "check.reopened": "reopened",
  "check.doubted": "doubtful",
  "concession.granted": "conceded",
  "concession.withdrawn": "failed",
};
