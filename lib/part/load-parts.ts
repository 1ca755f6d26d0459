import { database } from "@/db/client";
import { findConditions } from "@/db/queries/machine";
import { findParts } from "@/db/queries/parts";
import type { ProjectScope } from "@/lib/access/scope";
import type { LogicPart } from "@/lib/calc/logic-parts";
import { formatQuantity } from "@/lib/calc/units";
import { logicShape } from "./own-logic";
import { writeGateLines, writePins } from "./pin-lines";
import { priceText } from "./price";
import type { TypedLogic } from "./typed-logic";

export type PartLine = {
  id: string;
  number: string;
  description: string;
  stock: number;
  price: string;
  note: string;
  version: number;
  archived: boolean;
  logic: LogicPart | null;
  /** The same as a form shows it. */
  typedLogic: TypedLogic | null;
};
export type PartsView = { parts: PartLine[]; currency: string };

export async function loadParts(scope: ProjectScope): Promise<PartsView> {
  const db = database();
  const [rows, { currency }] = await Promise.all([findParts(db, scope), findConditions(db, scope)]);
  const parts = rows.map(
    ({ id, number, description, stock, priceCents, note, version, archivedAt, logic }): PartLine => {
      const read = logic === null ? null : logicShape.parse(logic);
      return {
        ...{ id, number, description, stock, note, version },
        price: priceText(priceCents),
        archived: archivedAt !== null,
        logic: read,
        typedLogic: read && typed(read),
      };
    },
  );
  return { parts, currency };
}

const write = (value: number | null, unit: "A" | "F" | "s") =>
  value === null ? "" : formatQuantity({ value, unit }, {}).replace("\u202f", " ");

function typed(part: LogicPart): TypedLogic {
  const { name, gateFunction, output, source } = part;
  return {
    ...{ name, gateFunction, output, source },
    pins: String(part.pins),
    gatesPerPackage: String(part.gatesPerPackage),
    inputsPerGate: String(part.inputsPerGate),
    outputsPerGate: String(part.outputsPerGate),
    bitsPerGate: String(part.bitsPerGate),
    gates: writeGateLines(part.pinout),
    sharedInputs: writePins(part.sharedInputs),
    sharedOutputs: writePins(part.sharedOutputs),
    unconnectedPins: writePins(part.unconnectedPins),
    powerPins: writePins(part.powerPins),
    groundPins: writePins(part.groundPins),
    inputPf: write(part.inputPf / 1e12, "F"),
    figures: Object.entries(part.perFamily).map(([family, figures]) => ({
      family,
      staticA: write(figures.staticA, "A"),
      cpdPf: write(figures.cpdPf === null ? null : figures.cpdPf / 1e12, "F"),
      cpdPer: figures.cpdPer,
      tpdTypicalS: write(figures.tpdTypicalS, "s"),
      tpdMaxS: write(figures.tpdMaxS, "s"),
      note: figures.note,
    })),
  };
}
