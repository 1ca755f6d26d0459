import { randomUUID } from "node:crypto";
import { database } from "@/db/client";
import { slots, units } from "@/db/schema/boards";
import { logEntries } from "@/db/schema/evidence";
import { faults } from "@/db/schema/faults";
import { memberships } from "@/db/schema/projects";
import type { Role } from "@/db/schema/projects";
import { checkOf, must, send } from "../support/bench";
import { one } from "../support/database";
import { makeViewer } from "../support/people";
import { makeBoard, makeProject, makeUnit } from "../support/project";

/**
 * A small machine with something in every state that an action asks for: the hold point has passed, the plain check
 * has failed, the last one is untested. One person a role, and a second maintainer so that the first may leave.
 */
export async function makeMachine() {
  const project = await makeProject<Role>({ roles: ["maintainer", "builder", "collaborator"] });
  const stranger = await makeViewer({ name: "Otto" });
  const second = await makeViewer({ name: "Nora" });
  await database().insert(memberships).values({ projectId: project.id, userId: second.userId, role: "maintainer" });
  const board = await makeBoard(project, "TIM", [
    { title: "Look it over", stage: "inspection", holdPoint: true },
    { title: "Ground is one net", stage: "continuity" },
    { title: "Clock runs", stage: "function" },
  ]);
  const unit = await makeUnit(project.scopes.maintainer, board, "TIM-01");
  const [held, failed, untested] = [
    await checkOf(unit, "Look it over"),
    await checkOf(unit, "Ground is one net"),
    await checkOf(unit, "Clock runs"),
  ];
  const { builder } = project.scopes;
  const passing = randomUUID();
  const failing = randomUUID();
  await must(send(builder, held.id, { id: passing, record: { conforms: true } }));
  await must(send(builder, failed.id, { id: failing, record: { conforms: false }, note: "1 MΩ to the shield." }));
  const slot = one(
    await database().insert(slots).values({ projectId: project.id, position: 1, boardId: board.id }).returning(),
  );
  return {
    ...project,
    stranger,
    board,
    unit,
    slot,
    checks: { held: held.id, failed: failed.id, untested: untested.id },
    attempts: { passing, failing },
  };
}

export type Machine = Awaited<ReturnType<typeof makeMachine>>;

export async function makeLogEntry({ id: projectId, viewers }: Machine): Promise<string> {
  const entry = {
    id: randomUUID(),
    projectId,
    authorId: viewers.builder.userId,
    title: "First light",
    body: "It ran.",
  };
  await database().insert(logEntries).values(entry);
  return entry.id;
}

export async function makeFault({ id: projectId, unit }: Machine): Promise<{ id: string; number: number }> {
  const number = Math.floor(Math.random() * 1_000_000_000);
  const row = { projectId, unitId: unit.id, number, title: "Clock does not run" };
  return one(await database().insert(faults).values(row).returning({ id: faults.id, number: faults.number }));
}

/** A unit that nobody has given a traveler. */
export async function makeBareUnit({ id: projectId, board }: Machine, serial: string): Promise<string> {
  const row = { projectId, boardId: board.id, revisionId: board.revisionId, serial };
  return one(await database().insert(units).values(row).returning()).id;
}
