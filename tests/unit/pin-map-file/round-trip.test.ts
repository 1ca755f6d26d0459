import fc from "fast-check";
import Papa from "papaparse";
import { describe, expect, it } from "vitest";
import { PIN_ROLES } from "@/lib/calc/interconnect";
import { pinTexts } from "@/lib/pin-map/read-pin-row";
import { composeFile } from "@/lib/pin-map-file/compose-file";
import { take, target } from "./take";

const word = fc.string({ unit: fc.constantFrom(..."ABab019+-_/.#~!*&$<>()"), minLength: 1, maxLength: 12 });
const line = fc
  .string({ unit: fc.constantFrom(..."aé µΩ,;\t\"'=+-@|01"), maxLength: 30 })
  .map((text) => text.replaceAll("\t", " ").trim());
const values = fc.record({
  signal: word,
  role: fc.constantFrom(...PIN_ROLES),
  family: fc.constantFrom("", "HC", "LS"),
  loads: fc.integer({ min: 0, max: 1000 }),
  enableGroup: line,
  pullUpOhm: fc.option(fc.double({ min: 1, max: 1e8, noNaN: true }).map((ohm) => Number(ohm.toPrecision(6)))),
  note: line,
});
const pinName = fc.tuple(fc.constantFrom("a", "b"), fc.integer({ min: 1, max: 32 })).map(([row, at]) => `${row}${at}`);
const maps = fc.dictionary(pinName, values, { maxKeys: 30 });

const kept = (map: Record<string, Omit<Parameters<typeof pinTexts>[0], "pin">>) =>
  Object.fromEntries(Object.entries(map).map(([pin, row]) => [pin, pinTexts({ pin, ...row })]));

describe("a pin map taken out as CSV", () => {
  it("comes back identical: onto itself nothing changes, onto an empty connector every pin is as it was", () => {
    fc.assert(
      fc.property(maps, maps, (one, other) => {
        const sources = [target("CON", "J1", kept(one)), target("TIM", "J1", kept(other))];
        const file = composeFile(sources);
        const again = take(file, sources);
        expect(again.bad).toEqual([]);
        expect(again.plan.targets.flatMap(({ changes }) => changes)).toEqual([]);
        const empty = take(file, [target("CON", "J1"), target("TIM", "J1")]);
        expect(empty.bad).toEqual([]);
        const came = empty.plan.targets.map(({ changes }) =>
          Object.fromEntries(changes.map(({ pin, after }) => [pin, after])),
        );
        expect(came).toEqual(sources.map((source) => source.kept));
      }),
      { numRuns: 200 },
    );
  });

  it("holds no cell that a spreadsheet would take for a formula", () => {
    fc.assert(
      fc.property(maps, (one) => {
        const file = composeFile([target("CON", "J1", kept(one))]);
        const cells = Papa.parse<string[]>(file, { delimiter: "," }).data.flat();
        for (const cell of cells) expect(cell).not.toMatch(/^[=+\-@\t]/);
      }),
      { numRuns: 100 },
    );
  });

  it("shows every pin of the face, so that the file can be filled in", () => {
    const lines = composeFile([target("CON", "J1", { a8: { signal: "+5V", role: "power" } })]).split("\r\n");
    expect(lines).toHaveLength(1 + 64 + 1);
    expect(lines[0]).toBe("\ufeffBoard,Connector,Pin,Signal,Role,Family,Loads,Enable group,Pull-up,Note");
    expect(lines[8]).toBe("CON,J1,a8,'+5V,power,,,,,");
  });
});

describe("whatever is in a file", () => {
  it("it is judged or refused, and never breaks the page", () => {
    const text = fc.string({ unit: fc.constantFrom(..."a1,;\t\"'\n\rPinSgl[7:0]|é"), maxLength: 200 });
    fc.assert(
      fc.property(text, (given) => {
        try {
          const { judged } = take(given, [target("CON", "J1")]);
          const lines = given.split(/\r\n?|\n/).length;
          for (const { line: at } of judged.bad) expect(at >= 1 && at <= lines).toBe(true);
        } catch (error) {
          expect(String(error)).toMatch(/never closes|no row|empty/);
        }
      }),
      { numRuns: 500 },
    );
  });
});
