import type { CheckState } from "@/db/schema/travelers";

const holds = (state: CheckState) => state === "passed" || state === "conceded";

const TROUBLE: readonly [CheckState, string, string][] = [
  ["failed", "fails", "fail"],
  ["reopened", "is reopened", "are reopened"],
  ["doubtful", "is in doubt", "are in doubt"],
  ["conceded", "is conceded", "are conceded"],
];

/** "4 of 4 hold", "7 of 9 hold, 2 in doubt": how a group of checks stands, in a few words. */
export function countsShort(states: readonly CheckState[]): string {
  const words: Partial<Record<CheckState, string>> = { failed: "fail", reopened: "reopened", doubtful: "in doubt" };
  const parts = TROUBLE.flatMap(([state]) => {
    const count = states.filter((one) => one === state).length;
    const word = words[state];
    return count > 0 && word ? [`${count} ${state === "failed" && count === 1 ? "fails" : word}`] : [];
  });
  return [`${states.filter(holds).length} of ${states.length} hold`, ...parts].join(", ");
}

/** "17 of 24 checks hold. 2 are in doubt, 1 fails." */
export function countsSentence(states: readonly CheckState[]): string {
  const held = states.filter(holds).length;
  const first =
    held === states.length ? `All ${states.length} checks hold.` : `${held} of ${states.length} checks hold.`;
  const parts = TROUBLE.flatMap(([state, one, many]) => {
    const count = states.filter((other) => other === state).length;
    return count > 0 ? [`${count} ${count === 1 ? one : many}`] : [];
  });
  return parts.length > 0 ? `${first} ${parts.join(", ")}.` : first;
}
