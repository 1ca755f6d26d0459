import { describe, expect, it } from "vitest";
import { readAsked } from "@/lib/order/read-asked";
import { readEvening } from "@/lib/order/read-evening";

const secondsOf = (typed: string) => {
  const read = readEvening(typed);
  return read.ok ? read.seconds : read.message;
};

describe("the time one has tonight", () => {
  it.each([
    ["45 minutes", 45],
    ["45min", 45],
    ["45", 45],
    [" 1 h ", 60],
    ["1.5 h", 90],
    ["1,5 h", 90],
    ["1 h 30", 90],
    ["1h30min", 90],
    ["2 hours 15 minutes", 135],
    ["1:30", 90],
    ["2:05 h", 125],
  ])("%s is %i minutes", (typed, minutes) => {
    expect(secondsOf(typed)).toBe(minutes * 60);
  });

  it.each(["", "a while", "30 1 h", "1 h 2 h", "1:75", "-5", "1 h 30 min 10"])("“%s” is none", (typed) => {
    expect(secondsOf(typed)).toContain("Write it such as 45 minutes");
  });

  it("is at least a minute and at most sixteen hours", () => {
    expect(secondsOf("0")).toContain("Less than a minute");
    expect(secondsOf("17 h")).toContain("More than 16 hours");
    expect(secondsOf("16 h")).toBe(57_600);
  });
});

describe("what the address asks for", () => {
  it("is forty-five minutes for one where it asks for nothing that can be read", () => {
    expect(readAsked({})).toEqual({ time: "45 minutes", builders: 1 });
    expect(readAsked({ time: ["1 h", "2 h"], builders: "2" })).toEqual({ time: "1 h", builders: 2 });
    expect(readAsked({ builders: "7", time: "x".repeat(999) })).toEqual({ time: "45 minutes", builders: 1 });
  });
});
