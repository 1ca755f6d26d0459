import { and, eq } from "drizzle-orm";
import { z } from "zod";
import type { Transaction } from "@/db/client";
import { findBoardByCode, lockBoard } from "@/db/queries/boards";
import { findChecksOf, findProcedures } from "@/db/queries/procedures";
import { procedureChecks } from "@/db/schema/procedures";
import type { ProjectScope } from "@/lib/access/scope";
import { reject, RefusalError, type Answer } from "@/lib/actions/answer";
import { checkKind } from "@/lib/check-kinds/list";
import { change } from "@/lib/event/change";
import { beginDraft } from "@/lib/procedure/begin-draft";
import type { CheckRow } from "@/lib/procedure/check-row";
import { checkRow } from "@/lib/procedure/load-procedure";
import { closeDraft, openDraft } from "@/lib/procedure/open-draft";
import { readSpec } from "@/lib/procedure/read-check";
import { MOST_CAUTION, MOST_CHECKS } from "@/lib/procedure/schema";
import { cautionWith } from "./caution-with";
import type { OfferTaken, OfferToCheckInput } from "./schema";

/**
 * Puts what a calculation offers into one check of the board's draft, and begins the draft where there is none. Nothing
 * else of the draft changes, and no unit sees it before a maintainer issues the draft.
 */
export async function offerToCheck(scope: ProjectScope, input: OfferToCheckInput): Promise<Answer<OfferTaken>> {
  const userId = scope.viewer.userId;
  return change({ writeId: input.writeId, userId, action: "offer-to-check" }, async (tx) => {
    const begun = input.draftVersion === null ? await begin(tx, scope, input) : undefined;
    const version = input.draftVersion ?? begun?.version ?? 0;
    const { procedure, checks } = await openDraft(tx, scope, { board: input.board, version });
    const changed = input.target.is === "new" ? newCheck(input, input.target) : oldCheck(input, input.target, checks);
    const isNew = !checks.some((check) => check.key === changed.key);
    if (isNew && checks.length >= MOST_CHECKS) reject("invalid", `A procedure has at most ${MOST_CHECKS} checks.`);
    if (isNew) await tx.insert(procedureChecks).values({ ...changed, procedureId: procedure.id });
    else {
      await tx
        .update(procedureChecks)
        .set({ spec: changed.spec, instruction: changed.instruction, caution: changed.caution })
        .where(and(eq(procedureChecks.procedureId, procedure.id), eq(procedureChecks.key, changed.key)));
    }
    const rows = isNew ? [...checks, changed] : checks;
    return { key: changed.key, version: await closeDraft(tx, procedure.id, rows), begun: begun !== undefined };
  });
}

async function begin(tx: Transaction, scope: ProjectScope, input: OfferToCheckInput) {
  const named = await findBoardByCode(tx, scope, input.board.toUpperCase());
  const board = named ? await lockBoard(tx, scope, named.id) : undefined;
  if (!board) return reject("not-found", "There is no such board in this project.");
  if (board.archivedAt) reject("conflict", `${board.name} is archived. Restore it first.`);
  const all = await findProcedures(tx, scope, board.code);
  if (all.some((procedure) => procedure.state === "draft")) {
    reject("conflict", `Somebody began a draft for ${board.name} meanwhile. Reload the page and look at it first.`);
  }
  const newest = all.find((procedure) => procedure.state === "issued");
  if ((newest?.number ?? null) !== input.issuedNumber) {
    reject(
      "conflict",
      `The procedure of ${board.name} was issued anew meanwhile. Reload the page and look at it first.`,
    );
  }
  const checks = newest ? (await findChecksOf(tx, newest.id)).map(checkRow) : [];
  return beginDraft(tx, scope, { boardId: board.id, checks });
}

type Target<Is> = Extract<OfferToCheckInput["target"], { is: Is }>;

function newCheck({ caution }: OfferToCheckInput, { check }: Target<"new">): CheckRow {
  const { typed: _typed, ...fields } = check;
  const spec = specOf(check.kind, check.typed);
  const warned = warn(fields.caution, caution);
  return { key: crypto.randomUUID(), position: 0, ...fields, needs: [], spec, caution: warned };
}

function warn(caution: string, offered: OfferToCheckInput["caution"]): string {
  const text = offered ? cautionWith(caution, offered) : caution;
  return text.length > MOST_CAUTION ? reject("invalid", "The caution of this check is full. Shorten it first.") : text;
}

const formShape = z.record(z.string(), z.unknown());

function oldCheck({ caution }: OfferToCheckInput, target: Target<"existing">, checks: readonly CheckRow[]): CheckRow {
  const check = checks.find((one) => one.key === target.key);
  if (!check) return reject("not-found", "This check is not in the procedure any more. Reload the page.");
  const kind = checkKind(check.kind);
  const form = formShape.parse(kind.typedFromSpec(check.spec));
  const stray = Object.keys(target.typed).find((field) => !Object.hasOwn(form, field));
  if (stray !== undefined) reject("invalid", `A check of the kind “${kind.label}” has no field ${stray}.`);
  const spec = specOf(kind.name, { ...form, ...target.typed });
  return {
    ...check,
    spec,
    instruction: target.instruction ?? check.instruction,
    caution: warn(check.caution, caution),
  };
}

function specOf(kind: Parameters<typeof readSpec>[0]["kind"], typed: unknown): unknown {
  const spec = readSpec({ kind, typed });
  if (!spec.ok) throw new RefusalError(spec.error);
  return spec.value;
}
