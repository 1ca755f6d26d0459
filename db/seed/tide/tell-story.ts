import { and, eq, isNull } from "drizzle-orm";
import { z } from "zod";
import type { Database } from "@/db/client";
import { units } from "@/db/schema/boards";
import { procedureChecks } from "@/db/schema/procedures";
import { checks } from "@/db/schema/travelers";
import type { ProjectScope } from "@/lib/access/scope";
import { recordAttempt } from "@/lib/attempt/record-attempt";
import { voidAttempt } from "@/lib/attempt/void-attempt";
import { checkKind } from "@/lib/check-kinds/list";
import { reopenCheck } from "@/lib/check/reopen-check";
import { grantConcession } from "@/lib/concession/grant-concession";
import { eveningAt, type Happening } from "./calendar";
import type { CheckLine } from "./check-line";
import { generator } from "./drawings";
import { granted } from "./granted";
import { entryFor } from "./likely-reading";
import { BOARDS, UNITS } from "./machine";
import { STORY, type Deed, type Person } from "./story";
import type { Upload } from "./upload-picture";

export type Cast = Record<Person, { scope: ProjectScope; meter: string; scope100: string }>;

type Line = { line: CheckLine; checkId: string; spec: unknown };

/** Plays the story through the product's own use cases: every verdict and every state is really computed. */
export function storyHappenings(db: Database, cast: Cast, now: Date, upload: Upload): Happening[] {
  const chance = generator("tide");
  const minutesOf = new Map<string, number>();
  return STORY.flatMap((evening) =>
    evening.deeds.map((deed) => {
      const player = cast[evening.by];
      const clock = `${evening.daysAgo} ${evening.by}`;
      const minutes = (minutesOf.get(clock) ?? 4) + 4;
      minutesOf.set(clock, minutes);
      return {
        at: eveningAt(now, evening.daysAgo, minutes, player.scope.timeZone),
        work: async () => {
          const found = (await linesOf(db, player.scope, evening.serial)).get(deed.line);
          if (!found) throw new Error(`${evening.serial} has no check ${deed.line}`);
          await carryOut({ deed, found, serial: evening.serial, player, chance, upload });
        },
      };
    }),
  );
}

type Scene = { deed: Deed; found: Line; serial: string; player: Cast[Person]; chance: () => number; upload: Upload };

async function carryOut(scene: Scene): Promise<void> {
  const { deed, found, player } = scene;
  const { scope } = player;
  const on = { project: scope.slug, writeId: crypto.randomUUID(), checkId: found.checkId };
  if (deed.do === "reopen") granted(await reopenCheck(scope, { ...on, reason: deed.reason }));
  else if (deed.do === "concede") granted(await grantConcession(scope, { ...on, reason: deed.reason }));
  else await record(deed, scene);
}

async function record(deed: Extract<Deed, { do: "record" }>, scene: Scene): Promise<void> {
  const { found, serial, player, upload } = scene;
  const { line, checkId, spec } = found;
  const { scope } = player;
  const kind = checkKind(line.expect.kind);
  const picture = kind.requires(spec) ? await upload(scope, { checkId }, pictureOf(line, serial)) : undefined;
  const id = crypto.randomUUID();
  granted(
    await recordAttempt(scope, {
      project: scope.slug,
      id,
      checkId,
      performedAt: new Date(),
      record: recordOf(deed, line, spec, scene.chance),
      note: deed.note ?? "",
      instrumentId: kind.measured ? instrumentFor(line, player) : null,
      attachmentIds: picture ? [picture] : [],
    }),
  );
  if (!deed.voided) return;
  const slip = { project: scope.slug, writeId: crypto.randomUUID(), attemptId: id, reason: deed.voided };
  granted(await voidAttempt(scope, slip));
}

function recordOf(
  deed: Extract<Deed, { do: "record" }>,
  line: CheckLine,
  spec: unknown,
  chance: () => number,
): unknown {
  if (deed.typed !== undefined) return { typed: deed.typed };
  if (deed.fails) return { conforms: false };
  return entryFor(line.expect, spec, chance, limitsOf);
}

function instrumentFor(line: CheckLine, player: Cast[Person]): string {
  const quantity = line.expect.kind === "reading" ? line.expect.quantity : "";
  return ["Time", "Ripple", "Noise", "Duty factor"].includes(quantity) ? player.scope100 : player.meter;
}

function pictureOf(line: CheckLine, serial: string): string {
  const code = serial.slice(0, 3);
  if (line.id === "ripple-picture") return "scope-ripple";
  if (line.id === "phases") return "scope-phases";
  if (line.expect.kind === "capture") return line.id.startsWith("carry") ? "scope-carry" : "scope-clock";
  if (code === "BPL") return "backplane";
  if (code === "PAN") return "panel";
  return line.id === "solder-side" ? `solder-${code}` : `board-${code}`;
}

const readingSpec = z
  .object({
    unit: z.string(),
    limits: z.object({ value: z.object({ lower: z.number().optional(), upper: z.number().optional() }) }),
  })
  .transform(({ unit, limits }) => ({
    unit,
    limits: { lower: limits.value.lower ?? null, upper: limits.value.upper ?? null },
  }));
const tableSpec = z.object({ rows: z.array(readingSpec) });

function limitsOf(spec: unknown) {
  const table = tableSpec.safeParse(spec);
  return table.success ? table.data.rows : [readingSpec.parse(spec)];
}

/** The checks of a unit by the names that the story has for them. */
export async function linesOf(db: Database, scope: ProjectScope, serial: string): Promise<Map<string, Line>> {
  const unit = UNITS.find((one) => one.serial === serial);
  const board = BOARDS.find((one) => one.code === unit?.board);
  const rows = await db
    .select({ checkId: checks.id, position: checks.position, spec: procedureChecks.spec })
    .from(checks)
    .innerJoin(units, eq(units.id, checks.unitId))
    .innerJoin(procedureChecks, eq(procedureChecks.id, checks.procedureCheckId))
    .where(and(eq(checks.projectId, scope.projectId), eq(units.serial, serial), isNull(checks.retiredAt)));
  return new Map(
    rows.flatMap(({ checkId, position, spec }) => {
      const line = board?.lines[position - 1];
      return line ? [[line.id, { line, checkId, spec }] as const] : [];
    }),
  );
}
