import { and, eq } from "drizzle-orm";
import type { Database } from "@/db/client";
import { boards } from "@/db/schema/boards";
import type { ProjectScope } from "@/lib/access/scope";
import { savePowerLine } from "@/lib/power/save-power-line";
import { savePowerLineInput, type SavePowerLineTyped } from "@/lib/power/schema";
import { saveConditions } from "@/lib/plan-conditions/save-conditions";
import { saveConditionsInput } from "@/lib/plan-conditions/schema";
import { saveRail } from "@/lib/rail/save-rail";
import { saveRailInput } from "@/lib/rail/schema";
import { eveningAt, type Happening } from "./calendar";
import { granted } from "./granted";

const write = (scope: ProjectScope) => ({ project: scope.slug, writeId: crypto.randomUUID() });

/** The bar of the backplane: slots at 5 HP, 6 mm of doubled copper. */
const BAR = { segmentMm: "25.4 mm", widthMm: "6 mm", thicknessUm: "70 µm" };
const TRACK = { segmentMm: "25.4 mm", widthMm: "2 mm", thicknessUm: "70 µm" };

const RAILS = [
  { name: "+5V", volts: "5 V", tolerancePercent: "5 %", capacityA: "1.5 A", ...BAR },
  { name: "+12V", volts: "12 V", tolerancePercent: "5 %", capacityA: "0.5 A", ...TRACK },
  { name: "-12V", volts: "-12 V", tolerancePercent: "5 %", capacityA: "0.3 A", ...TRACK },
];

const fixed = (label: string, rail: string, count: string, typicalA: string, worstA: string, atRest: string) =>
  ({ kind: "fixed", label, rail, count, typicalA, worstA, atRest }) as const;

const LINES: { board: string; typed: SavePowerLineTyped["typed"] }[] = [
  { board: "TIM", typed: fixed("Crystal oscillator Y1", "+5V", "1", "15 mA", "30 mA", "100 %") },
  {
    board: "TIM",
    typed: {
      kind: "pull-up",
      label: "Pull-up of BUSY_N",
      rail: "+5V",
      count: "1",
      ohm: "2k2",
      lowVolts: "0.3 V",
      lowTypical: "50 %",
      lowWorst: "100 %",
    },
  },
  { board: "SIN", typed: fixed("Memories U1, U2", "+5V", "2", "25 mA", "50 mA", "60 %") },
  { board: "OUT", typed: fixed("DAC and reference", "+12V", "1", "14 mA", "20 mA", "100 %") },
  { board: "OUT", typed: fixed("DAC and amplifiers", "-12V", "1", "9 mA", "14 mA", "100 %") },
  { board: "OUT", typed: fixed("Pen driver", "+12V", "1", "120 mA", "280 mA", "0 %") },
  {
    board: "PAN",
    typed: {
      kind: "led",
      label: "Phase lamps D1–D8",
      rail: "+5V",
      count: "8",
      forwardVolts: "2.1 V",
      ohm: "470 Ω",
      litTypical: "50 %",
      litWorst: "100 %",
    },
  },
];

/** Rails, what the machine takes for granted, and what draws current besides the packages. */
export function powerHappenings(db: Database, scope: ProjectScope, now: Date): Happening[] {
  const at = (minutes: number) => eveningAt(now, 59, minutes, scope.timeZone);
  return [
    {
      at: at(5),
      work: async () => {
        const warm = { ambientC: "35 °C", logicVolts: "5 V", logicRail: "+5V", pinCapacitancePf: "5 pF" };
        const rest = { sparesPercent: "10 %", currency: "EUR", version: 0 };
        granted(await saveConditions(scope, saveConditionsInput.parse({ ...write(scope), ...warm, ...rest })));
        const source = await supplyEntry(db, scope);
        for (const rail of RAILS) {
          granted(
            await saveRail(scope, saveRailInput.parse({ ...write(scope), rail: "", version: 0, source, ...rail })),
          );
        }
      },
    },
    {
      at: at(25),
      work: async () => {
        for (const { board, typed } of LINES) {
          const input = savePowerLineInput.parse({ ...write(scope), board, line: "", seen: null, typed });
          granted(await savePowerLine(scope, input));
        }
      },
    },
  ];
}

async function supplyEntry(db: Database, scope: ProjectScope): Promise<string> {
  const [row] = await db
    .select({ id: boards.id })
    .from(boards)
    .where(and(eq(boards.projectId, scope.projectId), eq(boards.code, "SUP")));
  if (!row) throw new Error("the demo has no supply entry");
  return row.id;
}
