import { eq, sql } from "drizzle-orm";
import type { Transaction } from "@/db/client";
import { findChecksOf, lockDraft } from "@/db/queries/procedures";
import { procedureChecks, procedures } from "@/db/schema/procedures";
import type { ProjectScope } from "@/lib/access/scope";
import { reject } from "@/lib/actions/answer";
import { describeCircle, findCircle, waitsFor } from "@/lib/prerequisite/find-circle";
import { checkRow } from "./load-procedure";
import { inStageOrder, type CheckRow } from "./check-row";
import { STAGES } from "./stages";

type Asked = { board: string; version: number };

/** The draft, locked, if it is still the version that was looked at. */
export async function openDraft(tx: Transaction, scope: ProjectScope, asked: Asked) {
  const found = await lockDraft(tx, scope, asked.board.toUpperCase());
  if (!found) return reject("not-found", "This board has no draft any more. It may have been issued just now.");
  if (found.board.archivedAt) reject("conflict", `${found.board.name} is archived. Restore it first.`);
  const rows = await findChecksOf(tx, found.procedure.id);
  if (found.procedure.version !== asked.version) {
    reject("conflict", "Somebody changed this draft meanwhile. What you typed is still here; look at both.", {
      details: { current: { version: found.procedure.version, checks: rows.map(checkRow) } },
    });
  }
  return { procedure: found.procedure, board: found.board, checks: rows.map(checkRow) };
}

/** Puts the rows in stage order, refuses circles, stores the order, raises the version. */
export async function closeDraft(tx: Transaction, procedureId: string, rows: readonly CheckRow[]): Promise<number> {
  const ordered = inStageOrder(
    rows,
    STAGES.map((stage) => stage.id),
  );
  refuseCircles(ordered);
  const places = ordered.map((row, index) => ({ key: row.key, position: index + 1, was: row.position }));
  for (const { key, position } of places.filter((place) => place.position !== place.was)) {
    await tx
      .update(procedureChecks)
      .set({ position })
      .where(sql`${procedureChecks.procedureId} = ${procedureId} and ${procedureChecks.key} = ${key}`);
  }
  const [raised] = await tx
    .update(procedures)
    .set({ version: sql`${procedures.version} + 1` })
    .where(eq(procedures.id, procedureId))
    .returning({ version: procedures.version });
  return raised?.version ?? 0;
}

function refuseCircles(rows: readonly CheckRow[]): void {
  const placed = rows.map((row, index) => ({ ...row, id: row.key, unitId: "draft", position: index + 1 }));
  const edges = waitsFor(placed);
  for (const row of placed) {
    const circle = findCircle(edges, row.key);
    if (!circle) continue;
    const members = circle.flatMap((key) => placed.filter((other) => other.key === key));
    const sentence = describeCircle(members.map(({ title }) => ({ serial: "", title })));
    reject("conflict", `That would go round in a circle: ${sentence} Nothing was changed.`, {
      fields: { "check.needs": sentence },
    });
  }
}
