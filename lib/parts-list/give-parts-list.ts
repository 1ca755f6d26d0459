import type { ProjectScope } from "@/lib/access/scope";
import { refuse, type Answer } from "@/lib/actions/answer";
import { composeList } from "./compose-list";
import { loadPartsList } from "./load-parts-list";
import type { PartsListInput } from "./schema";

/** The parts list as a file for whoever takes the order. */
export async function givePartsList(scope: ProjectScope, input: PartsListInput): Promise<Answer<never> | Response> {
  const view = await loadPartsList(scope, input.board ?? null);
  if (input.board !== undefined && view.board === null) {
    return refuse("not-found", "There is no such board in this project.");
  }
  const name = `${scope.slug}-parts${view.board ? `-${view.board}` : ""}.csv`.replace(/[^\w.-]+/g, "_");
  return new Response(composeList(view), {
    headers: {
      "content-type": "text/csv; charset=utf-8; header=present",
      "content-disposition": `attachment; filename="${name}"`,
      "cache-control": "no-store",
      "x-content-type-options": "nosniff",
    },
  });
}
