import { formatQuantity } from "../units";
import type { Family } from "./family";

/** Letters whose names begin with a vowel: an HC, an LS, an F, but a 4000B, a TTL, an old one. */
const VOWEL_SOUND = /^[AEFHILMNORSX8aeio]/;

/** "An HC output", "A 4000B output". */
export const output = ({ name }: Family): string => `${VOWEL_SOUND.test(name) ? "An" : "A"} ${name} output`;

export const input = ({ name }: Family): string => `${name} input`;

/** "1 LS input", "3 LS inputs". */
export const inputs = (family: Family, count: number): string => `${count} ${input(family)}${count === 1 ? "" : "s"}`;

export const volts = (value: number): string => formatQuantity({ value, unit: "V" });

export const amps = (value: number): string => formatQuantity({ value, unit: "A" });

/** "0.9 of 4 mA": both in the unit that suits the second. */
export function share(used: number, of: number): string {
  const [unit, scale] = of >= 1 ? ["A", 1] : of >= 1e-3 ? ["mA", 1e3] : ["µA", 1e6];
  const number = Number((used * scale).toPrecision(3));
  return `${number} of ${Number((of * scale).toPrecision(6))}\u202f${unit}`;
}
