import type { ContinuityFinding } from "@/lib/calc/continuity";

const MOST = 40;
const MOST_TITLE = 160;

/** The form of a new fault, filled in from what the round found. */
export function faultAddress(project: string, unit: string, plan: string, finding: ContinuityFinding): string {
  const search = new URLSearchParams({ unit, title: titleOf(finding).slice(0, MOST_TITLE), plan });
  search.set("symptom", finding.sentence);
  search.set("signals", finding.nets.slice(0, MOST).join(","));
  search.set("pins", finding.pins.slice(0, MOST).join(","));
  return `/projects/${project}/faults/new?${search.toString()}`;
}

function titleOf({ kind, nets }: ContinuityFinding): string {
  const [one = "", ...others] = nets;
  const both = [one, ...others].join(" and ");
  if (kind === "open") return `${one} is open`;
  if (kind === "short") return `${both} are shorted`;
  if (kind === "crossed") return `${both} are crossed`;
  if (kind === "high resistance") return `${one} has a high resistance`;
  return `${both} leak`;
}
