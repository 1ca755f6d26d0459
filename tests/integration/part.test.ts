import { randomUUID } from "node:crypto";
import { describe, expect, test } from "vitest";
import type { ProjectScope } from "@/lib/access/scope";
import { archivePart, restorePart } from "@/lib/part/archive-part";
import { loadParts } from "@/lib/part/load-parts";
import { savePart } from "@/lib/part/save-part";
import { savePartInput, stockPartInput, type SavePartTyped } from "@/lib/part/schema";
import { stockPart } from "@/lib/part/stock-part";
import { EMPTY_LOGIC } from "@/lib/part/type-logic";
import { givePartsList } from "@/lib/parts-list/give-parts-list";
import { loadPartsList } from "@/lib/parts-list/load-parts-list";
import { saveSpares } from "@/lib/parts-list/save-spares";
import { saveSparesInput } from "@/lib/parts-list/schema";
import { must, refusal } from "../support/bench";
import { useDatabase } from "../support/database";
import { FULL_ADDER, keepBlock, listBoard, planBoard } from "../support/parts";
import { makeBoard, makeProject, makeUnit } from "../support/project";

useDatabase();

const keep = (scope: ProjectScope, given: Partial<SavePartTyped>) =>
  savePart(
    scope,
    savePartInput.parse({
      project: scope.slug,
      writeId: randomUUID(),
      part: "",
      version: 0,
      number: "GAL cell",
      description: "",
      stock: "0",
      price: "",
      note: "",
      logic: null,
      ...given,
    }),
  );

const stock = (scope: ProjectScope, number: string, given: { stock: string; price: string; version: number }) =>
  stockPart(scope, stockPartInput.parse({ project: scope.slug, writeId: randomUUID(), number, ...given }));

const MAJORITY = {
  ...EMPTY_LOGIC,
  name: "Two majority gates",
  gateFunction: "majority3",
  pins: "14",
  gatesPerPackage: "2",
  inputsPerGate: "3",
  gates: "1 2 3 > 4\n8 9 10 > 11",
  source: "Own data sheet, June 2026",
};

describe("a part of the project’s own", () => {
  test("is counted with where no built-in part does its function", async () => {
    const { scopes } = await makeProject();
    const scope = scopes.builder;
    expect((await refusal(keepBlock(scope, { name: "Voter", gates: { majority3: 3 } }))).message).toContain(
      "no part does",
    );
    await must(keep(scope, { number: "MAJ3", logic: MAJORITY }));
    const { parts } = await loadParts(scope);
    expect(parts[0]).toMatchObject({
      number: "MAJ3",
      logic: { number: "MAJ3", gateFunction: "majority3", gatesPerPackage: 2 },
    });
    expect(parts[0]?.typedLogic).toEqual(MAJORITY);
    expect((await keepBlock(scope, { name: "Voter", gates: { majority3: 3 } })).ok).toBe(true);
  });

  test("cannot go while a block counts gates that nothing else does, and can come back", async () => {
    const { scopes } = await makeProject();
    const scope = scopes.builder;
    await must(keep(scope, { number: "MAJ3", logic: MAJORITY }));
    await must(keepBlock(scope, { name: "Voter", gates: { majority3: 3 } }));
    const id = (await loadParts(scope)).parts[0]?.id ?? "";
    const write = () => ({ project: scope.slug, writeId: randomUUID(), part: id });
    expect((await refusal(archivePart(scope, write()))).message).toContain("Voter counts gates of MAJ3");
    const { number, version } = await must(keep(scope, { number: "NOTE", description: "no logic" }));
    expect([number, version]).toEqual(["NOTE", 1]);
    const note = (await loadParts(scope)).parts.find((part) => part.number === "NOTE")?.id ?? "";
    await must(archivePart(scope, { ...write(), part: note }));
    expect((await loadParts(scope)).parts.find((part) => part.id === note)?.archived).toBe(true);
    await must(restorePart(scope, { ...write(), part: note }));
    expect((await loadParts(scope)).parts.find((part) => part.id === note)?.archived).toBe(false);
  });

  test("is refused with a number that is taken, and after somebody else changed it", async () => {
    const { scopes } = await makeProject();
    const scope = scopes.builder;
    await must(keep(scope, { number: "MAJ3" }));
    expect((await refusal(keep(scope, { number: "MAJ3" }))).fields?.number).toContain("in the list already");
    const id = (await loadParts(scope)).parts[0]?.id ?? "";
    await must(keep(scope, { part: id, version: 1, number: "MAJ3", stock: "4" }));
    expect(await refusal(keep(scope, { part: id, version: 1, number: "MAJ3", stock: "9" }))).toMatchObject({
      code: "conflict",
      details: { current: { stock: 4, version: 2 } },
    });
  });
});

