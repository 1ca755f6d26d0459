import type { Netlist } from "../netlist";
import type { Choice } from "./choose-points";
import { windowOf } from "./isolation-pairs";
import type { PlanOptions } from "./plan";
import type { PointBook } from "./point-book";

/** What the plan leaves out, and what it had to assume, a sentence each. */
export function planRemarks(netlist: Netlist, book: PointBook, choice: Choice, options: PlanOptions): string[] {
  const { hidden, vias, unconnected } = choice.leftOut;
  const { placeless, sizeless } = countUnknown(book, choice.candidates);
  const connector = options.connector?.trim();
  const remarks = [
    connector !== undefined && choice.candidates.length === 0 ? `No point of the netlist belongs to ${connector}.` : "",
    options.signals && choice.isWanted.every((is) => is === 0)
      ? "None of these signals is a net of the netlist under this name."
      : "",
    vias > 0 ? `${count(vias, "via or mid-point", "vias and mid-points")} between the ends of nets: not probed.` : "",
    hidden > 0 ? `${count(hidden, "point", "points")} inside the board: out of reach.` : "",
    unconnected > 0 ? `${count(unconnected, "pad", "pads")} without a net: not probed.` : "",
    netlist.places === "faces"
      ? "Places are those on the connectors' faces: what lies between the connectors is not known."
      : "",
    placeless > 0
      ? `${count(placeless, "point has", "points have")} no place: neighbours are told by the names of the pins.`
      : "",
    sizeless > 0 && options.railsOnly !== true
      ? `${count(sizeless, "pad has", "pads have")} no size: a usual one is taken for what lies within ${windowOf(options)}\u202fmm.`
      : "",
  ];
  return remarks.filter((remark) => remark !== "");
}

function countUnknown({ points }: PointBook, candidates: readonly number[]) {
  let [placeless, sizeless] = [0, 0];
  for (const at of candidates) {
    const point = points[at];
    if (point?.xMm === null) placeless += 1;
    else if (point?.padWidthMm === null) sizeless += 1;
  }
  return { placeless, sizeless };
}

const count = (number: number, one: string, several: string): string =>
  `${number.toLocaleString("en-GB")} ${number === 1 ? one : several}`;
