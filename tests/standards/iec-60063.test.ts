import { describe, expect, it } from "vitest";
import {
  hundredsOf,
  nearestValue,
  nextDown,
  nextUp,
  SERIES_NAMES,
  type SeriesName,
  valuesBetween,
} from "@/lib/calc/preferred-values";

const tens = (series: SeriesName) => hundredsOf(series).map((value) => value / 10);
const byFormula = (steps: number) => Array.from({ length: steps }, (_, n) => Math.round(10 * 10 ** (n / steps)));

describe("IEC 60063, tables read on a page that reprints them", () => {
  it("E12 is 10 12 15 18 22 27 33 39 47 56 68 82", () => {
    expect(tens("E12")).toEqual([10, 12, 15, 18, 22, 27, 33, 39, 47, 56, 68, 82]);
  });

  it("E24 is E12 with one value between each two", () => {
    expect(tens("E24")).toEqual([
      10, 11, 12, 13, 15, 16, 18, 20, 22, 24, 27, 30, 33, 36, 39, 43, 47, 51, 56, 62, 68, 75, 82, 91,
    ]);
  });

  it("from memory: E6 is 10 15 22 33 47 68 and E3 is 10 22 47", () => {
    expect(tens("E6")).toEqual([10, 15, 22, 33, 47, 68]);
    expect(tens("E3")).toEqual([10, 22, 47]);
  });

  it.each(SERIES_NAMES)("%s has as many values in a decade as its name says, ascending", (series) => {
    const values = hundredsOf(series);
    expect(values).toHaveLength(Number(series.slice(1)));
    expect(new Set(values).size).toBe(values.length);
    expect([...values].sort((a, b) => a - b)).toEqual(values);
  });

  it("from memory: E192 has 920 where the formula gives 919.48", () => {
    expect(100 * 10 ** (185 / 192)).toBeCloseTo(919.48, 2);
    expect(hundredsOf("E192")[185]).toBe(920);
    expect(hundredsOf("E192")).not.toContain(919);
  });

  it("from memory: E48 starts 100 105 110 115 121 127 and E96 ends 931 953 976", () => {
    expect(hundredsOf("E48").slice(0, 6)).toEqual([100, 105, 110, 115, 121, 127]);
    expect(hundredsOf("E96").slice(-3)).toEqual([931, 953, 976]);
  });
});

describe("IEC 60063, computed", () => {
  const deviations = (series: SeriesName) =>
    byFormula(Number(series.slice(1))).flatMap((value, at) =>
      value === tens(series)[at] ? [] : [`${value}->${tens(series)[at]}`],
    );

  it("E24 departs from the formula in eight values, E12 in five", () => {
    expect(deviations("E24")).toEqual(["26->27", "29->30", "32->33", "35->36", "38->39", "42->43", "46->47", "83->82"]);
    expect(deviations("E12")).toEqual(["26->27", "32->33", "38->39", "46->47", "83->82"]);
  });

  it("E24 and E96 have 10, 11, 13, 15, 20 and 75 in common, and not 12, 22 or 47", () => {
    expect(hundredsOf("E24").filter((value) => hundredsOf("E96").includes(value))).toEqual([
      100, 110, 130, 150, 200, 750,
    ]);
    expect(hundredsOf("E96")).toEqual(expect.arrayContaining([121, 221, 475]));
  });

  it.each([
    [1770.35, 1800, 1800, 1780],
    [966.667, 1000, 1000, 976],
    [4660, 4700, 4700, 4640],
    [3162, 3300, 3300, 3160],
    [950, 1000, 910, 953],
  ])("the value nearest to %d Ω by ratio is %d in E12, %d in E24, %d in E96", (value, e12, e24, e96) => {
    expect(nearestValue("E12", value)).toEqual({ ok: true, value: e12 });
    expect(nearestValue("E24", value)).toEqual({ ok: true, value: e24 });
    expect(nearestValue("E96", value)).toEqual({ ok: true, value: e96 });
  });

  it("4498 goes to 4700 by ratio though 4300 is nearer by difference; 10 500 goes to 11 000", () => {
    expect(Math.abs(4498 - 4300)).toBeLessThan(Math.abs(4498 - 4700));
    expect(nearestValue("E24", 4498)).toEqual({ ok: true, value: 4700 });
    expect(nearestValue("E24", 4495)).toEqual({ ok: true, value: 4300 });
    expect(nearestValue("E24", 10_500)).toEqual({ ok: true, value: 11_000 });
  });

  it("9700 goes over the decade to 10 000 in E24; the border is 9539.4", () => {
    expect(nearestValue("E24", 9700)).toEqual({ ok: true, value: 10_000 });
    expect(nearestValue("E24", 9540)).toEqual({ ok: true, value: 10_000 });
    expect(nearestValue("E24", 9539)).toEqual({ ok: true, value: 9100 });
  });

  it("a lower limit takes the next value up, an upper limit the next down, whatever is nearest", () => {
    expect(nextUp("E12", 1001)).toEqual({ ok: true, value: 1200 });
    expect(nextDown("E12", 1770.35)).toEqual({ ok: true, value: 1500 });
    expect(nextUp("E12", 8300)).toEqual({ ok: true, value: 10_000 });
    expect(nextDown("E24", 9999)).toEqual({ ok: true, value: 9100 });
    expect(nextUp("E24", 4700)).toEqual({ ok: true, value: 4700 });
    expect(nextDown("E24", 4700)).toEqual({ ok: true, value: 4700 });
  });

  it("between 966.667 and 1770.33 Ω E12 has 1 k, 1.2 k and 1.5 k", () => {
    expect(valuesBetween("E12", 966.667, 1770.33)).toEqual([1000, 1200, 1500]);
    expect(valuesBetween("E6", 0.3, 20)).toEqual([0.33, 0.47, 0.68, 1, 1.5, 2.2, 3.3, 4.7, 6.8, 10, 15]);
  });
});
