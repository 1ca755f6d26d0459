import { computed, needsCount, needsNotNegative, type Computed } from "../computed";
import type { Group } from "./loading";

export type NetParts = {
  inputs: readonly Group[];
  /** Outputs on the net that are switched off. */
  offOutputs: readonly Group[];
  connectorPins: number;
  /** Of one connector pin with the copper that leads to it. */
  pinPf: number;
  /** Whatever else hangs on the net: a cable, a probe. */
  furtherPf: number;
};

export type NetLoad = { totalPf: number; inputsPf: number; outputsPf: number; pinsPf: number; furtherPf: number };

/**
 * Capacitance that an output has to charge: the sum over receiver inputs, switched-off outputs and connector pins.
 * A planning estimate from typical figures: a sheet's maximum may be three times as much, and copper counts about 1 pF a
 * centimetre (common practice, no source).
 */
export function netLoad({ inputs, offOutputs, connectorPins, pinPf, furtherPf }: NetParts): Computed<NetLoad> {
  const bad =
    [...inputs, ...offOutputs]
      .map(({ family, count }) => needsCount("count", `number of ${family.name} pins`, count))
      .find((found) => found !== undefined) ??
    needsCount("connectorPins", "number of connector pins", connectorPins) ??
    needsNotNegative("pinPf", "capacitance of a connector pin", pinPf) ??
    needsNotNegative("furtherPf", "further capacitance", furtherPf);
  if (bad) return bad;
  const inputsPf = inputs.reduce((total, { family, count }) => total + count * family.inputPf, 0);
  const outputsPf = offOutputs.reduce((total, { family, count }) => total + count * family.outputPf, 0);
  const pinsPf = connectorPins * pinPf;
  return computed({ totalPf: inputsPf + outputsPf + pinsPf + furtherPf, inputsPf, outputsPf, pinsPf, furtherPf });
}
