import { computed, needsPositive, type Computed } from "../computed";

export const RISE_DEFINITIONS = ["10–90 %", "30–70 %", "20–80 %"] as const;

/** Between which shares of the step a rise is timed: scopes take 10–90 %, the I²C-bus specification 30–70 %. */
export type RiseDefinition = (typeof RISE_DEFINITIONS)[number];

/** ln((1 − from) / (1 − to)) of an exponential: 2.1972, 0.8473 and 1.3863 time constants. */
const TIME_CONSTANTS: Record<RiseDefinition, number> = {
  "10–90 %": Math.log(9),
  "30–70 %": Math.log(7 / 3),
  "20–80 %": Math.log(4),
};

/**
 * Rise time of a line that a resistor charges, s: 2.1972 RC, 0.8473 RC or 1.3863 RC by the definition.
 * Source: UM10204, equations 1 and 2, for 30–70 %; the others computed. The factor 2.593 lies between the first two, so
 * say which. A data sheet that prints 0.4873 for 0.8473 is in error.
 */
export function riseTimeS(ohm: number, capacitancePf: number, definition: RiseDefinition): Computed<number> {
  const bad =
    needsPositive("ohm", "resistor", ohm) ?? needsPositive("capacitancePf", "capacitance of the line", capacitancePf);
  return bad ?? computed(TIME_CONSTANTS[definition] * ohm * capacitancePf * 1e-12);
}

/** The largest resistor with which a line still rises in a time, Ω. */
export function ohmForRise(riseS: number, capacitancePf: number, definition: RiseDefinition): Computed<number> {
  const bad =
    needsPositive("riseS", "rise time", riseS) ??
    needsPositive("capacitancePf", "capacitance of the line", capacitancePf);
  return bad ?? computed(riseS / (TIME_CONSTANTS[definition] * capacitancePf * 1e-12));
}
