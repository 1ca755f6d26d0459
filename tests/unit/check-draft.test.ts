import { describe, expect, test } from "vitest";
import { draftOf, emptyDraft, fieldsOf, problemsOf } from "@/components/procedure/check-draft";
import { CHECK_KINDS } from "@/lib/check-kinds/list";
import { inStageOrder } from "@/lib/procedure/check-row";
import { STARTERS } from "@/lib/procedure/starters/list";
import { readStarter } from "@/lib/procedure/starters/read-starter";

const rows = Object.values(STARTERS).flatMap((starter) =>
  readStarter(starter, () => crypto.randomUUID()).map((row, index) => ({ ...row, position: index + 1 })),
);

describe("the form of a check", () => {
  test("takes every check of every starter and gives it back unchanged, without a complaint", () => {
    for (const row of rows) {
      const draft = draftOf(row);
      expect(problemsOf(draft), row.title).toEqual({});
      const fields = fieldsOf(draft);
      const kind = CHECK_KINDS.find((one) => one.name === fields.kind);
      const read = kind?.readTyped(fields.typed);
      expect(read?.ok && read.value, row.title).toEqual(row.spec);
      expect(fields.covers).toEqual(row.covers);
    }
  });

  test("says under the field what is missing", () => {
    expect(problemsOf(emptyDraft("function"))).toEqual({ "check.title": "Say in one line what is checked." });
  });

  test("names the limits that cannot be read", () => {
    const draft = { ...emptyDraft("power-on"), title: "5 V at TP1", kind: "reading" as const };
    const problems = problemsOf({ ...draft, typed: { unit: "V", limits: "4.75 … five", expected: "" } });
    expect(Object.keys(problems)).toEqual(["check.typed.limits"]);
  });

  test("refuses a pin that is none", () => {
    const problems = problemsOf({ ...emptyDraft("continuity"), title: "CLK", pins: "J1 a4, CLK" });
    expect(problems["check.covers.pins"]).toMatch(/J1 a4/);
  });
});

test("a procedure never goes back a stage, whatever order is asked for", () => {
  const asked = [
    { key: "c", stage: "function" as const },
    { key: "a", stage: "inspection" as const },
    { key: "d", stage: "function" as const },
    { key: "b", stage: "inspection" as const },
  ];
  const order = inStageOrder(asked, ["inspection", "continuity", "power-on", "function", "integration"]);
  expect(order.map(({ key }) => key).join("")).toBe("abcd");
});
