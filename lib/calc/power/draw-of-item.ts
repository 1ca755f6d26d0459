import { shortQuantity } from "../units";
import { type DrawLine } from "./budget";
import { type FixedItem, type LedItem, type PackageItem, type PowerItem, type PullUpItem, type Spread } from "./item";
import { switchingPower, ttlInputCurrent } from "./switching-power";

/** Voltage of a rail: nominal, and at the end of its tolerance that costs more. Magnitudes, V. */
export type RailVolts = Spread;

type Draw = { amps: Spread; atRestA: number; reason: string };

/** Everything but regulators, whose current depends on the rails that they make. */
export type LoadItem = Exclude<PowerItem, { kind: "regulator" }>;

export function drawOfItem(item: LoadItem, volts: RailVolts): DrawLine {
  const { label, kind, rail, count } = item;
  return { label, kind, rail, count, ...drawOf(item, volts) };
}

function drawOf(item: LoadItem, volts: RailVolts): Draw {
  switch (item.kind) {
    case "package":
      return packages(item, volts);
    case "led":
      return leds(item, volts);
    case "pull-up":
      return pullUps(item, volts);
    case "fixed":
      return fixed(item);
  }
}

const spread = (each: (which: keyof Spread) => number): Spread => ({ typical: each("typical"), worst: each("worst") });
const amps = (value: number): string => shortQuantity(value, "A");

function packages(item: PackageItem, volts: RailVolts): Draw {
  const { count, staticA, cpdPf, switching, inputHz, outputs, outputHz, loadPf, ttlInputs } = item;
  const power = (which: keyof Spread) =>
    switchingPower({
      volts: volts[which],
      cpdPf: cpdPf ?? 0,
      inputHz: inputHz[which],
      switching,
      outputs: [{ loadPf: loadPf * outputs, hz: outputHz[which] }],
    });
  const parts = spread((which) => power(which).internalW / volts[which]);
  const loads = spread((which) => power(which).loadW / volts[which]);
  const ttl = ttlInputs ? ttlInputCurrent(ttlInputs.count, ttlInputs.extraA, ttlInputs.highShare) : 0;
  const ttlWorst = ttlInputs ? ttlInputCurrent(ttlInputs.count, ttlInputs.extraA, 1) : 0;
  const rest = { typical: (staticA?.typical ?? 0) + ttl, worst: (staticA?.worst ?? 0) + ttlWorst };
  const reason = `at worst: at rest ${amps(count * rest.worst)}, switching ${amps(count * parts.worst)}, loads ${amps(count * loads.worst)}`;
  return {
    amps: spread((which) => count * (rest[which] + parts[which] + loads[which])),
    // Inputs may all stand low at first power, so the TTL highs are not sure to flow.
    atRestA: count * (staticA?.typical ?? 0),
    reason,
  };
}

function leds({ count, forwardVolts, ohm, lit }: LedItem, volts: RailVolts): Draw {
  const each = spread((which) => (Math.max(0, volts[which] - forwardVolts) / ohm) * lit[which]);
  const current = spread((which) => count * each[which]);
  const always = lit.typical === 1 && lit.worst === 1;
  return { amps: current, atRestA: always ? current.typical : 0, reason: `${amps(each.worst)} each at worst` };
}

function pullUps({ count, ohm, lowVolts, lowShare }: PullUpItem, volts: RailVolts): Draw {
  const each = spread((which) => (Math.max(0, volts[which] - lowVolts) / ohm) * lowShare[which]);
  return { amps: spread((which) => count * each[which]), atRestA: 0, reason: `${amps(each.worst)} each at worst` };
}

function fixed({ count, typicalA, worstA, atRest }: FixedItem): Draw {
  return {
    amps: { typical: count * typicalA, worst: count * worstA },
    atRestA: count * typicalA * atRest,
    reason: `${amps(worstA)} each at worst, as typed in`,
  };
}
