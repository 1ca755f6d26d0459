import type { Queryable } from "@/db/client";
import {
  findConditions,
  findMachineBoards,
  findMachineConnectors,
  findMachinePins,
  findMachineSlots,
  findOwnFamilies,
  findRails,
  findSignals,
} from "@/db/queries/machine";
import { loadUntiedSpares } from "@/lib/board-plan/load-untied-spares";
import { faceOf } from "@/lib/calc/connector";
import {
  PIN_ROLES,
  SIGNAL_CLASSES,
  type BoardDesign,
  type DesignPin,
  type Machine,
  type SignalFacts,
} from "@/lib/calc/interconnect";
import { familiesOf } from "@/lib/family/families-of";
import { matingsOf, placementsOf } from "./placements";

type InProject = { projectId: string };

/** The whole machine as the calculations see it. Fifteen queries, whatever its size. */
export async function loadMachine(db: Queryable, scope: InProject): Promise<Machine> {
  const [boards, slots, connectors, pins, signals, rails, own, conditions, untied] = await Promise.all([
    findMachineBoards(db, scope),
    findMachineSlots(db, scope),
    findMachineConnectors(db, scope),
    findMachinePins(db, scope),
    findSignals(db, scope),
    findRails(db, scope),
    findOwnFamilies(db, scope),
    findConditions(db, scope),
    loadUntiedSpares(db, scope),
  ]);
  const byConnector = new Map<string, DesignPin[]>();
  for (const pin of pins) {
    const group = byConnector.get(pin.connectorId);
    if (group) group.push(designPin(pin));
    else byConnector.set(pin.connectorId, [designPin(pin)]);
  }
  const placed = placementsOf({ boards, slots, connectors });
  const matings = matingsOf({ boards, slots, connectors }, placed);
  const designs = boards.map((board): BoardDesign => ({
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
  return {
    boards: designs,
    placements: placed.map(({ id, board, label, slot }) => ({ id, board, label, slot })),
    matings,
    signals: signals.map(signalFacts),
    rails: rails.map(({ name, volts, tolerancePercent }) => ({ name, volts, tolerancePercent })),
    draws: [],
    families: familiesOf(own),
    conditions: { ambientC, logicVolts, logicRail, pinCapacitancePf },
  };
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
