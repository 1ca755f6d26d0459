import { computed, type Computed } from "../computed";
import { type SeriesName, valuesBetween } from "../preferred-values";
import { pullUpBehaviour, type PullUpBehaviour } from "./behaviour";
import { limitsOf, type PullUpLimits } from "./limits";
import { badLine, type Line } from "./line";
import { atLeast, atMost, ohms, seconds, volts, whyAtLeast, whyAtMost, amps } from "./wording";

/** Series from which values are offered, the ones in most drawers first. */
export const OFFERED_SERIES = ["E6", "E12", "E24", "E48", "E96"] as const satisfies readonly SeriesName[];
export type OfferedSeries = (typeof OFFERED_SERIES)[number];

type Offers = Record<OfferedSeries, number[]>;

export type PullUpWindow =
  | (PullUpLimits & {
      verdict: "fits";
      minOhm: number;
      /** Values inside the window; up to ten times the least where nothing limits it upwards. */
      values: Offers;
      /** Of the first series that has one inside, the value nearest to the middle by ratio. */
      recommended: PullUpBehaviour & { series: OfferedSeries };
      sentence: string;
    })
  | (PullUpLimits & { verdict: "none"; sentence: string });

/**
 * The resistors that pull a line up well: Rmin to Rmax (see limitsOf), values of IEC 60063 inside, and one of them.
 * Recommended is the middle of the window by ratio, as far from either trouble; where nothing limits upwards, the middle
 * of the decade above Rmin. Says why when no value fits.
 */
export function pullUpWindow(line: Line): Computed<PullUpWindow> {
  const bad = badLine(line);
  if (bad) return bad;
  const limits = limitsOf(line);
  const { minOhm, maxOhm } = limits;
  if (minOhm === null || (maxOhm !== null && maxOhm < minOhm)) {
    return computed({ ...limits, verdict: "none", sentence: whyNone(line, limits) });
  }
  const top = maxOhm ?? minOhm * 10;
  const values = offersBetween(minOhm, top);
  const chosen = nearestTo(Math.sqrt(minOhm * top), values);
  if (!chosen) {
    const sentence = `Between ${ohms(minOhm)} and ${ohms(top)} there is no value of E6 to E96.`;
    return computed({ ...limits, verdict: "none", sentence });
  }
  const behaviour = pullUpBehaviour(line, chosen.ohm);
  if (!behaviour.ok) return behaviour;
  const recommended = { ...behaviour.value, series: chosen.series };
  const sentence = `${range(limits, minOhm)} ${advice(line, recommended)}`;
  return computed({ ...limits, verdict: "fits", minOhm, values, recommended, sentence });
}

const offersBetween = (low: number, high: number): Offers => ({
  E6: valuesBetween("E6", low, high),
  E12: valuesBetween("E12", low, high),
  E24: valuesBetween("E24", low, high),
  E48: valuesBetween("E48", low, high),
  E96: valuesBetween("E96", low, high),
});

function nearestTo(middle: number, values: Offers): { series: OfferedSeries; ohm: number } | undefined {
  const series = OFFERED_SERIES.find((name) => values[name].length > 0);
  if (!series) return undefined;
  const away = (ohm: number) => Math.abs(Math.log(ohm / middle));
  const [ohm] = [...values[series]].sort((a, b) => away(a) - away(b));
  return ohm === undefined ? undefined : { series, ohm };
}

function range({ maxOhm }: PullUpLimits, minOhm: number): string {
  if (maxOhm === null) return `${atLeast(minOhm)} or more fits;`;
  return `A value between ${atLeast(minOhm)} and ${atMost(maxOhm)} fits;`;
}

function advice(line: Line, { series, ohm, riseS, lowCurrentA }: PullUpBehaviour & { series: string }): string {
  const does = riseS === null ? `takes ${amps(lowCurrentA)} at low` : `rises in ${seconds(riseS)} (${line.definition})`;
  return `${series}: ${ohms(ohm)} ${does}.`;
}

function whyNone(line: Line, limits: PullUpLimits): string {
  if (line.supply.minVolts <= line.highVolts) {
    return `No resistor pulls the line to ${volts(line.highVolts)}: the supply may be as low as ${volts(line.supply.minVolts)}.`;
  }
  if (limits.minOhm === null) {
    return `No value fits: the inputs alone give ${amps(line.inputsLowA)} at low, and the output takes ${amps(line.sinkA)}.`;
  }
  return `No value fits: ${whyAtMost(line, limits)}, ${whyAtLeast(line, limits.minOhm)}.`;
}
