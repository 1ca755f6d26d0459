import { computed, needsNotNegative, needsPositive, type Computed } from "../computed";
import { formatQuantity } from "../units";
import type { Family } from "./family";
import { output } from "./wording";

/** Load at which the families' edges are given. */
const GIVEN_PF = 50;
/** No net is lighter than a probe and a pin; below this the edge is the transistor's own. */
const LEAST_PF = 15;

export type LoadedEdge = {
  /** Of the output taken as a resistor that charges the load. */
  outputOhm: number;
  /** 10–90 %. */
  edgeS: number;
  /** What the load adds to the delay at 50 pF; below zero for a lighter one. */
  addedDelayS: number;
  /** Of the gate with this load; null where the family has no typical delay. */
  delayS: number | null;
  sentence: string;
};

/**
 * What a capacitive load does to an output's edge and delay, by the output as a resistor R = edge(50 pF) / (ln 9 · 50 pF):
 * edge = edge(50 pF) · C / 50 pF, delay = delay(typical) + ln 2 · R · (C − 50 pF), both with C of at least 15 pF.
 *
 * A planning estimate: common practice, no source. Leaves out: the supply, the temperature and the spread of parts
 * (twice the typical is usual), rising and falling edges that differ, outputs that limit their current, and lines whose
 * delay is more than a quarter of the edge, which ring instead.
 */
export function loadedEdge(driver: Family, loadPf: number): Computed<LoadedEdge> {
  const bad =
    needsNotNegative("loadPf", "load of the net", loadPf) ??
    needsPositive("edgeS", `edge of ${driver.name}`, driver.edgeS);
  if (bad) return bad;
  const pf = Math.max(loadPf, LEAST_PF);
  const outputOhm = driver.edgeS / (Math.log(9) * GIVEN_PF * 1e-12);
  const edgeS = (driver.edgeS * pf) / GIVEN_PF;
  const addedDelayS = Math.LN2 * outputOhm * (pf - GIVEN_PF) * 1e-12;
  const delayS = driver.tpdTypicalS === null ? null : Math.max(0, driver.tpdTypicalS + addedDelayS);
  return computed({ outputOhm, edgeS, addedDelayS, delayS, sentence: sentence(driver, loadPf, edgeS, delayS) });
}

function sentence(driver: Family, loadPf: number, edgeS: number, delayS: number | null): string {
  const load = formatQuantity({ value: loadPf * 1e-12, unit: "F" }, { significant: 2 });
  const delay = delayS === null ? "" : ` and a gate delay of about ${seconds(delayS)}`;
  return `${output(driver)} with ${load} has an edge of about ${seconds(edgeS)}${delay}.`;
}

const seconds = (value: number) => formatQuantity({ value, unit: "s" }, { significant: 2 });
