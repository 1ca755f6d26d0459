import { and, eq } from "drizzle-orm";
import type { Database } from "@/db/client";
import { blocks } from "@/db/schema/parts";
import type { ProjectScope } from "@/lib/access/scope";
import { saveBlock } from "@/lib/block/save-block";
import { saveBlockInput } from "@/lib/block/schema";
import { saveBoardPlan } from "@/lib/board-plan/save-board-plan";
import { saveBom } from "@/lib/board-plan/save-bom";
import { saveBoardPlanInput, saveBomInput, tieSparesInput } from "@/lib/board-plan/schema";
import { tieSpares } from "@/lib/board-plan/tie-spares";
import { saveDelayPath } from "@/lib/delay-path/save-delay-path";
import { saveDelayPathInput } from "@/lib/delay-path/schema";
import { stockPartInput } from "@/lib/part/schema";
import { stockPart } from "@/lib/part/stock-part";
import { eveningAt, type Happening } from "./calendar";
import { granted } from "./granted";
import { BLOCKS, DELAYS, LATER_CHANGE, PLANS, STOCK, type BoardPlan, type DemoBlock } from "./parts-plan";

const write = (scope: ProjectScope) => ({ project: scope.slug, writeId: crypto.randomUUID() });

/** Blocks were drawn and packed before the first card was ordered; one of them changed after two cards had been built. */
export function partsHappenings(db: Database, scope: ProjectScope, now: Date): Happening[] {
  const at = (daysAgo: number, minutes: number) => eveningAt(now, daysAgo, minutes, scope.timeZone);
  return [
    {
      at: at(60, 5),
      work: async () => {
        for (const block of BLOCKS) await putBlock(db, scope, block);
      },
    },
    ...PLANS.map((plan, index) => ({ at: at(60, 20 + index), work: () => planBoard(db, scope, plan) })),
    {
      at: at(60, 40),
      work: async () => {
        for (const { number, stock, price } of STOCK) {
          const typed = { ...write(scope), number, version: 0, stock: String(stock), price };
          granted(await stockPart(scope, stockPartInput.parse(typed)));
        }
      },
    },
    {
      at: at(58, 10),
      work: async () => {
        for (const { name, board, measure, steps } of DELAYS) {
          const shares = { unknownMinShare: "25 %", unknownMaxShare: "200 %" };
          const path = { measure, steps, ...shares, derating: null, clock: null };
          const typed = { ...write(scope), id: "", version: 0, name, board, path };
          granted(await saveDelayPath(scope, saveDelayPathInput.parse(typed)));
        }
      },
    },
    { at: at(20, 15), work: () => putBlock(db, scope, LATER_CHANGE) },
  ];
}

async function findBlock(db: Database, scope: ProjectScope, name: string) {
  const [row] = await db
    .select({ id: blocks.id, version: blocks.version })
    .from(blocks)
    .where(and(eq(blocks.projectId, scope.projectId), eq(blocks.name, name)));
  return row;
}

async function blockId(db: Database, scope: ProjectScope, name: string): Promise<string> {
  const row = await findBlock(db, scope, name);
  if (!row) throw new Error(`the demo has no block ${name}`);
  return row.id;
}

async function counted(db: Database, scope: ProjectScope, uses: readonly { block: string; count: number }[]) {
  return Promise.all(
    uses.map(async ({ block, count }) => ({ block: await blockId(db, scope, block), count: String(count) })),
  );
}

async function putBlock(db: Database, scope: ProjectScope, { name, summary, gates, children = [] }: DemoBlock) {
  const there = await findBlock(db, scope, name);
  const typed = {
    ...write(scope),
    block: there?.id ?? "",
    version: there?.version ?? 0,
    name,
    summary,
    gates: gates.map(({ gateFunction, count }) => ({ gateFunction, count: String(count) })),
    children: await counted(db, scope, children),
  };
  granted(await saveBlock(scope, saveBlockInput.parse(typed)));
}

async function planBoard(db: Database, scope: ProjectScope, plan: BoardPlan) {
  const { board, packing, family, clockHz, activity, loadPf, unitsPlanned, blocks: uses, lines, sparesTied } = plan;
  const typed = {
    ...write(scope),
    board,
    version: 0,
    packing,
    family,
    clockHz,
    activity: `${activity * 100} %`,
    loadPf: `${loadPf} pF`,
    unitsPlanned: unitsPlanned === null ? "" : String(unitsPlanned),
    blocks: await counted(db, scope, uses),
  };
  const { version } = granted(await saveBoardPlan(scope, saveBoardPlanInput.parse(typed)));
  const others = lines.map((line) => ({ ...line, count: String(line.count) }));
  const bom = granted(await saveBom(scope, saveBomInput.parse({ ...write(scope), board, version, lines: others })));
  if (!sparesTied || uses.length === 0) return;
  granted(await tieSpares(scope, tieSparesInput.parse({ ...write(scope), board, version: bom.version, tied: true })));
}
