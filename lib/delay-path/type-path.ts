import { formatQuantity, type Unit } from "@/lib/calc/units";
import type { StoredPath } from "./path-shape";
import type { TypedPath } from "./schema";

const write = (value: number | null, unit: Unit) =>
  value === null ? "" : formatQuantity({ value, unit }).replace("\u202f", " ");

const condition = ({ volts, loadPf }: { volts: number; loadPf: number }) => ({
  volts: write(volts, "V"),
  loadPf: write(Number((loadPf / 1e12).toPrecision(9)), "F"),
});

const percent = (share: number | null) => write(share === null ? null : Number((share * 100).toPrecision(9)), "%");

/** A stored path as its form shows it. */
export function typePath({ measure, steps, derating, clock, ...shares }: StoredPath): TypedPath {
  return {
    measure,
    steps: steps.map(({ part, family, name, count, minS, typicalS, maxS }) => ({
      ...{ part, family, name },
      count: String(count),
      minS: write(minS, "s"),
      typicalS: write(typicalS, "s"),
      maxS: write(maxS, "s"),
    })),
    unknownMinShare: percent(shares.unknownMinShare),
    unknownMaxShare: percent(shares.unknownMaxShare),
    derating: derating && {
      family: derating.family,
      typicalAt: condition(derating.typicalAt),
      limitsAt: condition(derating.limitsAt),
      board: condition(derating.board),
    },
    clock: clock && {
      clockToOutputMaxS: write(clock.clockToOutputMaxS, "s"),
      setupS: write(clock.setupS, "s"),
      skewS: write(clock.skewS, "s"),
      holdS: write(clock.holdS, "s"),
      clockToOutputMinS: write(clock.clockToOutputMinS, "s"),
    },
  };
}
