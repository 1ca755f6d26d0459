/** SI prefixes of ISO 80000-1 that bench work needs, by power of ten; µ is U+00B5. */
const SYMBOLS = new Map<number, string>([
  [-15, "f"],
  [-12, "p"],
  [-9, "n"],
  [-6, "\u00b5"],
  [-3, "m"],
  [0, ""],
  [3, "k"],
  [6, "M"],
  [9, "G"],
  [12, "T"],
]);

/** Prefixes as people type them: u and the Greek letter for micro, K for kilo, "meg" as circuit simulators have it. */
const TYPED = new Map<string, number>([
  ["f", -15],
  ["p", -12],
  ["n", -9],
  ["u", -6],
  ["\u00b5", -6],
  ["\u03bc", -6],
  ["m", -3],
  ["c", -2],
  ["k", 3],
  ["K", 3],
  ["M", 6],
  ["Meg", 6],
  ["meg", 6],
  ["MEG", 6],
  ["G", 9],
  ["T", 12],
]);

/** The symbol for a power of ten; "" when there is none. */
export function prefixSymbol(power: number): string {
  return SYMBOLS.get(power) ?? "";
}

/** The power of ten of a prefix as typed; undefined when it is none. */
export function typedPrefix(text: string): number | undefined {
  return TYPED.get(text);
}

/** Every typed prefix that the text begins with, longest first. */
export function leadingPrefixes(text: string): { typed: string; power: number }[] {
  return [...TYPED]
    .filter(([typed]) => text.startsWith(typed))
    .map(([typed, power]) => ({ typed, power }))
    .sort((a, b) => b.typed.length - a.typed.length);
}
