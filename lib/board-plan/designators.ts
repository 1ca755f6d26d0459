const MOST = 500;

/** "R1–R3, C7" as R1, R2, R3, C7; undefined when it is written in a way that is not understood. */
export function readDesignators(typed: string): string[] | undefined {
  const found: string[] = [];
  for (const word of typed.split(/[\s,;]+(?![–-])/).filter(Boolean)) {
    const range = /^([A-Za-z]+)(\d+)(?:[–-]\1?(\d+))?$/.exec(word);
    if (!range) return undefined;
    const [, letters = "", first = "", last = first] = range;
    const [from, to] = [Number(first), Number(last)];
    if (to < from || to - from > MOST) return undefined;
    for (let number = from; number <= to; number += 1) found.push(`${letters.toUpperCase()}${number}`);
  }
  return found;
}

type Line = { partNumber: string; count: number; designators: string };

/** What does not fit together in the designators of a board: a package and another part with one name, counts that differ. */
export function designatorClashes(
  lines: readonly Line[],
  packages: readonly { designator: string; part: string }[],
): string[] {
  const holders = new Map(packages.map(({ designator, part }) => [designator, `the ${part} of the blocks`]));
  return lines.flatMap(({ partNumber, count, designators }) => {
    const names = readDesignators(designators);
    if (!names || names.length === 0) return [];
    const clashes = names.flatMap((name) => {
      const holder = holders.get(name);
      holders.set(name, partNumber);
      return holder === undefined ? [] : [`${name} names ${holder} and ${partNumber}.`];
    });
    const first = clashes[0];
    const more = clashes.length > 1 ? [`${first} So do ${clashes.length - 1} more of its designators.`] : clashes;
    const counted = `${partNumber}: ${designators} ${names.length === 1 ? "is one" : `are ${names.length}`}, the count says ${count}.`;
    return names.length === count ? more : [...more, counted];
  });
}
