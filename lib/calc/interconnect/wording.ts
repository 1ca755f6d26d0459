import { formatQuantity } from "../units";

/** "A", "A and B", "A, B and C"; beyond `most` the rest is counted. */
export function listed(words: readonly string[], most = 4): string {
  const shown = words.length > most + 1 ? [...words.slice(0, most), `${words.length - most} more`] : [...words];
  const last = shown.pop() ?? "";
  return shown.length === 0 ? last : `${shown.join(", ")} and ${last}`;
}

const NUMBERS = ["no", "one", "two", "three", "four", "five", "six", "seven", "eight", "nine", "ten"];

/** "two", "eleven" as a figure: 11. */
export const counted = (count: number): string => NUMBERS[count] ?? String(count);

/** Capital at the beginning of a sentence, but never of a signal's own name. */
export const capitalNet = (text: string): string => (text.startsWith("the net at ") ? capital(text) : text);

export const capital = (text: string): string => text.charAt(0).toUpperCase() + text.slice(1);

/** The bus that a line is part of, by its name: "PH" of PH6, "D" of D[6]; undefined for a line of its own. */
export const busStem = (name: string): string | undefined => /^(.*[^\d\s[])\[?\d+\]?$/.exec(name)?.[1];

/** "SUM0", "SUM0 and STB", "PH0 … PH7" for lines of one bus that follow each other, "A, B and 3 more". */
export function subjectsListed(subjects: readonly string[]): string {
  const [first = "", last = ""] = [subjects[0], subjects.at(-1)];
  const stem = busStem(first);
  const number = (name: string) => Number(/(\d+)\]?$/.exec(name)?.[1]);
  const isRun =
    subjects.length > 2 &&
    stem !== undefined &&
    subjects.every((name, at) => busStem(name) === stem && number(name) === number(first) + at);
  return isRun ? `${first} … ${last}` : listed(subjects, 2);
}

/** The verb that suits the number: "drives" for one, "drive" for several. */
export const verb = (count: number, one: string, several: string): string => (count === 1 ? one : several);

/** "1 pin", "3 pins". */
export const pinCount = (count: number): string => `${count} pin${count === 1 ? "" : "s"}`;

/** "PH6", or "the net at CON-01 a10" where nobody gave it a name. */
export const netName = ({ name, id }: { name: string; id: string }): string =>
  name === "" ? `the net at ${id}` : name;

/** To three digits, without zeros that say nothing. */
const rounded = (value: number): number => Number(value.toPrecision(3));

export const ohms = (value: number): string => formatQuantity({ value: rounded(value), unit: "Ω" });
export const amps = (value: number): string => formatQuantity({ value: rounded(value), unit: "A" });
export const volts = (value: number): string => formatQuantity({ value, unit: "V" });
export const seconds = (value: number): string => formatQuantity({ value, unit: "s" }, { significant: 2 });
export const farads = (pf: number): string => formatQuantity({ value: rounded(pf * 1e-12), unit: "F" });
export const millimetres = (value: number): string => `${value.toFixed(1)}\u202fmm`;
