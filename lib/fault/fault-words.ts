import type { FaultState } from "@/db/schema/faults";

export const STATE_WORDS: Record<FaultState, string> = {
  open: "open",
  traced: "traced",
  mended: "mended",
  "no-fault": "no fault",
};

export const STATE_MEANINGS: Record<FaultState, string> = {
  open: "Only the symptom is known.",
  traced: "The cause is found; it is not mended yet.",
  mended: "It works again.",
  "no-fault": "It was none: a slip, a wrong expectation, a probe.",
};

export const isClosed = (state: FaultState): boolean => state === "mended" || state === "no-fault";

/** 1.5 → "1 h 30 min"; 0.75 → "45 min". */
export function writeHours(hours: number): string {
  const minutes = Math.round(hours * 60);
  const [whole, rest] = [Math.floor(minutes / 60), minutes % 60];
  return [whole > 0 ? `${whole} h` : "", rest > 0 || whole === 0 ? `${rest} min` : ""].filter(Boolean).join(" ");
}
