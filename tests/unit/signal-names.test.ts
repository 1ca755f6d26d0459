import { describe, expect, test } from "vitest";
import { signalKey, signalKeys } from "@/lib/calc/signal-names";

describe("A signal is the same", () => {
  test.each([
    ["+5 V", "+5V"],
    ["+5 V", "5V"],
    ["+5V", "5V0"],
    ["+5V", "+5.0 V"],
    ["−12 V", "-12V"],
    ["- 12 V", "-12V"],
    ["+3.3 V", "3V3"],
    ["+3,3 V", "+3V3"],
    ["CLK", "clk"],
    ["D[7]", "D7"],
    [" PH6 ", "PH6"],
  ])("as %j and as %j", (one, other) => {
    expect(signalKey(one)).toBe(signalKey(other));
  });
});

describe("A signal is another", () => {
  test.each([
    ["+12 V", "-12 V"],
    ["+5 V", "+15 V"],
    ["3V3", "3V"],
    ["PH6", "PH60"],
    ["CS", "CS_N"],
    ["GND", "AGND"],
  ])("as %j than as %j", (one, other) => {
    expect(signalKey(one)).not.toBe(signalKey(other));
  });
});

describe("A bus range", () => {
  test("stands for each of its lines", () => {
    expect(signalKeys("ph[2:0]_n")).toEqual(["PH2_N", "PH1_N", "PH0_N"]);
  });

  test("of one line is that line, and a blank name is none", () => {
    expect(signalKeys("D[7]")).toEqual(["D7"]);
    expect(signalKeys("  ")).toEqual([]);
  });
});
