import { byName } from "../check-graph";

const NUMBERED = /^(.*?)(\d+)$/;
const MOST = 3;

/** "PH0 … PH7", "CLK, PHI1 and 2 more": runs of three and more lines as one, beyond three the rest is counted by lines. */
export function listNets(names: readonly string[]): string {
  const runs: string[][] = [];
  for (const name of [...new Set(names)].sort(byName)) {
    const last = runs.at(-1);
    if (last && follows(last.at(-1) ?? "", name)) last.push(name);
    else runs.push([name]);
  }
  const parts = runs.flatMap((run) =>
    run.length > 2
      ? [{ text: `${run[0]} … ${run.at(-1)}`, lines: run.length }]
      : run.map((text) => ({ text, lines: 1 })),
  );
  const shown = parts.length > MOST + 1 ? parts.slice(0, MOST) : parts;
  const hidden = parts.slice(shown.length).reduce((sum, { lines }) => sum + lines, 0);
  return joined([...shown.map(({ text }) => text), ...(hidden > 0 ? [`${hidden} more`] : [])]);
}

function follows(one: string, other: string): boolean {
  const [, stem, number] = NUMBERED.exec(one) ?? [];
  const [, otherStem, otherNumber] = NUMBERED.exec(other) ?? [];
  return stem !== undefined && stem === otherStem && Number(otherNumber) === Number(number) + 1;
}

/** "A", "A and B", "A, B and C". */
export function joined(words: readonly string[]): string {
  const last = words.at(-1) ?? "";
  return words.length < 2 ? last : `${words.slice(0, -1).join(", ")} and ${last}`;
}
