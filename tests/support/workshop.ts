import { randomUUID } from "node:crypto";
import { database } from "@/db/client";
import { boards, revisions, units } from "@/db/schema/boards";
import { users } from "@/db/schema/people";
import { procedureChecks, procedures } from "@/db/schema/procedures";
import { memberships, projects, type Role } from "@/db/schema/projects";
import { checks, travelers } from "@/db/schema/travelers";
import { grant } from "@/lib/access/grant";
import type { Permission } from "@/lib/access/permissions";
import type { ProjectScope, Viewer } from "@/lib/access/scope";

/** A project of its own for one test file, with one person a role, one unit and one check on its traveler. */
export type Workshop = Awaited<ReturnType<typeof openWorkshop>>;

export async function addPerson(name: string): Promise<Viewer> {
  const email = `${name.toLowerCase()}-${randomUUID()}@example.org`;
  const [row] = await database().insert(users).values({ name, email, emailVerified: new Date() }).returning();
  if (!row) throw new Error("no person");
  return { userId: row.id, email, name, emailVerified: true, timeZone: "Europe/Berlin" };
}

export async function openWorkshop() {
  const db = database();
  const slug = `test-${randomUUID()}`;
  const [project] = await db.insert(projects).values({ slug, name: "Tide computer" }).returning();
  if (!project) throw new Error("no project");
  const projectId = project.id;
  const join = async (name: string, role: Role) => {
    const viewer = await addPerson(name);
    await db.insert(memberships).values({ projectId, userId: viewer.userId, role });
    return viewer;
  };
  const maintainer = await join("Mira", "maintainer");
  const builder = await join("Bram", "builder");
  const collaborator = await join("Cleo", "collaborator");

  const [board] = await db.insert(boards).values({ projectId, code: "CON", name: "Constituent" }).returning();
  if (!board) throw new Error("no board");
  const [revision] = await db.insert(revisions).values({ boardId: board.id, letter: "A" }).returning();
  const [procedure] = await db.insert(procedures).values({ boardId: board.id, number: 1, state: "issued" }).returning();
  if (!revision || !procedure) throw new Error("no procedure");
  const unit = await addUnit("CON-01");
  const check = await addCheck();

  async function addUnit(serial: string) {
    const ids = { projectId, boardId: board?.id ?? "", revisionId: revision?.id ?? "" };
    const [row] = await db
      .insert(units)
      .values({ ...ids, serial })
      .returning();
    if (!row) throw new Error("no unit");
    return row;
  }

  async function addCheck() {
    const procedureId = procedure?.id ?? "";
    const key = randomUUID();
    const covers = { signals: [], pins: [], rails: [], blocks: [] };
    const [line] = await db
      .insert(procedureChecks)
      .values({
        procedureId,
        key,
        position: 1,
        stage: "function",
        title: "Rise time of CLK",
        kind: "statement",
        spec: {},
        covers,
      })
      .returning();
    const [traveler] = await db.insert(travelers).values({ projectId, unitId: unit.id, procedureId }).returning();
    if (!line || !traveler) throw new Error("no traveler");
    const ids = { projectId, unitId: unit.id, travelerId: traveler.id, procedureCheckId: line.id };
    const [row] = await db
      .insert(checks)
      .values({ ...ids, key, position: 1, stage: "function" })
      .returning();
    if (!row) throw new Error("no check");
    return row;
  }

  /** What a use case is handed when this person asks for this. */
  async function scope(viewer: Viewer, permission: Permission = "project.see"): Promise<ProjectScope> {
    const granted = await grant(db, viewer, slug, permission);
    if (!granted.ok) throw new Error(granted.error.message);
    return granted.value;
  }

  return { slug, projectId, maintainer, builder, collaborator, unit, check, addUnit, scope };
}
