/** Blanks that people type or paste between digits and units: space, tab, no-break, figure, thin, hair, narrow. */
export const BLANK = " \\t\\u00a0\\u2007\\u2008\\u2009\\u200a\\u202f";

const BLANKS = new RegExp(`[${BLANK}]*`, "y");
const OUTER_BLANKS = /^[\s]*|[\s]*$/g;
const READABLE = new RegExp(
  `[0-9A-Za-z${BLANK}+\\-\\u2212\\u2013.,\\u2026\\u00b1<>\\u2264\\u2265=/();%\\u00b0\\u00ba\\u2103\\u03a9\\u2126\\u00b5\\u03bc\\u221e]`,
);

/** A refusal: a sentence for people that names the column, and the column itself, counted from 1. */
export type Problem = { ok: false; message: string; column: number };

/** The refusal of what stands at an index (counted from 0). */
export function problemAt(index: number, sentence: string): Problem {
  return { ok: false, column: index + 1, message: `Column ${index + 1}: ${sentence}` };
}

/** The index after any blanks. */
export function skipBlanks(text: string, index: number): number {
  BLANKS.lastIndex = index;
  BLANKS.exec(text);
  return Math.max(index, BLANKS.lastIndex);
}

/** What a sticky pattern finds at an index. */
export function matchAt(pattern: RegExp, text: string, index: number): RegExpExecArray | undefined {
  pattern.lastIndex = index;
  return pattern.exec(text) ?? undefined;
}

/**
 * Refuses what cannot be read at all: nothing, too much, and characters that only look like digits or units.
 * Undefined when the text may be read. Outer blanks and line ends count as nothing.
 */
export function unreadable(text: string, longest: number): Problem | undefined {
  if (text.length > longest * 4 || text.trim().length > longest) {
    return problemAt(longest, `the entry is longer than ${longest} characters.`);
  }
  if (text.trim() === "") return problemAt(0, "nothing was typed.");
  const blanked = text.replace(OUTER_BLANKS, (outer) => " ".repeat(outer.length));
  for (let index = 0; index < blanked.length; index += 1) {
    if (!READABLE.test(blanked.charAt(index))) return problemAt(index, `${named(blanked, index)} cannot be read here.`);
  }
  return undefined;
}

/** The same text with line ends and outer blanks as plain blanks, so that columns stay as typed. */
export function withPlainOuterBlanks(text: string): string {
  return text.replace(OUTER_BLANKS, (outer) => " ".repeat(outer.length));
}

function named(text: string, index: number): string {
  const point = text.codePointAt(index) ?? 0;
  const code = `U+${point.toString(16).toUpperCase().padStart(4, "0")}`;
  const character = String.fromCodePoint(point);
  return /[\p{L}\p{N}\p{P}\p{S}]/u.test(character) ? `the character “${character}” (${code})` : `the character ${code}`;
}
