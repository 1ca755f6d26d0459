/** Powers of ten of the SI prefixes that a unit takes at the bench; 0 stands for no prefix. */
const SMALL = [-15, -12, -9, -6, -3, 0] as const;
const METRIC = [...SMALL, 3, 6, 9, 12] as const;
const NONE = [0] as const;

type UnitEntry = {
  /** Plural name for forms and sentences. */
  name: string;
  /** Spellings accepted besides the symbol, as written. */
  spellings: readonly string[];
  /** Prefixes it takes. A megampere is left out on purpose: "20 MA" is a slip for "20 mA". */
  prefixes: readonly number[];
  /** False where a percentage of the value means nothing (°C, dB) or two things (%). */
  relative: boolean;
  /** Whether an instrument can show an overload for it. */
  overload: boolean;
};

const ENTRIES = {
  V: { name: "volts", spellings: ["volt", "volts"], prefixes: [...SMALL, 3], relative: true, overload: true },
  A: {
    name: "amperes",
    spellings: ["amp", "amps", "ampere", "amperes"],
    prefixes: [...SMALL, 3],
    relative: true,
    overload: true,
  },
  Ω: { name: "ohms", spellings: ["\u2126", "ohm", "ohms", "R"], prefixes: METRIC, relative: true, overload: true },
  F: { name: "farads", spellings: ["farad", "farads"], prefixes: SMALL, relative: true, overload: true },
  H: { name: "henries", spellings: ["henry", "henries"], prefixes: SMALL, relative: true, overload: true },
  Hz: { name: "hertz", spellings: ["hertz"], prefixes: METRIC, relative: true, overload: true },
  s: { name: "seconds", spellings: ["sec", "second", "seconds"], prefixes: SMALL, relative: true, overload: true },
  W: { name: "watts", spellings: ["watt", "watts"], prefixes: [...SMALL, 3, 6], relative: true, overload: true },
  "°C": {
    name: "degrees Celsius",
    spellings: ["\u2103", "\u00baC", "degC", "C"],
    prefixes: NONE,
    relative: false,
    overload: true,
  },
  "%": { name: "percent", spellings: ["percent"], prefixes: NONE, relative: false, overload: false },
  dB: { name: "decibels", spellings: ["decibel", "decibels"], prefixes: NONE, relative: false, overload: false },
  m: { name: "metres", spellings: ["metre", "metres"], prefixes: [-9, -6, -3, 0, 3], relative: true, overload: false },
  g: { name: "grams", spellings: ["gram", "grams"], prefixes: [-9, -6, -3, 0, 3], relative: true, overload: false },
  "": { name: "plain number", spellings: [], prefixes: METRIC, relative: true, overload: false },
} satisfies Record<string, UnitEntry>;

/** A unit by its symbol (ISO 80000, IEC 80000); "" is a plain number or a count. */
export type Unit = keyof typeof ENTRIES;

/** A value in the base unit: 4.7 kΩ is { value: 4700, unit: "Ω" }. */
export type Quantity = { value: number; unit: Unit };

/** True when the text is a unit's symbol as Boardwake keeps it; for values read back from storage. */
export function isUnit(text: string): text is Unit {
  return Object.hasOwn(ENTRIES, text);
}

/** What is known of a unit. */
export function unitEntry(unit: Unit): UnitEntry {
  return ENTRIES[unit];
}

/** "volts (V)", "plain number": a unit for the options of a form. */
export function unitLabel(unit: Unit): string {
  const { name } = ENTRIES[unit];
  return unit === "" || unit === "%" ? name : `${name} (${unit})`;
}

/** Every unit with its plural name, in the order for forms. */
export const UNITS: readonly { unit: Unit; name: string; label: string }[] = Object.keys(ENTRIES)
  .filter(isUnit)
  .map((unit) => ({ unit, name: ENTRIES[unit].name, label: unitLabel(unit) }));
