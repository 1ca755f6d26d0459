import { eq } from "drizzle-orm";
import { powerLines } from "@/db/schema/power";
import type { ProjectScope } from "@/lib/access/scope";
import { reject, type Answer } from "@/lib/actions/answer";
import { change } from "@/lib/event/change";
import { recordEvent } from "@/lib/event/record-event";
import { refreshFindings } from "@/lib/machine/refresh-findings";
import { openLines, unchangedLine } from "./open-lines";
import type { RemovePowerLineInput } from "./schema";
import { lineWords } from "./line-kinds";

/** Takes a line off what a board draws. */
export async function removePowerLine(
  scope: ProjectScope,
  input: RemovePowerLineInput,
): Promise<Answer<{ what: string }>> {
  const { projectId, viewer } = scope;
  return change({ writeId: input.writeId, userId: viewer.userId, action: "remove-power-line" }, async (tx) => {
    const { board, lines } = await openLines(tx, scope, input.board);
    const { id, item } = unchangedLine(lines, input.line, input.seen);
    if (item.kind === "regulator") {
      const fed = lines.filter((line) => line.id !== id && line.item.rail === item.output);
      if (fed.length > 0) {
        reject("conflict", `Other lines take from ${item.output}, which this regulator makes. Change those first.`);
      }
    }
    await tx.delete(powerLines).where(eq(powerLines.id, id));
    const what = lineWords(item);
    const subject = { projectId, actorId: viewer.userId, subjectId: board.id };
    await recordEvent(tx, subject, "power.line-removed", { code: board.code, what });
    await refreshFindings(tx, scope);
    return { what };
  });
}
