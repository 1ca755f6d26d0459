import { randomUUID } from "node:crypto";
import { database } from "@/db/client";
import { boards, revisions, units } from "@/db/schema/boards";
import { attachments, type AttachmentKind } from "@/db/schema/evidence";
import { procedureChecks, procedures, type Coverage, type Stage } from "@/db/schema/procedures";
import { memberships, projects, type DecisionRule, type Role } from "@/db/schema/projects";
import type { ProjectScope, Viewer } from "@/lib/access/scope";
import { checkKind } from "@/lib/check-kinds/list";
import { startTraveler } from "@/lib/traveler/start-traveler";
import { one } from "./database";
import { makeViewer, scopeFor } from "./people";

type MadeProject<Roles extends Role> = {
  id: string;
  slug: string;
  viewers: Record<Roles, Viewer>;
  scopes: Record<Roles, ProjectScope>;
};

const NAMES: Record<Role, string> = { maintainer: "Mira", builder: "Bram", collaborator: "Cleo" };

/** A project with one person a role, and the scope of each. */
export async function makeProject<Roles extends Role = "maintainer" | "builder">({
  roles,
  decisionRule = "guarded",
}: { roles?: readonly Roles[]; decisionRule?: DecisionRule } = {}): Promise<MadeProject<Roles>> {
  const db = database();
  const slug = `test-${randomUUID()}`;
  const { id } = one(
    await db.insert(projects).values({ slug, name: "Tide computer", decisionRule }).returning({ id: projects.id }),
  );
  const wanted: readonly Role[] = roles ?? ["maintainer", "builder"];
  const people = await Promise.all(
    wanted.map(async (role) => {
      const viewer = await makeViewer({ name: NAMES[role] });
      await db.insert(memberships).values({ projectId: id, userId: viewer.userId, role });
      return [role, viewer, await scopeFor(viewer, { slug })] as const;
    }),
  );
  // One person and one scope for every role that was asked for.
  const viewers = Object.fromEntries(people.map(([role, viewer]) => [role, viewer])) as Record<Roles, Viewer>;
  const scopes = Object.fromEntries(people.map(([role, , scope]) => [role, scope])) as Record<Roles, ProjectScope>;
  return { id, slug, viewers, scopes };
}

export type CheckGiven = {
  title: string;
  /** What the editor's form would hold; "4.75 … 5.25 V" is a reading in volts, nothing a statement. */
  limits?: string;
  kind?: string;
  typed?: unknown;
  stage?: Stage;
  holdPoint?: boolean;
  /** Titles of earlier checks. */
  needs?: string[];
  instruction?: string;
  covers?: Partial<Coverage>;
};

const NO_COVERAGE: Coverage = { signals: [], pins: [], rails: [], blocks: [] };

/** A board with revision A and an issued procedure of the given checks. */
export async function makeBoard(project: { id: string }, code: string, checks: readonly CheckGiven[] = []) {
  const db = database();
  const board = one(
    await db
      .insert(boards)
      .values({ projectId: project.id, code, name: `Board ${code}` })
      .returning(),
  );
  const revision = one(await db.insert(revisions).values({ boardId: board.id, letter: "A" }).returning());
  const keys = new Map<string, string>();
  await issueVersion(board.id, 1, checks, keys);
  return {
    ...board,
    revisionId: revision.id,
    keys,
    issue: (number: number, next: readonly CheckGiven[]) => issueVersion(board.id, number, next, keys),
  };
}

/** Checks keep their key from version to version by their title, or by `was` when they got another. */
async function issueVersion(
  boardId: string,
  number: number,
  checks: readonly (CheckGiven & { was?: string })[],
  keys: Map<string, string>,
) {
  const db = database();
  const procedure = one(
    await db.insert(procedures).values({ boardId, number, state: "issued", issuedAt: new Date() }).returning(),
  );
  if (checks.length === 0) return procedure;
  for (const { title, was } of checks) keys.set(title, keys.get(was ?? title) ?? randomUUID());
  await db.insert(procedureChecks).values(
    checks.map(
      ({ title, stage = "power-on", holdPoint = false, instruction = "", covers = {}, needs = [], ...rest }, index) => {
        const { kind, spec } = specOf(rest);
        const needed = needs.map((name) => keys.get(name) ?? name);
        const key = keys.get(title) ?? title;
        return {
          procedureId: procedure.id,
          key,
          position: index + 1,
          stage,
          title,
          instruction,
          holdPoint,
          kind,
          spec,
          covers: { ...NO_COVERAGE, ...covers },
          needs: needed,
        };
      },
    ),
  );
  return procedure;
}

function specOf({
  limits,
  kind = limits === undefined ? "statement" : "reading",
  typed,
}: Pick<CheckGiven, "limits" | "kind" | "typed">) {
  const form =
    typed ?? (limits === undefined ? checkKind(kind).emptyTyped : { unit: unitIn(limits), limits, expected: "" });
  const read = checkKind(kind).readTyped(form);
  if (!read.ok) throw new Error(`${kind}: ${JSON.stringify(read.fields)}`);
  return { kind, spec: read.value };
}

const unitIn = (limits: string) => /(Ω|A|V)\s*$/.exec(limits)?.[1] ?? "V";

/** A unit with its traveler; the ids of its checks by title. */
export async function makeUnit(
  scope: ProjectScope,
  board: { id: string; revisionId: string; projectId: string },
  serial: string,
) {
  const db = database();
  const unit = one(
    await db
      .insert(units)
      .values({ projectId: board.projectId, boardId: board.id, revisionId: board.revisionId, serial })
      .returning(),
  );
  await db.transaction((tx) => startTraveler(tx, scope, { id: unit.id, boardId: board.id, serial }));
  return unit;
}

/** A file that arrived and belongs to nothing yet. */
export async function makeEvidence(project: { id: string }, kind: AttachmentKind = "photo"): Promise<string> {
  const id = randomUUID();
  await database()
    .insert(attachments)
    .values({
      id,
      projectId: project.id,
      kind,
      objectKey: `test/${id}`,
      mediaType: "image/png",
      bytes: 10,
      sha256: "0".repeat(64),
      fileName: "photo.png",
      uploadId: randomUUID(),
    });
  return id;
}
