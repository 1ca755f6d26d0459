import { database } from "@/db/client";
import { findReworkUnit } from "@/db/queries/reworks";
import type { ProjectScope } from "@/lib/access/scope";
import { ok, refuse, type Answer } from "@/lib/actions/answer";
import { findNeighbours, loadDoubtGround } from "./doubt-context";
import { doubtPreview, type DoubtPreview } from "./doubt-view";
import { judgeDoubt, withWireEnds } from "./judge-doubt";
import { loadPaces } from "./load-paces";
import type { PreviewReworkInput } from "./schema";

/** What would be in doubt if this rework were recorded now. Changes nothing. */
export async function previewRework(scope: ProjectScope, input: PreviewReworkInput): Promise<Answer<DoubtPreview>> {
  const db = database();
  const unit = await findReworkUnit(db, scope, input.unit);
  if (!unit) return refuse("not-found", `There is no unit ${input.unit} in this project.`);
  const [ground, paces] = await Promise.all([
    findNeighbours(db, scope, unit).then((neighbours) =>
      loadDoubtGround(db, scope, unit, { neighbours, touches: withWireEnds(input.touches, input.wire) }),
    ),
    loadPaces(db, scope),
  ]);
  return ok(doubtPreview(unit, judgeDoubt(unit, ground, input, paces)));
}
