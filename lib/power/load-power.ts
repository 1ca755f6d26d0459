import { database } from "@/db/client";
import type { ProjectScope } from "@/lib/access/scope";
import { computed, type Computed } from "@/lib/calc/computed";
import {
  backplaneRail,
  currentWindows,
  machinePower,
  type BackplaneRail,
  type PoweredPlacement,
} from "@/lib/calc/power";
import { readMachine } from "@/lib/machine/load-machine";
import { conditionsNow } from "@/lib/plan-conditions/schema";
import { railNow } from "@/lib/rail/schema";
import { contactsOf } from "./contacts-of";
import { copperLoad } from "./copper-load";
import type { BoardView, PowerView, RailView } from "./power-view";

type Read = Awaited<ReturnType<typeof readMachine>>;

/** Everything that the power page shows: budgets of the boards, and the machine that they make together. */
export async function loadPower(scope: ProjectScope): Promise<PowerView> {
  const read = await readMachine(database(), scope);
  const rails = railViews(read);
  const worked = workOut(read, rails);
  return {
    conditions: conditionsNow.parse(read.conditions),
    rails,
    boards: boardViews(read),
    machine: worked.ok ? worked : { ok: false, message: worked.message },
    copper: copperOf(read, rails),
    slots: slotsOf(read),
    sources: read.power.boards.map(({ boardId, code }) => ({ id: boardId, code, name: nameOf(read, code) })),
  };
}

const nameOf = ({ machine }: Read, code: string): string => machine.boards.find((one) => one.code === code)?.name ?? "";

function boardViews(read: Read): BoardView[] {
  return read.power.boards.map(({ code, lines, alone, notes, problem }) => ({
    code,
    name: nameOf(read, code),
    units: read.machine.placements.filter(({ board }) => board === code).map(({ label }) => label),
    lines,
    power: alone,
    windows: alone ? currentWindows(alone) : [],
    notes,
    problem,
  }));
}

function railViews({ power, rails, machine }: Read): RailView[] {
  return power.rails.map(({ name, volts, tolerancePercent, capacityA, sourcePlacement }) => {
    const row = rails.find((rail) => rail.name === name);
    const kept = row ? railNow.parse(row) : null;
    const source = machine.placements.find(({ id }) => id === sourcePlacement);
    const sourceSlot = kept?.copper ? (source?.slot ?? 0) : null;
    return { name, volts, tolerancePercent, capacityA, kept, source: source?.board ?? null, sourceSlot };
  });
}

function slotsOf({ slots, machine }: Read): PowerView["slots"] {
  return slots.map(({ position }) => {
    const label = machine.placements.find(({ slot }) => slot === position)?.label ?? "empty";
    return { position, label };
  });
}

function copperOf({ power, machine }: Read, rails: readonly RailView[]): PowerView["copper"] {
  const found = rails.flatMap((rail) => {
    const taken = power.draws
      .filter((draw) => draw.rail === rail.name && draw.worstA > 0)
      .map(({ placement, worstA }) => ({
        slot: machine.placements.find(({ id }) => id === placement)?.slot ?? null,
        worstA,
      }));
    const load = copperLoad(rail, taken);
    return load ? [[rail.name, load] as const] : [];
  });
  return Object.fromEntries(found);
}

function workOut({ machine, power, conditions }: Read, views: readonly RailView[]) {
  const { ambientC } = conditions;
  const backplane = backplaneOf(views, ambientC);
  if (!backplane.ok) return backplane;
  const placements = machine.placements.map(({ id, label, board, slot }): PoweredPlacement => {
    const budget = power.boards.find(({ code }) => code === board);
    const draws = power.draws.filter((draw) => draw.placement === id && draw.worstA > 0);
    const contacts = contactsOf(machine, id);
    return { id, label, board, slot, draws, heatW: budget?.together?.heatW ?? null, contacts };
  });
  return machinePower({ rails: power.rails, placements, ambientC, backplane: backplane.value });
}

function backplaneOf(views: readonly RailView[], celsius: number): Computed<BackplaneRail[]> {
  const lines: BackplaneRail[] = [];
  for (const { name, kept, sourceSlot } of views) {
    if (!kept?.copper || sourceSlot === null) continue;
    const { segmentMm, widthMm, thicknessUm } = kept.copper;
    const line = backplaneRail(name, sourceSlot, { segmentMm, widthMm, copperUm: thicknessUm }, celsius);
    if (!line.ok) return line;
    lines.push(line.value);
  }
  return computed(lines);
}
