import { and, asc, eq, sql } from "drizzle-orm";
import type { Transaction } from "@/db/client";
import { boards } from "@/db/schema/boards";
import { powerLines, rails } from "@/db/schema/power";

type InProject = { projectId: string };

/** All rails of the project, locked: names are unique among them, whatever their case. */
export async function lockRails(tx: Transaction, scope: InProject) {
  await tx.execute(sql`select pg_advisory_xact_lock(4111, hashtext(${scope.projectId}))`);
  return tx.select().from(rails).where(eq(rails.projectId, scope.projectId)).orderBy(asc(rails.position));
}

/** Codes of the boards in whose lines the rail stands, as what they take from or as what they make. */
export async function boardsOnRail(tx: Transaction, scope: InProject, name: string): Promise<string[]> {
  const rows = await tx
    .selectDistinct({ code: boards.code })
    .from(powerLines)
    .innerJoin(boards, eq(boards.id, powerLines.boardId))
    .where(and(eq(boards.projectId, scope.projectId), sql`${powerLines.item}->>'rail' = ${name}`))
    .orderBy(asc(boards.code));
  return rows.map(({ code }) => code);
}

/** Lines that take from a rail go with it when it gets another name. */
export async function renameRailInLines(tx: Transaction, scope: InProject, from: string, to: string): Promise<void> {
  for (const field of ["rail", "output"]) {
    await tx.execute(sql`
      update power_lines set item = jsonb_set(item, array[${field}]::text[], to_jsonb(${to}::text))
      where item->>${field} = ${from} and board_id in (select id from boards where project_id = ${scope.projectId})`);
  }
}
