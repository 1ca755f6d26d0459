import fc from "fast-check";
import { describe, expect, test } from "vitest";
import { escapeCell, unescapeCell } from "@/lib/pin-map/cell-escape";

describe("a cell on its way to a spreadsheet", () => {
  test.each([
    ["+5V", "'+5V"],
    ["-12V", "'-12V"],
    ['=HYPERLINK("x")', '\'=HYPERLINK("x")'],
    ["@sum", "'@sum"],
    ["\ttabbed", "'\ttabbed"],
    ["＝1", "'＝1"],
    ["'+5V", "''+5V"],
  ])("%j looks like a formula and is escaped", (text, escaped) => {
    expect(escapeCell(text)).toBe(escaped);
    expect(unescapeCell(escaped)).toBe(text);
  });

  test.each(["PH6", "", "A-B", "'quoted", "5V0", "~CS", "D[7:0]"])("%j goes as it is", (text) => {
    expect(escapeCell(text)).toBe(text);
    expect(unescapeCell(text)).toBe(text);
  });

  test("whatever goes out comes back identical, and nothing that goes out begins like a formula", () => {
    const beginnings = fc.constantFrom("", "'", "''", "=", "+", "-", "@", "\t", "'=", "''+", "＋");
    fc.assert(
      fc.property(beginnings, fc.string(), (start, rest) => {
        const text = start + rest;
        expect(unescapeCell(escapeCell(text))).toBe(text);
        expect(escapeCell(text)).not.toMatch(/^[=+\-@\t\r\n＝＋－＠]/);
      }),
    );
  });
});
