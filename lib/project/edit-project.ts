import { eq } from "drizzle-orm";
import { projects } from "@/db/schema/projects";
import type { ProjectScope } from "@/lib/access/scope";
import { reject, type Answer } from "@/lib/actions/answer";
import { change } from "@/lib/event/change";
import { recordEvent } from "@/lib/event/record-event";
import type { EditProjectInput } from "./schema";

const NAMES = {
  name: "name",
  summary: "summary",
  timeZone: "time zone",
  decisionRule: "decision rule",
  layout: "rack or tower",
} as const;

/** Verdicts already given stay as they were: the decision rule holds for what is recorded from now on. */
export async function editProject(scope: ProjectScope, input: EditProjectInput): Promise<Answer<{ version: number }>> {
  const userId = scope.viewer.userId;
  return change({ writeId: input.writeId, userId, action: "edit-project" }, async (tx) => {
    const [current] = await tx.select().from(projects).where(eq(projects.id, scope.projectId)).for("update");
    if (!current) return reject("not-found", "There is no such project any more.");
    if (current.version !== input.version) {
      const { name, summary, timeZone, decisionRule, layout, version } = current;
      reject("conflict", "Somebody changed the settings meanwhile. Look at both and save again.", {
        details: { current: { name, summary, timeZone, decisionRule, layout, version } },
      });
    }
    const keys = ["name", "summary", "timeZone", "decisionRule", "layout"] as const;
    const changed = keys.filter((key) => current[key] !== input[key]);
    if (changed.length === 0) return { version: current.version };
    const { name, summary, timeZone, decisionRule, layout } = input;
    const version = current.version + 1;
    await tx
      .update(projects)
      .set({ name, summary, timeZone, decisionRule, layout, version })
      .where(eq(projects.id, scope.projectId));
    const what = changed.map((key) => NAMES[key]).join(", ");
    await recordEvent(tx, { projectId: scope.projectId, actorId: userId }, "project.edited", { what });
    return { version };
  });
}
