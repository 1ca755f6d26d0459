import { eq } from "drizzle-orm";
import { describe, expect, it } from "vitest";
import { attempts, readings } from "@/db/schema/travelers";
import { checkOf, must, refusal, send } from "../support/bench";
import { one, useDatabase } from "../support/database";
import { makeInstrument } from "../support/people";
import { makeBoard, makeProject, makeUnit } from "../support/project";
import { pastTheHold, supplyBench } from "../support/supply-bench";

const db = useDatabase();

describe("a reading at the limits", () => {
  // 0.5 % of the reading and 2 counts of 10 mV: U at 5.25 V is about 53 mV (rectangular, k = 2).
  const RANGE = { unit: "V", fullScale: 20, resolution: 0.01, percentOfReading: 0.5, counts: 2, percentOfRange: 0 };

  it.each([
    ["4.749", "does-not-conform"],
    ["4.750", "conforms"],
    ["4.751", "conforms"],
    ["5.249", "conforms"],
    ["5.250", "conforms"],
    ["5.251", "does-not-conform"],
  ])("without an instrument %s V in 4.75 … 5.25 V %s", async (typed, verdict) => {
    const given = await supplyBench();
    const check = await pastTheHold(given);
    expect(await must(send(given.builder, check.id, { record: { typed } }))).toMatchObject({ verdict });
  });

  it.each([
    ["4.749", "does-not-conform"],
    ["4.750", "guard-band"],
    ["4.800", "guard-band"],
    ["4.802", "conforms"],
    ["5.196", "conforms"],
    ["5.198", "guard-band"],
    ["5.250", "guard-band"],
    ["5.251", "does-not-conform"],
  ])(
    "with a meter of ±(0.5 % + 2 counts) %s V in 4.75 … 5.25 V is %s under the guarded rule",
    async (typed, verdict) => {
      const given = await supplyBench();
      const check = await pastTheHold(given);
      const instrumentId = await makeInstrument(given.builder.viewer, [RANGE]);
      const answer = await must(send(given.builder, check.id, { record: { typed }, instrumentId }));
      expect(answer.verdict).toBe(verdict);
      const row = await checkOf(given.unit, "5 V rail, no load");
      expect(row).toMatchObject({
        state: verdict === "does-not-conform" ? "failed" : "passed",
        insideGuardBand: verdict === "guard-band",
      });
    },
  );

  it("conforms inside the guard band when the project decides by simple acceptance", async () => {
    const given = await supplyBench({ decisionRule: "simple" });
    const check = await pastTheHold(given);
    const instrumentId = await makeInstrument(given.builder.viewer, [RANGE]);
    expect(await must(send(given.builder, check.id, { record: { typed: "5.25" }, instrumentId }))).toMatchObject({
      verdict: "conforms",
    });
  });

  it("keeps the instrument's name and accuracy as they were, and takes nobody else's instrument", async () => {
    const given = await supplyBench();
    const check = await pastTheHold(given);
    const foreign = await makeInstrument(given.maintainer.viewer, [RANGE]);
    expect(
      await refusal(send(given.builder, check.id, { record: { typed: "5" }, instrumentId: foreign })),
    ).toMatchObject({
      code: "invalid",
      fields: { instrumentId: expect.any(String) },
    });
    const own = await makeInstrument(given.builder.viewer, [RANGE]);
    const answer = await must(send(given.builder, check.id, { record: { typed: "5" }, instrumentId: own }));
    const kept = one(await db.select().from(attempts).where(eq(attempts.id, answer.attemptId)));
    expect(kept.instrumentSnapshot).toEqual({ name: "Bench meter", ranges: [RANGE], calibrationNote: "" });
  });
});

describe("a table of readings", () => {
  const TYPED = {
    columns: ["no load", "half load"],
    rows: [
      { label: "+5 V", unit: "V", limits: "4.75 … 5.25 V", cells: ["", "4.9 … 5.1 V"] },
      { label: "+12 V", unit: "V", limits: "12 V ± 5 %", cells: ["", ""] },
    ],
  };

  it("goes by its worst cell, each cell by its own limits, and keeps every cell as a reading", async () => {
    const project = await makeProject();
    const board = await makeBoard(project, "PSU", [{ title: "Rails", kind: "table", typed: TYPED }]);
    const unit = await makeUnit(project.scopes.maintainer, board, "PSU-01");
    const check = await checkOf(unit, "Rails");
    const open = await refusal(send(project.scopes.builder, check.id, { record: { cells: [["5.0"], ["12", "12"]] } }));
    expect(open).toMatchObject({ code: "invalid", fields: { "cells.0.1": expect.any(String) } });
    const answer = await must(
      send(project.scopes.builder, check.id, {
        record: {
          cells: [
            ["5.2", "5.2"],
            ["12.1", "11.9"],
          ],
        },
      }),
    );
    expect(answer).toMatchObject({ verdict: "does-not-conform", state: "failed", summary: "1 of 4 do not conform" });
    const rows = await db
      .select()
      .from(readings)
      .where(eq(readings.attemptId, answer.attemptId))
      .orderBy(readings.position);
    expect(rows.map(({ label, verdict }) => [label, verdict])).toEqual([
      ["+5 V, no load", "conforms"],
      ["+5 V, half load", "does-not-conform"],
      ["+12 V, no load", "conforms"],
      ["+12 V, half load", "conforms"],
    ]);
  });
});
