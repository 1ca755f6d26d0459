import { busNames } from "./bus-range";

/** "+5 V", "−12 V", "+3.3V", "3V3": a sign, volts with a decimal mark or with the V in its place, blanks between. */
const RAIL = /^([+\u2212\u2013-]?)\s*(\d+)(?:[.,](\d+)\s*V|\s*V(\d*))$/i;

/** "D[7]": one line of a bus. */
const LINE = /^(.+)\[(\d+)\]$/;

/**
 * One writing for the names that people use for one signal: "+5 V", "+5V", "5V" and "5V0" are one rail, "D[7]" is D7, capitals and
 * spaces inside a name do not matter. For comparing only: two signals that differ in capitals alone become one, which where
 * it is used errs on the side of meeting.
 */
export function signalKey(name: string): string {
  const plain = name.normalize("NFKC").trim();
  const [, sign, whole, tenths, tenthsAfterV] = RAIL.exec(plain) ?? [];
  if (whole !== undefined) {
    return `${sign === "" || sign === "+" ? "+" : "-"}${Number(`${whole}.${tenths ?? tenthsAfterV ?? ""}`)}V`;
  }
  const [, bus, line] = LINE.exec(plain) ?? [];
  return (bus === undefined || line === undefined ? plain : `${bus}${Number(line)}`).replace(/\s+/g, "").toUpperCase();
}

/** The same for a name that may be a bus range: PH[7:0] is PH7 … PH0. Empty for a blank name. */
export function signalKeys(name: string): string[] {
  return (busNames(name) ?? [name]).map(signalKey).filter((key) => key !== "");
}
