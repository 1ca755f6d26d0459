import { eq, sql } from "drizzle-orm";
import { database } from "@/db/client";
import { boards, units } from "@/db/schema/boards";
import { attachments, logEntries } from "@/db/schema/evidence";
import { memberships, projects, type DecisionRule, type MachineLayout } from "@/db/schema/projects";
import { attempts } from "@/db/schema/travelers";
import type { ProjectScope } from "@/lib/access/scope";

export type ProjectSettingsView = {
  name: string;
  summary: string;
  timeZone: string;
  decisionRule: DecisionRule;
  layout: MachineLayout;
  version: number;
  archived: boolean;
  /** What a purge would take. */
  holds: { boards: number; units: number; attempts: number; files: number; logEntries: number; members: number };
};

export async function loadSettings(scope: ProjectScope): Promise<ProjectSettingsView> {
  const id = scope.projectId;
  const rowsOf = (
    table: typeof boards | typeof units | typeof attempts | typeof attachments | typeof logEntries | typeof memberships,
  ) => sql<number>`(select count(*) from ${table} where ${table.projectId} = ${id})`.mapWith(Number);
  const [row] = await database()
    .select({
      name: projects.name,
      summary: projects.summary,
      timeZone: projects.timeZone,
      decisionRule: projects.decisionRule,
      layout: projects.layout,
      version: projects.version,
      archivedAt: projects.archivedAt,
      holds: {
        boards: rowsOf(boards),
        units: rowsOf(units),
        attempts: rowsOf(attempts),
        files: rowsOf(attachments),
        logEntries: rowsOf(logEntries),
        members: rowsOf(memberships),
      },
    })
    .from(projects)
    .where(eq(projects.id, id));
  if (!row) throw new Error("a granted project has no row");
  const { archivedAt, ...rest } = row;
  return { ...rest, archived: archivedAt !== null };
}
