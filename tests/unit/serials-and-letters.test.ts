import { describe, expect, test } from "vitest";
import { nextLetter } from "@/lib/board/revision-letter";
import { slugFrom } from "@/lib/project/make-slug";
import { excerpt } from "@/lib/search/excerpt";
import { suggestSerial } from "@/lib/unit/suggest-serial";

describe("the next revision letter", () => {
  test.each([
    [[], "A"],
    [["A"], "B"],
    [["A", "B", "H"], "J"],
    [["N"], "P"],
    [["Y"], "AA"],
    [["AA"], "AB"],
    [["1", "A"], "B"],
  ])("after %j is %s", (letters, next) => expect(nextLetter(letters)).toBe(next));
});

describe("the suggested serial number", () => {
  test("counts on from the highest, whatever the gaps and the foreign ones", () => {
    expect(suggestSerial("TIM", [])).toBe("TIM-01");
    expect(suggestSerial("TIM", ["TIM-01", "TIM-07", "SPARE", "TIM-X"])).toBe("TIM-08");
    expect(suggestSerial("TIM", ["TIM-99"])).toBe("TIM-100");
  });
});

describe("the address of a project", () => {
  test.each([
    ["Tide computer", "tide-computer"],
    ["  Übergröße № 3! ", "ubergro-e-no-3"],
    ["潮汐", "project"],
    ["new", "project-new"],
    ["-", "project"],
  ])("of “%s” is %s", (name, slug) => expect(slugFrom(name)).toBe(slug));
});

test("an excerpt stands around the first word that was found", () => {
  const text = `${"Quiet evening. ".repeat(20)}The carry was stuck at **bit 8**. ${"More. ".repeat(30)}`;
  const cut = excerpt(text, ["carry"]);
  expect(cut).toContain("carry was stuck at bit 8");
  expect(cut.startsWith("…")).toBe(true);
  expect(cut.endsWith("…")).toBe(true);
});
