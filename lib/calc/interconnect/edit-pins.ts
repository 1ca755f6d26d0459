import type { Edit, PinAt } from "./finding";
import type { DesignPin } from "./machine";

type Change = Partial<Omit<DesignPin, "pin">>;

/** The same change to each of the pins; a design in several slots is changed once (settleFindings sees to it). */
export const editPins = (pins: readonly Pick<PinAt, "board" | "connectorId" | "pin">[], set: Change): Edit[] =>
  pins.map(({ board, connectorId, pin }) => ({ kind: "pin", board, connectorId, pin, set }));

/** Takes the pins off whatever they carry. */
export const clearPins = (pins: readonly Pick<PinAt, "board" | "connectorId" | "pin">[]): Edit[] =>
  editPins(pins, { signal: "", role: "no connection", family: "", loads: 0, enableGroup: "", pullUpOhm: null });
