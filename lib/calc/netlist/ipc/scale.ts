/** What one unit of a coordinate is. */
export type IpcScale = "0.0001 inch" | "0.00001 inch" | "0.001 mm";

export type IpcUnits = {
  scale: IpcScale;
  /** False where the header says radians: three digits cannot hold these, so that turned pads keep no angle. */
  isInDegrees: boolean;
};

/** 1 inch is 25.4 mm exactly: whole figures, so that 17500 becomes 44.45 and no neighbour of it. */
const FRACTIONS: Record<IpcScale, readonly [number, number]> = {
  "0.0001 inch": [254, 100_000],
  "0.00001 inch": [254, 1_000_000],
  "0.001 mm": [1, 1000],
};

export function scaleToMm(scale: IpcScale): (value: number) => number {
  const [numerator, denominator] = FRACTIONS[scale];
  return (value) => (value * numerator) / denominator;
}

/** What is read where the header says nothing. */
export const USUAL_UNITS: IpcUnits = { scale: "0.0001 inch", isInDegrees: true };

/**
 * UNITS of the header. That three readers agree on these was checked; that SI turns in radians is from memory. Undefined
 * for words that mean no units.
 */
export function readUnits(words: string): { units: IpcUnits; doubt: string } | undefined {
  const [, custom, system] = /^(?:CUST\s*([012]?)|(SI))(?:\s|$)/i.exec(words.trim()) ?? [];
  if (system !== undefined) return { units: { scale: "0.001 mm", isInDegrees: false }, doubt: "" };
  if (custom === undefined) return undefined;
  if (custom === "1") return { units: { scale: "0.001 mm", isInDegrees: true }, doubt: "" };
  if (custom !== "2") return { units: USUAL_UNITS, doubt: "" };
  return {
    units: { scale: "0.0001 inch", isInDegrees: false },
    doubt: "Most programs mean steps of 0.0001 inch by UNITS CUST 2, but one means 0.00001 inch.",
  };
}
