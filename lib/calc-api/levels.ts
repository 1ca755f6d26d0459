import { z } from "zod";
import {
  fanOut,
  inputStress,
  loadedEdge,
  loading,
  margins,
  marginsOverSupply,
  netLoad,
  pairWarnings,
  type Family,
  type Group,
} from "@/lib/calc/levels";
import { defineCalculation, faulty, type Outcome } from "./define-calculation";
import { familyField, familyOf } from "./family-field";
import { countFromZero, ohms, percent, picofarads, volts } from "./fields";

const group = z.strictObject({ family: familyField, count: countFromZero.default(1) });

const input = z.strictObject({
  driver: familyField,
  receivers: z.array(group).min(1).max(50),
  offOutputs: z.array(group).max(50).default([]).describe("Outputs on the same net that are switched off."),
  supplyVolts: volts.default(5),
  tolerancePercent: percent.max(50).default(0).describe("Of the supply, both ways."),
  supplies: z.enum(["same", "separate"]).default("same").describe("Whether driver and receiver hang on one rail."),
  pullUpOhm: ohms.nullable().default(null),
  connectorPins: countFromZero.default(0),
  pinPf: picofarads.default(5),
  furtherPf: picofarads.default(0),
});
type Input = z.output<typeof input>;

export const levels = defineCalculation({
  name: "levels",
  about: "Noise margins, fan-out and capacitive load of an output and the inputs that it drives.",
  source:
    "Definitions of the trade: NMH = VOH,min − VIH,min; NML = VIL,max − VOL,max; fan-out = min(⌊IOH/IIH⌋, ⌊IOL/IIL⌋). Families: figures of data sheets, each with its source; edges and delays by rule of thumb (common practice, no source).",
  leavesOut: "Ringing, crosstalk, drop in the ground between cards, lines longer than a quarter of the edge.",
  most: "50 groups of receivers.",
  input,
  example: { driver: "LS", receivers: [{ family: "HC", count: 3 }], supplyVolts: 5, connectorPins: 4 },
  run: (given): Outcome => {
    const driver = familyOf("driver", given.driver);
    if (!driver.ok) return faulty(driver);
    const receivers = groupsOf("receivers", given.receivers);
    if (!("groups" in receivers)) return receivers;
    const off = groupsOf("offOutputs", given.offOutputs);
    if (!("groups" in off)) return off;
    return study(driver.value, receivers.groups, off.groups, given);
  },
});

function groupsOf(field: string, given: Input["receivers"]): { groups: Group[] } | Outcome {
  const groups: Group[] = [];
  for (const [index, { family, count }] of given.entries()) {
    const found = familyOf(`${field}.${index}.family`, family);
    if (!found.ok) return faulty(found);
    groups.push({ family: found.value, count });
  }
  return { groups };
}

function study(driver: Family, receivers: readonly Group[], off: readonly Group[], given: Input): Outcome {
  const { supplyVolts, tolerancePercent, supplies, pullUpOhm, connectorPins, pinPf, furtherPf } = given;
  const range = {
    minVolts: supplyVolts * (1 - tolerancePercent / 100),
    maxVolts: supplyVolts * (1 + tolerancePercent / 100),
  };
  const at = familyOf("driver", driver, supplyVolts);
  if (!at.ok) return faulty(at);
  const pairs: object[] = [];
  const groups: Group[] = [];
  for (const [index, { family, count }] of receivers.entries()) {
    const receiver = familyOf(`receivers.${index}.family`, family, supplyVolts);
    if (!receiver.ok) return faulty(receiver);
    const over = marginsOverSupply(driver, family, range, supplies);
    if (!over.ok) return faulty(over);
    groups.push({ family: receiver.value, count });
    pairs.push({
      family: family.name,
      count,
      margins: tolerancePercent === 0 && supplies === "same" ? margins(at.value, receiver.value) : over.value,
      fanOut: fanOut(at.value, receiver.value),
      inputStress: inputStress(at.value, receiver.value),
      warnings: pairWarnings(at.value, receiver.value),
    });
  }
  const pullUp = pullUpOhm === null ? null : { ohm: pullUpOhm, supplyVolts };
  const load = loading(at.value, { inputs: groups, offOutputs: off, pullUp });
  if (!load.ok) return faulty(load);
  const capacitance = netLoad({ inputs: groups, offOutputs: off, connectorPins, pinPf, furtherPf });
  if (!capacitance.ok) return faulty(capacitance);
  const edge = loadedEdge(at.value, capacitance.value.totalPf);
  if (!edge.ok) return faulty(edge);
  return { ok: true, result: { pairs, loading: load.value, capacitance: capacitance.value, edge: edge.value } };
}
