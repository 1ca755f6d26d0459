import { fault, needsCount, needsNotNegative, needsPositive, type Fault } from "../computed";
import { type LoadItem } from "./draw-of-item";
import { type PowerItem, type RegulatorItem, type Spread } from "./item";

/** The first figure that cannot be used; `row` is the field, the label names the row for people. */
export function checkItem(item: PowerItem, row: string): Fault | undefined {
  const own = (words: string) => `${words} of ${item.label}`;
  const notNegative = (words: string, value: number) => needsNotNegative(row, own(words), value);
  const spread = (words: string, { typical, worst }: Spread) =>
    notNegative(`typical ${words}`, typical) ??
    notNegative(`worst ${words}`, worst) ??
    (typical > worst ? fault(row, `${item.label}: the typical ${words} is above the worst.`) : undefined);
  const share = (words: string, value: Spread) =>
    spread(words, value) ?? (value.worst > 1 ? fault(row, `${item.label}: the ${words} is above 1.`) : undefined);

  if (item.kind === "regulator") return checkRegulator(item, row);
  const bad = needsCount(row, own("number"), item.count);
  if (bad) return bad;
  return checkLoad(item);

  function checkLoad(load: LoadItem): Fault | undefined {
    switch (load.kind) {
      case "package":
        return (
          (load.staticA ? spread("current at rest", load.staticA) : undefined) ??
          notNegative("Cpd", load.cpdPf ?? 0) ??
          notNegative("number of switching gates", load.switching) ??
          notNegative("number of switching outputs", load.outputs) ??
          notNegative("load", load.loadPf) ??
          spread("frequency of the inputs", load.inputHz) ??
          spread("frequency of the outputs", load.outputHz) ??
          (load.ttlInputs
            ? (notNegative("number of TTL inputs", load.ttlInputs.count) ??
              notNegative("additional current", load.ttlInputs.extraA) ??
              share("share of TTL highs", { typical: load.ttlInputs.highShare, worst: load.ttlInputs.highShare }))
            : undefined)
        );
      case "led":
        return (
          needsPositive(row, own("resistor"), load.ohm) ??
          notNegative("forward voltage", load.forwardVolts) ??
          share("lit share", load.lit)
        );
      case "pull-up":
        return (
          needsPositive(row, own("resistor"), load.ohm) ??
          notNegative("low level", load.lowVolts) ??
          share("low share", load.lowShare)
        );
      case "fixed":
        return (
          spread("current", { typical: load.typicalA, worst: load.worstA }) ??
          share("share at rest", { typical: load.atRest, worst: load.atRest })
        );
    }
  }
}

function checkRegulator({ label, outputVolts, type }: RegulatorItem, row: string): Fault | undefined {
  const volts = needsPositive(row, `output of ${label}`, outputVolts);
  if (volts) return volts;
  if (type.kind === "linear") return needsNotNegative(row, `ground current of ${label}`, type.groundA);
  if (type.efficiency > 0 && type.efficiency <= 1) return undefined;
  return fault(row, `${label}: the efficiency must be above 0 and at most 1.`);
}
