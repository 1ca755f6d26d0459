import fc from "fast-check";
import { describe, expect, it } from "vitest";
import type { JudgeContext } from "@/lib/check-kinds/kind";
import { CHECK_KINDS, checkKind } from "@/lib/check-kinds/list";

const context = (given: Partial<JudgeContext> = {}): JudgeContext => ({
  rule: "guarded",
  instrumentRanges: [],
  evidence: [],
  note: "",
  ...given,
});

function specOf(name: string, typed: unknown): unknown {
  const read = checkKind(name).readTyped(typed);
  if (!read.ok) throw new Error(JSON.stringify(read.fields));
  return read.value;
}

const TABLE = {
  columns: ["no load", "half load"],
  rows: [{ label: "+5 V", unit: "V", limits: "4.75 … 5.25 V", cells: ["", "> 4.8 V"] }],
};

const GOOD: Record<(typeof CHECK_KINDS)[number]["name"], unknown> = {
  statement: { expects: "no bridge" },
  reading: { unit: "Ω", limits: "< 0.5 Ω", expected: "0.1" },
  table: TABLE,
  photo: { expects: "solder side", minimum: "2" },
  capture: { expects: "CLK at U3 pin 9", windowOf: "A0 to S15 at 50 %", window: "120 … 260 ns" },
};

describe.each(CHECK_KINDS.map((kind) => [kind.name, kind] as const))("the kind %s", (name, kind) => {
  it("stores what was typed and gives it back to the form unchanged, also through JSON", () => {
    const spec = specOf(name, GOOD[name]);
    expect(kind.typedFromSpec(JSON.parse(JSON.stringify(spec)))).toEqual(GOOD[name]);
    expect(kind.expectation(spec)).not.toBe("");
  });

  it("never throws at what somebody sends for a form or an entry", () => {
    const spec = specOf(name, GOOD[name]);
    fc.assert(
      fc.property(fc.anything(), (raw) => {
        kind.readTyped(raw);
        const read = kind.readEntry(raw);
        const judged = kind.judge(spec, raw, context());
        if (!read.ok) expect(judged.ok).toBe(false);
      }),
    );
  });

  it("gives no verdict for an empty entry, and says in a sentence what is missing", () => {
    const spec = specOf(name, GOOD[name]);
    const judged = kind.judge(spec, kind.emptyEntry(spec), context({ note: "Nothing yet." }));
    expect(judged.ok).toBe(false);
    if (!judged.ok) expect(judged.message).toMatch(/\.$/);
  });
});

describe("a reading", () => {
  it("is judged by limits that leave their bound out, and an overload by the open side", () => {
    const short = specOf("reading", { unit: "Ω", limits: "< 0.5 Ω", expected: "" });
    const open = specOf("reading", { unit: "Ω", limits: "> 1 MΩ", expected: "" });
    const verdict = (spec: unknown, typed: string) => {
      const judged = checkKind("reading").judge(spec, { typed }, context());
      return judged.ok ? judged.verdict : judged.message;
    };
    expect(verdict(short, "0.49")).toBe("conforms");
    expect(verdict(short, "0.5")).toBe("does-not-conform");
    expect(verdict(open, "OL")).toBe("conforms");
    expect(verdict(short, "OL")).toBe("does-not-conform");
  });

  it("refuses limits that cannot be, at their field", () => {
    const read = checkKind("reading").readTyped({ unit: "V", limits: "5.25 … 4.75 V", expected: "five" });
    expect(read).toMatchObject({ ok: false, fields: { limits: expect.any(String), expected: expect.any(String) } });
    expect(checkKind("reading").readTyped({ unit: "furlong", limits: "1", expected: "" })).toMatchObject({
      ok: false,
      fields: { unit: expect.any(String) },
    });
    expect(checkKind("reading").readTyped({ unit: "V", limits: " ", expected: "" })).toMatchObject({
      ok: false,
      fields: { limits: expect.any(String) },
    });
  });
});

describe("a table", () => {
  it("names the cell that is no reading, and the row or column that is there twice", () => {
    const spec = specOf("table", TABLE);
    expect(checkKind("table").judge(spec, { cells: [["5.0", "x"]] }, context())).toMatchObject({
      ok: false,
      fields: { "cells.0.1": expect.any(String) },
    });
    expect(checkKind("table").judge(spec, { cells: [["5.0", "5.0", "5.0"]] }, context())).toMatchObject({ ok: false });
    const twice = { columns: ["a", "a"], rows: [{ label: "", unit: "V", limits: "x", cells: [] }] };
    const read = checkKind("table").readTyped(twice);
    expect(read).toMatchObject({
      ok: false,
      fields: {
        "columns.1": expect.any(String),
        "rows.0.label": expect.any(String),
        "rows.0.limits": expect.any(String),
      },
    });
    expect(checkKind("table").readTyped({ columns: [], rows: [] })).toMatchObject({
      ok: false,
      fields: { columns: expect.any(String) },
    });
  });

  it("is as bad as its worst cell", () => {
    const judged = checkKind("table").judge(specOf("table", TABLE), { cells: [["5.0", "4.7"]] }, context());
    expect(judged).toMatchObject({ ok: true, verdict: "does-not-conform" });
  });
});

describe("what the eye judges", () => {
  it("needs a note where it does not conform, and the evidence that the procedure asks for", () => {
    const photo = specOf("photo", GOOD.photo);
    const judge = (conforms: boolean, given: Partial<JudgeContext>) =>
      checkKind("photo").judge(photo, { conforms }, context(given)).ok;
    expect(judge(true, { evidence: ["photo"] })).toBe(false);
    expect(judge(true, { evidence: ["photo", "scope-picture"] })).toBe(false);
    expect(judge(true, { evidence: ["photo", "photo"] })).toBe(true);
    expect(judge(false, { evidence: ["photo", "photo"] })).toBe(false);
    expect(judge(false, { evidence: ["photo", "photo"], note: "C3 is turned." })).toBe(true);
  });
});

describe("a capture", () => {
  const kind = checkKind("capture");

  it("that was stored before there were windows still reads, and has none", () => {
    const old = { expects: "CLK at U3 pin 9" };
    expect(kind.expectation(old)).toBe("CLK at U3 pin 9");
    expect(kind.typedFromSpec(old)).toEqual({ ...old, windowOf: "", window: "" });
    expect(kind.readTyped(old)).toEqual({ ok: true, value: old });
  });

  it("says what is measured in it and within which limits", () => {
    expect(kind.expectation(specOf("capture", GOOD.capture))).toBe("CLK at U3 pin 9; A0 to S15 at 50 %: 120 … 260 ns");
  });

  it("has both what is measured and its limits, or neither", () => {
    const fieldsOf = (typed: object) => {
      const read = kind.readTyped({ expects: "", windowOf: "", window: "", ...typed });
      return read.ok ? "none" : Object.keys(read.fields);
    };
    expect(fieldsOf({ window: "120 … 260 ns" })).toEqual(["windowOf"]);
    expect(fieldsOf({ windowOf: "A0 to S15" })).toEqual(["window"]);
    expect(fieldsOf({ windowOf: "A0 to S15", window: "260 … 120 ns" })).toEqual(["window"]);
    expect(fieldsOf({ windowOf: "A0 to S15", window: "120 … 260" })).toEqual(["window"]);
    expect(fieldsOf({})).toBe("none");
  });
});
