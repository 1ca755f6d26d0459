import { randomUUID } from "node:crypto";
import { database } from "@/db/client";
import { boards } from "@/db/schema/boards";
import { benchSessions, boardOrders } from "@/db/schema/order";
import type { ProjectScope } from "@/lib/access/scope";
import { one } from "../../support/database";
import type { Machine } from "../machine";
import type { Rows } from "./row";

async function anotherBoard({ id: projectId }: Machine): Promise<string> {
  const code = `B${randomUUID().slice(0, 6).toUpperCase()}`;
  return one(await database().insert(boards).values({ projectId, code, name: "Another" }).returning()).id;
}

async function withSaid(machine: Machine) {
  const [projectId, boardId, otherId] = [machine.id, machine.board.id, await anotherBoard(machine)];
  const row = { projectId, boardId, otherId, rule: "needs" as const };
  return { id: one(await database().insert(boardOrders).values(row).returning()).id };
}

/** Whoever asks has a session that runs, so that a refusal is one of a real stop. */
async function withSessions({ id: projectId, scopes }: Machine) {
  const people: ProjectScope[] = Object.values(scopes);
  const rows = people.map(({ viewer: { userId } }) => ({ projectId, userId }));
  await database().insert(benchSessions).values(rows);
  return {};
}

export const orderRows: Record<string, Rows> = {
  "app/(workshop)/projects/[project]/order/actions.ts": {
    sayBoardOrder: {
      permission: "prerequisite.edit",
      input: async (machine) => ({
        ...{ boardId: machine.board.id, otherId: await anotherBoard(machine) },
        ...{ rule: "needs", reason: "It needs the clock." },
      }),
    },
    withdrawBoardOrder: { permission: "prerequisite.edit", input: withSaid },
    startBenchSession: { permission: "attempt.record", input: () => ({}) },
    stopBenchSession: { permission: "attempt.record", input: withSessions },
  },
};