/** One card with an adder in HC, to be built three times. */
async function ordered() {
  const project = await makeProject();
  const scope = project.scopes.builder;
  const board = await makeBoard(project, "SUM");
  const adder = await must(keepBlock(scope, FULL_ADDER));
  const { version } = await must(planBoard(scope, { board: "SUM", unitsPlanned: "3", blocks: { [adder.id]: 4 } }));
  await must(listBoard(scope, { board: "SUM", version, lines: [{ partNumber: "LED 3 mm", count: "8" }] }));
  return { project, scope, board };
}

describe("the parts list", () => {
  test("counts packages, their capacitors and other parts over the units to build, with spares", async () => {
    const { scope } = await ordered();
    const { lines, totals, problems } = await loadPartsList(scope, null);
    expect(problems).toEqual([]);
    expect(lines.map(({ part, needed, spares, toBuy }) => [part, needed, spares, toBuy])).toEqual([
      ["74HC86", 6, 1, 7],
      ["74HC08", 6, 1, 7],
      ["74HC32", 3, 1, 4],
      ["Capacitor 100 nF", 15, 2, 17],
      ["Capacitor 10 µF", 3, 1, 4],
      ["LED 3 mm", 24, 3, 27],
    ]);
    expect(totals.withoutPrice).toHaveLength(6);
  });

  test("takes off what is in stock, and costs what is left to buy", async () => {
    const { scope } = await ordered();
    await must(stock(scope, "74HC86", { stock: "5", price: "0,42", version: 0 }));
    await must(stock(scope, "74HC08", { stock: "50", price: "0.36", version: 0 }));
    const { lines, totals } = await loadPartsList(scope, null);
    const line = (part: string) => lines.find((one) => one.part === part);
    expect(line("74HC86")).toMatchObject({ stock: 5, toBuy: 2, costMinor: 84, priceTyped: "0.42", version: 1 });
    expect(line("74HC08")).toMatchObject({ toBuy: 0, costMinor: 0 });
    expect(totals.costMinor).toBe(84);
  });

  test("of boards without a plan for their number takes the units that are there", async () => {
    const { project, scope } = await ordered();
    const other = await makeBoard(project, "OUT");
    await must(listBoard(scope, { board: "OUT", version: 0, lines: [{ partNumber: "DAC", count: "1" }] }));
    expect((await loadPartsList(scope, "OUT")).lines).toMatchObject([{ part: "DAC", needed: 0, toBuy: 0 }]);
    await makeUnit(project.scopes.maintainer, other, "OUT-01");
    expect((await loadPartsList(scope, "out")).lines).toMatchObject([{ part: "DAC", needed: 1, spares: 1, toBuy: 2 }]);
  });

  test("keeps the share of spares, and refuses it from an old page", async () => {
    const { scope } = await ordered();
    const spares = (version: number, percent: string) =>
      saveSpares(scope, saveSparesInput.parse({ project: scope.slug, writeId: randomUUID(), version, percent }));
    await must(spares(0, "50 %"));
    expect((await loadPartsList(scope, null)).lines[0]).toMatchObject({ needed: 6, spares: 3 });
    expect(await refusal(spares(0, "20 %"))).toMatchObject({ details: { current: { percent: 50, version: 1 } } });
  });

  test("comes out as CSV that no spreadsheet takes for formulas", async () => {
    const { scope } = await ordered();
    const lines = [{ partNumber: '=cmd|" /C calc"!A1', count: "1", description: '+5 V, "quoted"' }];
    await must(listBoard(scope, { board: "SUM", version: 2, lines }));
    const answer = await givePartsList(scope, { project: scope.slug });
    if (!(answer instanceof Response)) throw new Error("no file");
    expect(answer.headers.get("content-disposition")).toMatch(/attachment; filename="[\w.-]+\.csv"/);
    const text = Buffer.from(await answer.arrayBuffer()).toString("utf8");
    expect(text.split("\r\n")[0]).toBe(
      "\ufeffPart,What it is,SUM x 3,Needed,Spares,In stock,To buy,Price of one (EUR),Cost (EUR)",
    );
    expect(text).toContain(`"'=cmd|"" /C calc""!A1","'+5 V, ""quoted""",3,3,1,0,4,,\r\n`);
    expect(await givePartsList(scope, { project: scope.slug, board: "NIX" })).toMatchObject({
      error: { code: "not-found" },
    });
  });
});

describe("stock and price", () => {
  test("typed by two people at once: the later one is shown the other’s, and may put theirs in its place", async () => {
    const { scope } = await ordered();
    const both = await Promise.all([
      stock(scope, "LED 3 mm", { stock: "10", price: "0.09", version: 0 }),
      stock(scope, "LED 3 mm", { stock: "12", price: "0.08", version: 0 }),
    ]);
    expect(both.filter(({ ok }) => ok)).toHaveLength(1);
    const refused = both.find(({ ok }) => !ok);
    expect(refused).toMatchObject({ error: { code: "conflict", details: { current: { version: 1 } } } });
    expect(await must(stock(scope, "LED 3 mm", { stock: "12", price: "", version: 1 }))).toEqual({
      stock: 12,
      price: "",
      version: 2,
    });
  });
});
