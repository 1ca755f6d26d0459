import { conductorCurrent } from "@/lib/calc/conductor";
import { shortQuantity } from "@/lib/calc/units";
import type { RailView } from "./power-view";

type Taken = { slot: number | null; worstA: number };

/** How much warmer than the air the copper may get; outer layers, without neighbours. */
const RISE_K = 10;

export type CopperLoad = { fits: boolean; sentence: string };

/** The stretch next to the source carries what all cards on its side take; against the fit to the charts of IPC-2221. */
export function copperLoad({ kept, sourceSlot }: RailView, taken: readonly Taken[]): CopperLoad | null {
  if (!kept?.copper || sourceSlot === null) return null;
  const { widthMm, thicknessUm: copperUm } = kept.copper;
  const bears = conductorCurrent({ widthMm, copperUm, riseK: RISE_K, layer: "external" });
  if (!bears.ok) return null;
  const side = (sign: number) =>
    taken.reduce(
      (sum, { slot, worstA }) => sum + (slot !== null && Math.sign(slot - sourceSlot) === sign ? worstA : 0),
      0,
    );
  const carriesA = Math.max(side(1), side(-1));
  const { currentA } = bears.value;
  const fits = carriesA <= currentA;
  const told = `Next to its source the copper carries ${shortQuantity(carriesA, "A")}; it bears ${shortQuantity(currentA, "A")} at ${RISE_K}\u202fK above the air`;
  return { fits, sentence: fits ? `${told}.` : `${told}: make it wider.` };
}
