import { findConnector, type Connector } from "@/lib/calc/connector";
import type { DesignPin, Machine } from "@/lib/calc/interconnect";
import { FAMILIES } from "@/lib/calc/levels";
import type { ConnectorView, WiringSlot } from "@/lib/pin-map/load-wiring";

export function face(id: string): Connector {
  const found = findConnector(id);
  if (!found) throw new Error(`${id} is not in the list`);
  return found;
}

export const pin = (
  name: string,
  signal: string,
  role: DesignPin["role"],
  more: Partial<DesignPin> = {},
): DesignPin => ({
  ...{ pin: name, signal, role, family: "HC", loads: 0, enableGroup: "", pullUpOhm: null },
  ...more,
});

/** Two cards of one design in slots 1 and 2 of a backplane, whose third slot is empty. */
export function rack(pins: DesignPin[] = [pin("a10", "PH6", "push-pull output")]): Machine {
  const c64 = face("din41612-c64");
  const slot = (id: string, reference: string) => ({
    ...{ id, reference, face: c64 },
    pins: [pin("a10", "PH6", "passive", { family: "" })],
  });
  return {
    boards: [
      {
        code: "BP",
        name: "Backplane",
        kind: "backplane",
        connectors: [slot("x1", "X1"), slot("x2", "X2"), { id: "x3", reference: "X3", face: c64, pins: [] }],
        untiedSpares: [],
      },
      {
        code: "CON",
        name: "Constituent",
        kind: "card",
        connectors: [{ id: "j1", reference: "J1", face: c64, pins }],
        untiedSpares: [],
      },
    ],
    placements: [
      { id: "board BP", board: "BP", label: "BP-01", slot: null },
      { id: "slot 1", board: "CON", label: "CON-01", slot: 1 },
      { id: "slot 2", board: "CON", label: "CON in slot 2", slot: 2 },
    ],
    matings: [
      { from: { placement: "board BP", connector: "x1" }, to: { placement: "slot 1", connector: "j1" } },
      { from: { placement: "board BP", connector: "x2" }, to: { placement: "slot 2", connector: "j1" } },
    ],
    signals: [],
    rails: [{ name: "+5V", volts: 5, tolerancePercent: 5 }],
    draws: [],
    families: FAMILIES,
    conditions: { ambientC: 40, logicVolts: 5, logicRail: "+5V", pinCapacitancePf: 5 },
  };
}

export const SLOTS: WiringSlot[] = [1, 2, 3].map((position) => ({ id: `s${position}`, position, boardId: null }));

export const connectorViews = (): ConnectorView[] =>
  [
    { id: "x1", reference: "X1", code: "BP", slotId: "s1" },
    { id: "x2", reference: "X2", code: "BP", slotId: "s2" },
    { id: "x3", reference: "X3", code: "BP", slotId: "s3" },
    { id: "j1", reference: "J1", code: "CON", slotId: null },
  ].map((one, index) => ({
    ...one,
    ...{ boardId: one.code, boardName: one.code, kind: one.code === "BP" ? "backplane" : "card", type: "din41612-c64" },
    ...{ grid: null, position: index + 1, takes: "J1", cabledTo: null, version: 1, notes: {} },
  }));
