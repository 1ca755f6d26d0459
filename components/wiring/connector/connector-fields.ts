import { z } from "zod";
import type { ConnectorGrid } from "@/lib/calc/connector";
import type { ConnectorView } from "@/lib/pin-map/load-wiring";

export const NONE = "none";

/** The form as it is typed: everything is text; the action's own schema says what is wrong with it. */
export const typedConnector = z.object({
  boardId: z.string().min(1, "Choose a board."),
  reference: z.string().trim().min(1, "Name the connector as the board does, such as J1."),
  type: z.string(),
  rows: z.string(),
  positions: z.string(),
  pitchMm: z.string(),
  slotId: z.string(),
  takes: z.string(),
  cabledTo: z.string(),
  position: z.string(),
});
export type TypedConnector = z.input<typeof typedConnector>;

const toNumber = (typed: string) =>
  /^\s*\d+([.,]\d+)?\s*$/.test(typed) ? Number(typed.replace(",", ".")) : Number.NaN;
const orNone = (id: string) => (id === NONE || id === "" ? null : id);

export type ConnectorValues = {
  reference: string;
  type: string;
  grid: ConnectorGrid | null;
  slotId: string | null;
  takes: string;
  cabledTo: string | null;
};

export function readConnector(typed: TypedConnector): ConnectorValues {
  const rows = typed.rows.split(/[\s,;]+/).filter((name) => name !== "");
  const grid = {
    rows: rows.length === 0 ? [""] : rows,
    positions: toNumber(typed.positions),
    pitchMm: toNumber(typed.pitchMm),
  };
  return {
    reference: typed.reference.trim(),
    type: typed.type,
    grid: typed.type === "grid" ? grid : null,
    slotId: orNone(typed.slotId),
    takes: typed.takes.trim() === "" ? "J1" : typed.takes.trim(),
    cabledTo: orNone(typed.cabledTo),
  };
}

type Shown = Pick<
  ConnectorView,
  "boardId" | "reference" | "type" | "grid" | "slotId" | "takes" | "cabledTo" | "position"
>;

export const writeConnector = (connector: Shown): TypedConnector => ({
  boardId: connector.boardId,
  reference: connector.reference,
  type: connector.type,
  rows: connector.grid?.rows.join(", ") ?? "a, b",
  positions: String(connector.grid?.positions ?? 16),
  pitchMm: String(connector.grid?.pitchMm ?? 2.54),
  slotId: connector.slotId ?? NONE,
  takes: connector.takes,
  cabledTo: connector.cabledTo ?? NONE,
  position: String(connector.position),
});

/** What a stale edit is answered with. */
export const currentConnector = z.object({
  reference: z.string(),
  type: z.string(),
  grid: z.object({ rows: z.array(z.string()), positions: z.number(), pitchMm: z.number() }).nullable(),
  slotId: z.string().nullable(),
  takes: z.string(),
  cabledTo: z.string().nullable(),
  position: z.number(),
  version: z.int(),
});
