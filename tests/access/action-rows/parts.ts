import { randomUUID } from "node:crypto";
import { archiveBlock } from "@/lib/block/archive-block";
import { archiveDelayPath } from "@/lib/delay-path/archive-delay-path";
import { saveDelayPath } from "@/lib/delay-path/save-delay-path";
import { saveDelayPathInput } from "@/lib/delay-path/schema";
import { archivePart } from "@/lib/part/archive-part";
import { loadParts } from "@/lib/part/load-parts";
import { savePart } from "@/lib/part/save-part";
import { savePartInput } from "@/lib/part/schema";
import { must } from "../../support/bench";
import { keepBlock } from "../../support/parts";
import type { Machine } from "../machine";
import type { Rows } from "./row";

const permission = "parts.edit";
const write = ({ slug }: Machine) => ({ project: slug, writeId: randomUUID() });

const partForm = {
  part: "",
  version: 0,
  number: "27C256",
  description: "",
  stock: "2",
  price: "3.20",
  note: "",
  logic: null,
};

async function part(machine: Machine): Promise<string> {
  const { maintainer } = machine.scopes;
  await must(savePart(maintainer, savePartInput.parse({ ...write(machine), ...partForm })));
  return (await loadParts(maintainer)).parts[0]?.id ?? "";
}

const block = async ({ scopes }: Machine) =>
  (await must(keepBlock(scopes.maintainer, { name: "Inverter pair", gates: { inv: 2 } }))).id;

const plan = {
  board: "TIM",
  version: 0,
  packing: "pooled",
  family: "HC",
  clockHz: "1 MHz",
  activity: "25 %",
  loadPf: "50 pF",
  unitsPlanned: "",
};

const pathForm = {
  id: "",
  version: 0,
  name: "Reset",
  board: "TIM",
  path: {
    measure: "",
    steps: [{ part: "04", family: "HC", name: "", count: "2", minS: "", typicalS: "", maxS: "" }],
    unknownMinShare: "",
    unknownMaxShare: "",
    derating: null,
    clock: null,
  },
};

const path = async (machine: Machine) =>
  (await must(saveDelayPath(machine.scopes.maintainer, saveDelayPathInput.parse({ ...write(machine), ...pathForm }))))
    .id;

export const partsRows: Record<string, Rows> = {
  "app/(workshop)/projects/[project]/parts/actions.ts": {
    savePart: { permission, input: () => partForm },
    stockPart: { permission, input: () => ({ number: "74HC04", version: 0, stock: "6", price: "0.45" }) },
    archivePart: { permission, input: async (machine) => ({ part: await part(machine) }) },
    restorePart: {
      permission,
      input: async (machine) => {
        const id = await part(machine);
        await must(archivePart(machine.scopes.maintainer, { ...write(machine), part: id }));
        return { part: id };
      },
    },
    saveSpares: { permission, input: () => ({ version: 0, percent: "15 %" }) },
  },
  "app/(workshop)/projects/[project]/parts/blocks/actions.ts": {
    saveBlock: {
      permission,
      input: async (machine) => ({
        block: await block(machine),
        version: 1,
        name: "Inverter pair",
        summary: "",
        gates: [{ gateFunction: "inv", count: "3" }],
        children: [],
      }),
    },
    archiveBlock: { permission, input: async (machine) => ({ block: await block(machine) }) },
    restoreBlock: {
      permission,
      input: async (machine) => {
        const id = await block(machine);
        await must(archiveBlock(machine.scopes.maintainer, { ...write(machine), block: id }));
        return { block: id };
      },
    },
  },
  "app/(workshop)/projects/[project]/parts/boards/actions.ts": {
    saveBoardPlan: {
      permission,
      input: async (machine) => ({ ...plan, blocks: [{ block: await block(machine), count: "1" }] }),
    },
    saveBom: {
      permission,
      input: () => ({
        board: "TIM",
        version: 0,
        lines: [{ partNumber: "XO", description: "", count: "1", designators: "Y1" }],
      }),
    },
    tieSpares: { permission, input: () => ({ board: "TIM", version: 0, tied: true }) },
  },
  "app/(workshop)/projects/[project]/parts/delay/actions.ts": {
    saveDelayPath: { permission, input: () => pathForm },
    archiveDelayPath: { permission, input: async (machine) => ({ id: await path(machine) }) },
    restoreDelayPath: {
      permission,
      input: async (machine) => {
        const id = await path(machine);
        await must(archiveDelayPath(machine.scopes.maintainer, { ...write(machine), id }));
        return { id };
      },
    },
  },
};
