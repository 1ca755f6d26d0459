import { describe, expect, test } from "vitest";
import { CHECK_KINDS } from "@/lib/check-kinds/list";
import { STAGES } from "@/lib/procedure/stages";
import { STARTERS } from "@/lib/procedure/starters/list";
import { readStarter } from "@/lib/procedure/starters/read-starter";

const starters = Object.entries(STARTERS);

describe.each(starters)("the starter %s", (id, starter) => {
  let count = 0;
  const rows = readStarter(starter, () => `key-${(count += 1)}`);

  test("is read by the kinds' own schemas, every check of it", () => {
    expect(starter.id).toBe(id);
    expect(rows).toHaveLength(starter.checks.length);
  });

  test("covers all five stages, in their order", () => {
    const order = STAGES.map((stage) => stage.id);
    const met = rows.map((row) => order.indexOf(row.stage));
    expect(new Set(met).size).toBe(order.length);
    expect(met).toEqual([...met].sort((a, b) => a - b));
  });

  test("needs only checks that come earlier, so there can be no cycle", () => {
    rows.forEach((row, index) => {
      const earlier = rows.slice(0, index).map((other) => other.key);
      expect(earlier).toEqual(expect.arrayContaining(row.needs));
    });
  });

  test("holds before first power, and says beside it how to limit the current", () => {
    const first = starter.checks.find((check) => check.id === "first-power");
    expect(first?.holdPoint).toBe(true);
    expect(first?.caution).toMatch(/current limit/);
    const before = starter.checks.slice(
      0,
      starter.checks.findIndex((check) => check.id === "first-power"),
    );
    expect(before.filter((check) => check.holdPoint).length).toBeGreaterThan(1);
    expect(before.every((check) => check.stage === "inspection" || check.stage === "continuity")).toBe(true);
  });

  test("measures each rail to ground or each rail to rail while unpowered", () => {
    const kinds = starter.checks.filter((check) => check.stage === "continuity" && check.kind === "table");
    expect(kinds.length).toBeGreaterThan(0);
  });

  test("has titles and texts within the limits of the editor, and no two titles alike", () => {
    const titles = starter.checks.map((check) => check.title);
    expect(new Set(titles).size).toBe(titles.length);
    for (const check of starter.checks) {
      expect(check.title.length).toBeLessThanOrEqual(200);
      expect(check.instruction.length).toBeGreaterThan(20);
    }
  });
});

test("the starters together use every kind of check", () => {
  const used = new Set(starters.flatMap(([, starter]) => starter.checks.map((check) => check.kind)));
  expect([...used].sort()).toEqual(CHECK_KINDS.map((kind) => kind.name).sort());
});
