import { computed, type Computed } from "../computed";
import { type BoardPower, type DrawLine, type RailDraw } from "./budget";
import { checkBoard, type Rails } from "./check-board";
import { drawOfItem } from "./draw-of-item";
import { drawOfRegulator } from "./draw-of-regulator";
import { type BoardPowerInput, type PowerItem, type RailSupply, type RegulatorItem } from "./item";
import { orderRegulators } from "./order-regulators";
import { heatOf, railDraw } from "./rail-draw";

/** Of a rail that a regulator makes and nobody described. */
const USUAL_TOLERANCE_PERCENT = 5;

/**
 * Current of a board from each of its rails, typical (nominal supply, usual activity) and worst (upper end of the supply's
 * tolerance, everything at its most at once), and its heat. Regulators hand the current of their output on to their input.
 * Leaves out: inrush, currents of a short, and that not everything is at its worst together.
 * Faults name the row: "items/3", "typed/0", "elsewhere/1".
 */
export function boardPower(input: BoardPowerInput): Computed<BoardPower> {
  const rows = input.items.map((item, index) => ({ item, row: `items/${index}` }));
  const regulators = rows.flatMap(({ item, row }) => (item.kind === "regulator" ? [{ item, row }] : []));
  const rails = railsOf(input.rails, regulators);
  const bad = checkBoard(input, rails);
  if (bad) return bad;
  const ordered = orderRegulators(regulators);
  if (!ordered.ok) return ordered;

  const lines: DrawLine[] = [];
  for (const { item } of rows) {
    if (item.kind === "regulator") continue;
    const { volts, tolerancePercent } = rails.get(item.rail) ?? { volts: 0, tolerancePercent: 0 };
    const nominal = Math.abs(volts);
    lines.push(drawOfItem(item, { typical: nominal, worst: nominal * (1 + tolerancePercent / 100) }));
  }
  const madeHere = new Set(regulators.map(({ item }) => item.output));
  const draw = (supply: RailSupply): RailDraw => railDraw(supply, lines, input, madeHere.has(supply.name));
  for (const regulator of ordered.value) {
    const [from, to] = [rails.get(regulator.rail), rails.get(regulator.output)];
    if (from && to) lines.push(drawOfRegulator(regulator, draw(to), { ...from, volts: Math.abs(from.volts) }));
  }
  const used = [...rails.values()]
    .map(draw)
    .filter(({ lines: own, typed, passedOn }) => own.length > 0 || typed !== null || passedOn.worst > 0);
  return computed({ rails: used, heatW: heatOf(used), notes: notesOf(input.items) });
}

function railsOf(given: readonly RailSupply[], regulators: readonly { item: RegulatorItem }[]): Rails {
  const rails: Rails = new Map(given.map((rail) => [rail.name, rail]));
  for (const { item } of regulators) {
    const usual = { name: item.output, volts: item.outputVolts, tolerancePercent: USUAL_TOLERANCE_PERCENT };
    if (!rails.has(item.output)) rails.set(item.output, usual);
  }
  return rails;
}

function notesOf(items: readonly PowerItem[]): string[] {
  const packages = items.filter((item) => item.kind === "package");
  const named = (missing: (item: (typeof packages)[number]) => boolean) =>
    [...new Set(packages.filter(missing).map((item) => item.label))].join(", ");
  const [cpd, atRest] = [named((item) => item.cpdPf === null), named((item) => item.staticA === null)];
  return [
    ...(cpd ? [`No Cpd is known of ${cpd}: what switches inside is left out.`] : []),
    ...(atRest ? [`No current at rest is known of ${atRest}: it is left out.`] : []),
  ];
}
