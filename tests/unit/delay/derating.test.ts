import { describe, expect, test } from "vitest";
import { delayOf, derated, family, messageOf, NS, path, step } from "./path";

describe("another load and supply than the data sheet's", () => {
  const gate = [step("74HC08", 1, 2, 7, 18)];
  const at = (name: string, volts: number, loadPf: number) =>
    delayOf(path(gate, { derating: derated(name, { volts, loadPf }) }));

  test("a heavier load slows by ln 2 · R · ΔC, R from the family's edge", () => {
    const { edgeS } = family("HC");
    const perPf = (Math.LN2 * edgeS) / (Math.log(9) * 50);
    expect(at("HC", 4.5, 150).worstCaseS).toBeCloseTo(18 * NS + 100 * perPf, 15);
    expect(at("HC", 5, 115).typicalS).toBeCloseTo(7 * NS + 100 * perPf, 15);
  });

  test("a lower supply slows CMOS in proportion, a higher one is not credited", () => {
    expect(at("HC", 4.5, 15).typicalS).toBeCloseTo((7 * NS * 5) / 4.5, 15);
    expect(at("HC", 5.5, 50).worstCaseS).toBeCloseTo(18 * NS, 15);
  });

  test("a higher supply quickens the lowest delay, so that the window does not start too late", () => {
    expect(at("HC", 5.5, 50).minS).toBeCloseTo((2 * NS * 4.5) / 5.5, 15);
  });

  test("bipolar parts do not follow the supply", () => {
    expect(at("LS", 4.75, 15).typicalS).toBeCloseTo(7 * NS, 15);
  });

  test("far from the stated supply the rule is refused", () => {
    const far = derated("HC", { volts: 3.3, loadPf: 50 });
    expect(messageOf(path(gate, { derating: far }))).toBe(
      "typicalAt: Delays stated at 5 V say nothing of 3.3 V: take those that the data sheet gives there.",
    );
    const none = derated("HC", { volts: 0, loadPf: 50 });
    expect(messageOf(path(gate, { derating: none }))).toContain("must be more than 0");
    expect(messageOf(path(gate, { derating: derated("HC", { volts: 5, loadPf: -1 }) }))).toContain(
      "must not be below 0",
    );
  });
});
