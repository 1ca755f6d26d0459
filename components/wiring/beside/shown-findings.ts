import type { Edit, Finding, MachineCheck, Weight } from "@/lib/calc/interconnect";
import type { FindingView } from "@/lib/finding/load-findings";

/** A finding of the newest check, with what a maintainer said about it as long as it rests upon the same facts. */
export type ShownFinding = Omit<Finding, "edits"> & {
  edits: readonly Edit[];
  accepted: FindingView["accepted"];
  /** As it is stored, when it is: only that can be accepted. */
  stored: FindingView | undefined;
};

/** Before the first check has answered, what the last stored one found. */
export function shownFindings(check: MachineCheck | undefined, stored: readonly FindingView[]): ShownFinding[] {
  if (!check) return stored.map((finding) => ({ ...finding, edits: [], stored: finding }));
  const byKey = new Map(stored.map((finding) => [finding.key, finding]));
  return check.findings.map((finding) => {
    const known = byKey.get(finding.key);
    const same = known?.facts === finding.facts ? known : undefined;
    return { ...finding, accepted: same?.accepted ?? null, stored: same };
  });
}

export const openOf = (findings: readonly ShownFinding[]) => findings.filter(({ accepted }) => accepted === null);

const WEIGHTS: readonly Weight[] = ["must", "should", "look"];
const keyOf = (connectorId: string, pin: string) => `${connectorId} ${pin}`;

/** The heaviest open finding of each pin of the design. */
export function weightsByPin(
  findings: readonly ShownFinding[],
): (connectorId: string, pin: string) => Weight | undefined {
  const weights = new Map<string, Weight>();
  for (const { weight, pins } of openOf(findings)) {
    for (const { connectorId, pin } of pins) {
      const before = weights.get(keyOf(connectorId, pin));
      if (before === undefined || WEIGHTS.indexOf(weight) < WEIGHTS.indexOf(before)) {
        weights.set(keyOf(connectorId, pin), weight);
      }
    }
  }
  return (connectorId, pin) => weights.get(keyOf(connectorId, pin));
}

/** "2 must be mended, 1 should be, 1 accepted." */
export function countsSentence(findings: readonly ShownFinding[]): string {
  const count = (weight: Weight) => openOf(findings).filter((one) => one.weight === weight).length;
  const accepted = findings.length - openOf(findings).length;
  const parts = [
    count("must") > 0 ? `${count("must")} must be mended` : "",
    count("should") > 0 ? `${count("should")} should be${count("must") > 0 ? "" : " mended"}` : "",
    count("look") > 0 ? `${count("look")} worth a look` : "",
    accepted > 0 ? `${accepted} accepted` : "",
  ].filter((part) => part !== "");
  return parts.length === 0 ? "nothing is found." : `${parts.join(", ")}.`;
}

/** Those that touch the connector first, each part in the order of the check. */
export function splitByConnector(findings: readonly ShownFinding[], connectorId: string | undefined) {
  if (connectorId === undefined) return { here: [...findings], elsewhere: [] };
  const isHere = ({ pins }: ShownFinding) => pins.some((pin) => pin.connectorId === connectorId);
  return { here: findings.filter(isHere), elsewhere: findings.filter((finding) => !isHere(finding)) };
}
