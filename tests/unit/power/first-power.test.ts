import { describe, expect, test } from "vitest";
import type { CurrentWindow } from "@/lib/calc/power";
import { contactGroups } from "@/lib/power/contact-groups";
import { checkForRail, firstPowerOffer, otherLimit } from "@/lib/power/first-power";
import { cautionWith } from "@/lib/offer/caution-with";
import { reading } from "@/lib/check-kinds/reading/kind";

const WINDOW: CurrentWindow = {
  ...{ rail: "+5V", volts: 5, lowerA: 0.0123, expectedA: 0.0847, upperA: 0.1231, limitA: 0.16, rule: "" },
};

describe("what a first power is offered", () => {
  test("is rounded outwards to two digits: no figure of a budget is better", () => {
    expect(firstPowerOffer(WINDOW)).toMatchObject({ limits: "12 mA … 130 mA", expected: "85 mA" });
  });

  test("has no lower limit where nothing surely flows without a clock", () => {
    expect(firstPowerOffer({ ...WINDOW, lowerA: 0 }).limits).toBe("≤ 130 mA");
  });

  test("names the supply's limit in the caution, rail by rail", () => {
    expect(firstPowerOffer(WINDOW).caution.text).toBe(
      "Set the bench supply's limit for +5V to 160 mA before its output goes on.",
    );
  });

  test("reads as the form of a check would have it typed", () => {
    for (const lowerA of [0, 1e-6, 0.0123]) {
      const { fresh } = firstPowerOffer({ ...WINDOW, lowerA });
      expect(reading.readTyped(fresh.typed).ok).toBe(true);
    }
  });

  test("tells of another limit that the check's own words name", () => {
    const words = (title: string, instruction = "") => otherLimit({ title, instruction }, WINDOW);
    expect(words("Current at first power, limit 0.25 A")).toContain("0.25 A");
    expect(words("Current", "Set a current limit of 250 mA first.")).toContain("250 mA");
    expect(words("Current at first power, limit 0.16 A")).toBeUndefined();
    expect(words("Current at first power")).toBeUndefined();
  });
});

describe("the check that an offer begins with", () => {
  const check = (key: string, title: string) => ({ key, title, instruction: "" });

  test("is the one that names the rail, also with a space in it", () => {
    const checks = [check("a", "Current at first power"), check("b", "Current from +12 V")];
    expect(checkForRail(checks, "+12V", ["+5V", "+12V"])).toBe("b");
  });

  test("is, for the logic's rail, one that names no rail; for the others a new one", () => {
    const checks = [check("b", "Current from +12 V"), check("a", "Current at first power")];
    expect(checkForRail(checks, "+5V", ["+5V", "+12V", "-12V"])).toBe("a");
    expect(checkForRail(checks, "-12V", ["+5V", "+12V", "-12V"])).toBeNull();
  });
});

describe("the offered line of a caution", () => {
  const offered = {
    begins: "Set the bench supply's limit for +5V",
    text: "Set the bench supply's limit for +5V to 1 A.",
  };

  test("goes above what was there", () => {
    expect(cautionWith("Glasses on.", offered)).toBe(`${offered.text}\nGlasses on.`);
  });

  test("takes the place of its own earlier one, and leaves those of other rails", () => {
    const others = "Set the bench supply's limit for +12V to 0.2 A.\nGlasses on.";
    const before = `Set the bench supply's limit for +5V to 0.5 A.\n${others}`;
    expect(cautionWith(before, offered)).toBe(`${offered.text}\n${others}`);
  });
});

test("units of one design whose contacts carry the same stand in one line, the most loaded first", () => {
  const load = (label: string, rail: string, worstA: number) => ({
    ...{ placement: label, label, rail, contacts: 2, worstA, perContactA: worstA / 2, ratedA: 1.6 },
    ...{ verdict: "fits" as const, sentence: "" },
  });
  const groups = contactGroups([load("CON-01", "+5V", 0.1), load("SUP-01", "+5V", 0.4), load("CON-02", "+5V", 0.1)]);
  expect(groups.map(({ labels }) => labels)).toEqual([["SUP-01"], ["CON-01", "CON-02"]]);
});
