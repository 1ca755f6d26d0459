import { pinNamed, type Connector } from "@/lib/calc/connector";
import { isEmptyRow, PIN_COLUMNS, type PinColumn, type PinTexts } from "@/lib/pin-map/pin-columns";
import { readCell, type KnownNames } from "@/lib/pin-map/read-cell";
import { keptTexts, type ConnectorDraft, type KeptMap } from "../draft/pin-drafts";
import { textsOf, type PinKey } from "../grid/table-text";

/** A row of the table: one pin, what stands in its cells, and what is wrong with them. */
export type RowView = PinKey & {
  /** "CON J1", for tables of several connectors. */
  connector: string;
  texts: PinTexts;
  isChanged: boolean;
  /** A sentence by column; "pin" when the connector has no such pin. */
  problems: Partial<Record<PinColumn | "pin", string>>;
};

export type ConnectorRows = { id: string; name: string; face: Connector | undefined };

/** All pins of the face in its order, and after them pins that are kept or typed though the face has them not. */
export function rowsOf(
  connector: ConnectorRows,
  kept: KeptMap,
  draft: ConnectorDraft | undefined,
  known: KnownNames,
): RowView[] {
  const { id, name, face } = connector;
  const own = face?.pins.map((pin) => pin.name) ?? [];
  const used = [...Object.keys(kept[id]?.rows ?? {}), ...Object.keys(draft?.pins ?? {})];
  const strays = [...new Set(used)].filter((pin) => !face || !pinNamed(face, pin));
  return [...own, ...strays].map((pin): RowView => {
    const typed = draft?.pins[pin]?.typed;
    const texts = textsOf(keptTexts(kept, id, pin), typed);
    const problems = strays.includes(pin) ? strayProblem(name, pin, texts) : typed ? problemsIn(texts, known) : NONE;
    return { connectorId: id, pin, connector: name, texts, isChanged: typed !== undefined, problems };
  });
}

const NONE: RowView["problems"] = {};

function strayProblem(name: string, pin: string, texts: PinTexts): RowView["problems"] {
  return isEmptyRow(texts) ? NONE : { pin: `${name} has no pin ${pin}. Move what it carries, or empty the row.` };
}

function problemsIn(texts: PinTexts, known: KnownNames): RowView["problems"] {
  const problems: RowView["problems"] = {};
  for (const column of PIN_COLUMNS) {
    const read = readCell(column, texts[column], known);
    if (!read.ok) problems[column] = read.sentence;
  }
  return problems;
}

/** Rows are computed anew only for connectors whose kept rows or draft changed. */
export function rowCache() {
  const cache = new Map<string, { kept: unknown; draft: unknown; of: unknown; rows: RowView[] }>();
  return (connector: ConnectorRows, kept: KeptMap, draft: ConnectorDraft | undefined, known: KnownNames): RowView[] => {
    const found = cache.get(connector.id);
    if (found && found.kept === kept[connector.id] && found.draft === draft && found.of === connector)
      return found.rows;
    const rows = rowsOf(connector, kept, draft, known);
    cache.set(connector.id, { kept: kept[connector.id], draft, of: connector, rows });
    return rows;
  };
}
