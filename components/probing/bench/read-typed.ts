import { parseQuantity } from "@/lib/calc/units";

export type Typed = { ok: true; beeps: boolean | null; ohm: number | null } | { ok: false; sentence: string };

/** A resistance as it is typed. An overload of the meter is silence: what it reads is beyond every limit. */
export function readTyped(text: string): Typed {
  const read = parseQuantity(text, "Ω");
  if (!read.ok) return { ok: false, sentence: read.message };
  const { value } = read.value;
  if (value < 0) return { ok: false, sentence: "A resistance is not negative." };
  return Number.isFinite(value) ? { ok: true, beeps: null, ohm: value } : { ok: true, beeps: false, ohm: null };
}
