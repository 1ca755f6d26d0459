/** Letters that drawings leave out because they read like figures or like each other (ISO and ASME drawing practice). */
const LETTERS = "ABCDEFGHJKLMNPRTUVWY";

/** A → B → … → Y → AA → AB …; the letters I, O, Q, S, X and Z are skipped. */
export function nextLetter(letters: readonly string[]): string {
  const ranks = letters.map(rank).filter((value) => value !== undefined);
  return written(ranks.length === 0 ? 0 : Math.max(...ranks) + 1);
}

function rank(letter: string): number | undefined {
  let value = 0;
  for (const sign of letter) {
    const place = LETTERS.indexOf(sign);
    if (place < 0) return undefined;
    value = value * LETTERS.length + place + 1;
  }
  return value === 0 ? undefined : value - 1;
}

function written(value: number): string {
  const last = LETTERS.charAt(value % LETTERS.length);
  return value < LETTERS.length ? last : written(Math.floor(value / LETTERS.length) - 1) + last;
}
