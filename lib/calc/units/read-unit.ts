import { leadingPrefixes, typedPrefix } from "./prefixes";
import { matchAt, problemAt, skipBlanks, type Problem } from "./typed-text";
import { isUnit, unitEntry, UNITS, type Unit } from "./unit-list";

const RUN = /[A-Za-z%\u00b0\u00ba\u2103\u03a9\u2126\u00b5\u03bc]+/y;
/** Words between or after the values of a limit; never units. */
const WORDS = new Set(["to", "and", "max", "min"]);

/** A unit as typed: any of a prefix and a unit; neither when nothing stands there. */
export type TypedUnit = {
  ok: true;
  unit?: Unit;
  prefix?: string;
  power: number;
  /** A lone m: milli of the unit that is expected, or metres. */
  loneM: boolean;
  /** Whether a blank stood before it. */
  gap: boolean;
  start: number;
  end: number;
};

/** Reads an optional prefix and unit after a number ending at an index. */
export function readUnit(text: string, index: number): TypedUnit | Problem {
  const start = skipBlanks(text, index);
  const nothing: TypedUnit = { ok: true, power: 0, loneM: false, gap: start > index, start: index, end: index };
  const first = matchAt(RUN, text, start)?.[0];
  if (first === undefined || WORDS.has(first.toLowerCase())) return nothing;

  const here = { ...nothing, start };
  const end = start + first.length;
  const next = continuation(text, first, end);
  const run = next ? first + next.run : first;
  const found = meaning(run);
  if (found === undefined) return problemAt(start, `“${run}” is no unit known here.${spellingHint(run)}`);
  if ("twofold" in found) {
    return problemAt(start, `“${run}” may mean milli or mega. Write m for milli, M for mega, and ${found.twofold}.`);
  }
  return { ...here, ...found, end: next?.end ?? end };
}

/** "3.3 k ohm", "25 ° C": a prefix or a degree sign and, after a blank, its unit. */
function continuation(text: string, first: string, end: number): { run: string; end: number } | undefined {
  const second = skipBlanks(text, end);
  const run = second === end ? undefined : matchAt(RUN, text, second)?.[0];
  if (run === undefined) return undefined;
  const belongs =
    typedPrefix(first) !== undefined ? spelled(run) !== undefined : /^[°º]$/.test(first) && /^c$/i.test(run);
  return belongs ? { run, end: second + run.length } : undefined;
}

type Meaning = { unit?: Unit; prefix?: string; power: number; loneM: boolean } | { twofold: Unit };

function meaning(run: string): Meaning | undefined {
  if (run === "m") return { prefix: "m", power: -3, loneM: true };
  const whole = spelled(run);
  if (whole) return { unit: whole.unit, power: 0, loneM: false };
  for (const { typed, power } of leadingPrefixes(run)) {
    const rest = run.slice(typed.length);
    if (rest === "") return { prefix: typed, power, loneM: false };
    const found = spelled(rest) ?? smallLetter(rest);
    if (found && caseInDoubt(typed, rest, found)) return { twofold: found.unit };
    if (found) return { unit: found.unit, prefix: typed, power, loneM: false };
  }
  return undefined;
}

/** "mhz" is a slip for MHz as often as not, "MOHM" and "Mw" say little of the prefix; "mv", "MOhm" and "Mhz" are plain. */
function caseInDoubt(prefix: string, rest: string, { unit, exact }: { unit: Unit; exact: boolean }): boolean {
  if (exact) return false;
  return unit === "Hz" ? prefix === "m" : prefix === "M" && !/^[A-Z][a-z]/.test(rest);
}

/** After a prefix a small f or h is the farad or henry ("100nf"); alone it is femto, or hours. */
function smallLetter(rest: string): { unit: Unit; exact: boolean } | undefined {
  if (rest === "f") return { unit: "F", exact: false };
  return rest === "h" ? { unit: "H", exact: false } : undefined;
}

/** The unit that a text spells; exact when its capitals are right too. */
function spelled(text: string): { unit: Unit; exact: boolean } | undefined {
  if (text === "") return undefined;
  if (isUnit(text)) return { unit: text, exact: true };
  const right = UNITS.find(({ unit }) => unitEntry(unit).spellings.includes(text));
  if (right) return { unit: right.unit, exact: true };
  // Siemens, mega and giga; femto and hours.
  if (/^[SMfhG]$/.test(text)) return undefined;
  const lower = text.toLowerCase();
  const loose = UNITS.find(({ unit }) =>
    [unit, ...unitEntry(unit).spellings].some((spelling) => spelling.toLowerCase() === lower),
  );
  return loose && { unit: loose.unit, exact: false };
}

function spellingHint(run: string): string {
  const lower = run.toLowerCase();
  if (typedPrefix(lower) !== undefined) return ` If a prefix is meant, write ${lower}.`;
  if (lower === "s") return " For seconds write s.";
  return "";
}

/**
 * The unit and power of ten that a typed unit stands for once it is known what is expected.
 * Refuses another unit than the expected one, a prefix that the unit does not take, and a lone m that may be two things.
 */
export function settleUnit(
  typed: TypedUnit,
  expected: Unit | undefined,
): { ok: true; unit: Unit; power: number } | Problem {
  if (typed.loneM && (expected === "m" || (expected === undefined && typed.gap)))
    return { ok: true, unit: "m", power: 0 };
  if (typed.loneM && expected === undefined) {
    return problemAt(
      typed.start,
      "“m” may mean metres or milli. Write the unit, as in mV, or a blank before m for metres.",
    );
  }
  if (typed.unit !== undefined && expected !== undefined && typed.unit !== expected) {
    return problemAt(typed.start, `${wanted(expected)} expected here, not ${unitEntry(typed.unit).name}.`);
  }
  const unit = typed.unit ?? expected ?? "";
  const centimetres = typed.prefix === "c" && unit === "m";
  if (typed.prefix !== undefined && !centimetres && !unitEntry(unit).prefixes.includes(typed.power)) {
    const instead = typed.prefix === "M" && unitEntry(unit).prefixes.includes(-3) ? ` For milli write m${unit}.` : "";
    return problemAt(
      typed.start,
      `${unitEntry(unit).name} are not written with the prefix “${typed.prefix}” here.${instead}`,
    );
  }
  return { ok: true, unit, power: typed.power };
}

const wanted = (unit: Unit) => (unit === "" ? "a plain number is" : `${unitEntry(unit).name} are`);
