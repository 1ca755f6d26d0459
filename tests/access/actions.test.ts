import { randomUUID } from "node:crypto";
import { join } from "node:path";
import { describe, expect, it } from "vitest";

import type { Viewer } from "@/lib/access/scope";
import type { Answer } from "@/lib/actions/answer";
import type { Action } from "@/lib/actions/define-action";
import { useDatabase } from "../support/database";
import { makeViewer } from "../support/people";
import { accountRows } from "./action-rows/account";
import { boardRows } from "./action-rows/boards";
import { evidenceRows } from "./action-rows/evidence";
import { faultRows } from "./action-rows/faults";
import { orderRows } from "./action-rows/order";
import { partsRows } from "./action-rows/parts";
import { peopleRows } from "./action-rows/people";
import { pinMapRows } from "./action-rows/pin-maps";
import { probingRows } from "./action-rows/probing";
import { powerRows } from "./action-rows/power";
import { procedureRows } from "./action-rows/procedures";
import type { ProjectRow, Row, Rows } from "./action-rows/row";
import { travelerRows } from "./action-rows/travelers";
import { wiringPlanRows } from "./action-rows/wiring-plan";
import { actionFiles, root } from "./exported-actions";
import { makeMachine, type Machine } from "./machine";
import { MAY, ROLES } from "./permission-table";
import { contentsOf, wholeDatabase } from "./whole-database";

useDatabase();

const table: Record<string, Rows> = {
  ...accountRows,
  ...boardRows,
  ...evidenceRows,
  ...faultRows,
  ...orderRows,
  ...partsRows,
  ...peopleRows,
  ...pinMapRows,
  ...probingRows,
  ...powerRows,
  ...procedureRows,
  ...travelerRows,
  ...wiringPlanRows,
};
type Listed = { file: string; name: string; row: Row };
const listed: Listed[] = Object.entries(table).flatMap(([file, rows]) =>
  Object.entries(rows).map(([name, row]) => ({ file, name, row })),
);

const isAction = (value: unknown): value is Action<unknown, unknown> =>
  typeof value === "function" && "definition" in value && "as" in value;

async function exportsOf(file: string): Promise<Record<string, unknown>> {
  return import(/* @vite-ignore */ join(root, file));
}

async function actionOf({ file, name }: Listed): Promise<Action<unknown, unknown>> {
  const found = (await exportsOf(file))[name];
  if (!isAction(found)) throw new Error(`${file} exports no action ${name} made by defineAction()`);
  return found;
}

const codeOf = (answer: Answer<unknown>) => (answer.ok ? "ok" : answer.error.code);
const isOfProject = (row: Row): row is ProjectRow => "input" in row;

describe("The server actions", () => {
  it("are those of the table: a new one without a row fails here, and so does a row whose action is gone", async () => {
    const found = await Promise.all(
      actionFiles().map(async (file) => Object.keys(await exportsOf(file)).map((name) => `${file} ${name}`)),
    );
    expect(found.flat().sort()).toEqual(listed.map(({ file, name }) => `${file} ${name}`).sort());
  });

  it.each(listed)("declare their permission: $name of $file", async (one) => {
    expect((await actionOf(one)).definition.permission).toBe(one.row.permission);
  });

  it("have names of their own, by which logs tell them apart", async () => {
    const names = await Promise.all(listed.map(async (one) => (await actionOf(one)).definition.name));
    const twice = names.filter((name, at) => names.indexOf(name) !== at);
    // Signing out stands in the menu and beside an invitation to somebody else; both end the session that asks.
    expect(twice.filter((name) => name !== "sign-out")).toEqual([]);
  });
});

describe("An action on a project", () => {
  const ofProject = listed.flatMap(({ row, ...rest }) => (isOfProject(row) ? [{ ...rest, row }] : []));

  it.each(ofProject)("$name does it for the roles that may, and for nobody else", async (one) => {
    const action = await actionOf(one);
    const allowed = MAY[one.row.permission];
    const ask = async (machine: Machine, viewer: Viewer | undefined, input: object) =>
      codeOf(await action.as(viewer, { project: machine.slug, writeId: randomUUID(), ...input }));

    const machine = await makeMachine();
    const input = await one.row.input(machine);
    const before = await wholeDatabase();
    for (const role of ROLES.filter((each) => !allowed.includes(each))) {
      expect(await ask(machine, machine.viewers[role], input), `a ${role}`).toBe("forbidden");
    }
    expect(await ask(machine, machine.stranger, input), "a stranger").toBe("not-found");
    expect(await ask(machine, undefined, input), "nobody signed in").toBe("signed-out");
    expect(await wholeDatabase()).toEqual(before);

    for (const role of allowed) {
      const own: Machine = await makeMachine();
      expect(await ask(own, own.viewers[role], await one.row.input(own)), `a ${role}`).toBe("ok");
    }
  });

  it.each(ofProject)("$name reaches nothing in a project of other people through their own", async (one) => {
    const action = await actionOf(one);
    const theirs = await makeMachine();
    const input = await one.row.input(theirs);
    const mine = await makeMachine();
    const before = await contentsOf(theirs);
    // The maintainer of one project, with the ids of another.
    await action.as(mine.viewers.maintainer, { project: mine.slug, writeId: randomUUID(), ...input });
    expect(await contentsOf(theirs)).toEqual(before);
  });
});

describe("An action outside of projects", () => {
  const personal = listed.filter(({ row }) => !isOfProject(row));
  const nonsense = "not a form";

  it.each(personal)("$name asks for a session exactly when it is about one's own things", async (one) => {
    const action = await actionOf(one);
    const before = await wholeDatabase();
    const expected = one.row.permission === "own" ? "signed-out" : "invalid";
    expect(codeOf(await action.as(undefined, nonsense))).toBe(expected);
    expect(await wholeDatabase()).toEqual(before);
    expect(codeOf(await action.as(await makeViewer(), nonsense))).toBe("invalid");
  });
});
