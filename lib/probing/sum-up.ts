import type { ContinuityReport, FindingKind } from "@/lib/calc/continuity";

const WORDS: Record<FindingKind, [string, string]> = {
  open: ["open", "opens"],
  short: ["short", "shorts"],
  crossed: ["crossed pair", "crossed pairs"],
  "high resistance": ["high resistance", "high resistances"],
  leak: ["leak", "leaks"],
};

const ORDER: readonly FindingKind[] = ["crossed", "short", "open", "high resistance", "leak"];

const probesLeft = ({ left }: Pick<ContinuityReport, "left">) =>
  Object.values(left).reduce((sum, count) => sum + count, 0);

/** "1 crossed pair, 2 opens, 14 probes left", or that all is as it should be. */
export function sumUp(report: ContinuityReport): string {
  const found = ORDER.flatMap((kind) => {
    const count = report.findings.filter((finding) => finding.kind === kind).length;
    return count === 0 ? [] : [`${count} ${WORDS[kind][count === 1 ? 0 : 1]}`];
  });
  const left = probesLeft(report);
  const said = found.length === 0 ? [left === 0 ? "everything as the netlist says" : "nothing found so far"] : found;
  return [...said, ...(left === 0 ? [] : [`${left} ${left === 1 ? "probe" : "probes"} left`])].join(", ");
}

/** A round proves its unit only when every probe was made and found nothing. */
export const provesUnit = (report: ContinuityReport): boolean =>
  report.findings.length === 0 && probesLeft(report) === 0;
