import type { Finished } from "./stage";

const cell = (value: string | number) => String(value).padStart(9);

/** The table, and as its last line what it comes to. Returns the exit code: a run of nothing is no success. */
export function printSummary(finished: Finished[]): number {
  const total = (pick: (one: Finished) => number) => finished.reduce((sum, one) => sum + pick(one), 0);
  const [passed, failed] = [total((one) => one.passed), total((one) => one.failed)];
  console.log(`\n${"stage".padEnd(13)}${["passed", "failed", "skipped", "seconds"].map(cell).join("")}`);
  for (const one of finished) {
    const numbers = [one.passed, one.failed, one.skipped, one.seconds.toFixed(1)].map(cell).join("");
    console.log(`${one.name.padEnd(13)}${numbers}${one.note === undefined ? "" : `   ${one.note}`}`);
  }
  console.log(`${passed} passed, ${failed} failed`);
  return failed > 0 || passed + failed === 0 ? 1 : 0;
}
