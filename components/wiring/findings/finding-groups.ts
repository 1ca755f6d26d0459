import type { Weight } from "@/lib/calc/interconnect";
import type { FindingView } from "@/lib/finding/load-findings";

export const STATES = ["open", "accepted", "all"] as const;
export type StateFilter = (typeof STATES)[number];
export type FindingFilter = { board: string | null; state: StateFilter };

const WEIGHTS: readonly Weight[] = ["must", "should", "look"];
const counted = (count: number, one: string, many: string) => `${count} ${count === 1 ? one : many}`;

export type FindingGroup = { weight: Weight; findings: FindingView[] };

/** What the filter lets through: open ones by weight, accepted ones by themselves. */
export function groupFindings(findings: readonly FindingView[], { board, state }: FindingFilter) {
  const shown = findings.filter((finding) => board === null || finding.boards.includes(board));
  const open = state === "accepted" ? [] : shown.filter(({ accepted }) => accepted === null);
  const accepted = state === "open" ? [] : shown.filter((finding) => finding.accepted !== null);
  const groups = WEIGHTS.map((weight): FindingGroup => ({
    weight,
    findings: open.filter((one) => one.weight === weight),
  }));
  return { groups: groups.filter((group) => group.findings.length > 0), accepted };
}

export const boardsOf = (findings: readonly FindingView[]): string[] =>
  [...new Set(findings.flatMap(({ boards }) => boards))].sort((a, b) => a.localeCompare(b, "en", { numeric: true }));

/** "2 must be mended, 1 should be, 3 are worth a look. 1 is accepted." */
export function findingsSentence(findings: readonly FindingView[]): string {
  const count = (weight: Weight) => findings.filter((one) => one.accepted === null && one.weight === weight).length;
  const accepted = findings.filter((one) => one.accepted !== null).length;
  const [must, should, look] = [count("must"), count("should"), count("look")];
  const open = [
    must > 0 ? `${must} must be mended` : "",
    should > 0 ? `${should} should be${must > 0 ? "" : " mended"}` : "",
    look > 0 ? counted(look, "is worth a look", "are worth a look") : "",
  ].filter((part) => part !== "");
  const said = open.length === 0 ? "Nothing is open." : `${open.join(", ")}.`;
  return accepted === 0 ? said : `${said} ${counted(accepted, "is accepted", "are accepted")}.`;
}
