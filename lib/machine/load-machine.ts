import type { Queryable } from "@/db/client";
import {
  findConditions,
  findMachineBoards,
  findMachineConnectors,
  findMachinePins,
  findMachineSlots,
  findRails,
  findSignals,
} from "@/db/queries/machine";
import { findBomLines } from "@/db/queries/parts";
import { findPowerLines } from "@/db/queries/power";
import { loadDesigns } from "@/lib/board-plan/load-designs";
import { untiedSpares } from "@/lib/board-plan/untied-spares";
import { faceOf } from "@/lib/calc/connector";
import {
  PIN_ROLES,
  SIGNAL_CLASSES,
  type BoardDesign,
  type DesignPin,
  type Machine,
  type SignalFacts,
} from "@/lib/calc/interconnect";
import { planPower } from "@/lib/power/plan-power";
import { matingsOf, placementsOf } from "./placements";

type InProject = { projectId: string };

/** The whole machine as the calculations see it, and what its power is planned from. Sixteen queries, whatever its size. */
export async function readMachine(db: Queryable, scope: InProject) {
  const [designs, boards, slots, connectors, pins, signals, rails, conditions, lines, bom] = await Promise.all([
    loadDesigns(db, scope),
    findMachineBoards(db, scope),
    findMachineSlots(db, scope),
    findMachineConnectors(db, scope),
    findMachinePins(db, scope),
    findSignals(db, scope),
    findRails(db, scope),
    findConditions(db, scope),
    findPowerLines(db, scope),
    findBomLines(db, scope),
  ]);
  const placed = placementsOf({ boards, slots, connectors });
  const power = planPower({ designs, bom, lines, rails, conditions, placed });
  const untied = untiedSpares(designs);
  const byConnector = groupPins(pins);
  const designed = boards.map((board): BoardDesign => ({
    code: board.code,
    name: board.name,
    kind: board.kind,
    connectors: connectors
      .filter((connector) => connector.boardId === board.id)
      .flatMap((connector) => {
        const face = faceOf(connector);
        const { id, reference } = connector;
        return face ? [{ id, reference, face, pins: byConnector.get(id) ?? [] }] : [];
      }),
    untiedSpares: untied.get(board.code) ?? [],
  }));
  const { ambientC, logicVolts, logicRail, pinCapacitancePf } = conditions;
  const machine: Machine = {
    boards: designed,
    placements: placed.map(({ id, board, label, slot }) => ({ id, board, label, slot })),
    matings: matingsOf({ boards, slots, connectors }, placed),
    signals: signals.map(signalFacts),
    rails: rails.map(({ name, volts, tolerancePercent }) => ({ name, volts, tolerancePercent })),
    draws: power.draws,
    families: designs.families,
    conditions: { ambientC, logicVolts, logicRail, pinCapacitancePf },
  };
  return { machine, power, rails, conditions, slots };
}

export const loadMachine = async (db: Queryable, scope: InProject): Promise<Machine> =>
  (await readMachine(db, scope)).machine;

function groupPins(pins: readonly PinRow[]): Map<string, DesignPin[]> {
  const byConnector = new Map<string, DesignPin[]>();
  for (const pin of pins) {
    const group = byConnector.get(pin.connectorId);
    if (group) group.push(designPin(pin));
    else byConnector.set(pin.connectorId, [designPin(pin)]);
  }
  return byConnector;
}

type PinRow = Awaited<ReturnType<typeof findMachinePins>>[number];

export function designPin({ pin, signal, role, family, loads, enableGroup, pullUpOhm }: PinRow): DesignPin {
  const known = PIN_ROLES.find((one) => one === role) ?? "passive";
  return { pin, signal, role: known, family, loads, enableGroup, pullUpOhm };
}

type SignalRow = Awaited<ReturnType<typeof findSignals>>[number];

export function signalFacts({ name, class: kind, aliases, frequencyHz }: SignalRow): SignalFacts {
  return { name, class: SIGNAL_CLASSES.find((one) => one === kind) ?? "data", aliases, frequencyHz };
}
