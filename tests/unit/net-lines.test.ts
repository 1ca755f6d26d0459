import { describe, expect, it } from "vitest";
import { filterNets, netLines, netNamed } from "@/components/wiring/nets/net-lines";
import { threeDigits } from "@/components/wiring/nets/three-digits";
import { checkMachine, type Finding } from "@/lib/calc/interconnect";
import type { FindingView } from "@/lib/finding/load-findings";
import { input, pushPull, rack } from "../support/small-machine";

const machine = rack({
  cards: {
    TIM: { a10: pushPull("PH6"), a11: pushPull("CLK") },
    CON: { a10: pushPull("PH6"), a11: input("CLK"), b20: input("LOOSE") },
  },
  more: { signals: [{ name: "CLK", class: "clock", aliases: ["CK"], frequencyHz: 1e6 }] },
});
const asViewed = (finding: Finding, accepted: FindingView["accepted"] = null): FindingView => ({
  ...finding,
  foundAt: "2026-02-03T19:40:00Z",
  accepted,
});
const { findings } = checkMachine(machine);
const open = netLines(
  machine,
  findings.map((finding) => asViewed(finding)),
);
const EVERY = { search: "", class: null, problem: "any" } as const;
const names = (lines: typeof open) => lines.map(({ net }) => net.name).sort();

describe("the list of nets", () => {
  it("has each net once, with the cards that it touches in the order of their slots", () => {
    expect(names(open)).toEqual(["CLK", "LOOSE", "PH6"]);
    expect(netNamed(open, "CLK")?.touches).toHaveLength(2);
  });

  it("marks a net with the weightiest thing that is found on it, unless that is accepted", () => {
    expect(netNamed(open, "PH6")?.weight).toBe("must");
    const accepted = netLines(
      machine,
      findings.map((finding) => asViewed(finding, { by: "Mira", at: "2026-02-03T19:40:00Z", reason: "Fine." })),
    );
    expect(netNamed(accepted, "PH6")?.weight).toBeNull();
    expect(netNamed(accepted, "PH6")?.findings.length).toBeGreaterThan(0);
  });

  it("is searched by name, other name, and card", () => {
    expect(names(filterNets(open, { ...EVERY, search: "ck" }))).toEqual(["CLK"]);
    expect(names(filterNets(open, { ...EVERY, search: "clk tim" }))).toEqual(["CLK"]);
    expect(names(filterNets(open, { ...EVERY, search: "nowhere" }))).toEqual([]);
  });

  it("is narrowed by class and by findings", () => {
    expect(names(filterNets(open, { ...EVERY, class: "clock" }))).toEqual(["CLK"]);
    expect(names(filterNets(open, { ...EVERY, problem: "must" }))).toContain("PH6");
    const [found, none] = [
      filterNets(open, { ...EVERY, problem: "found" }),
      filterNets(open, { ...EVERY, problem: "none" }),
    ];
    expect(found.length + none.length).toBe(open.length);
  });
});

describe("a figure of three digits", () => {
  it.each([
    [2.7, "nearest", "2.7 V"],
    [1.2345, "nearest", "1.23 V"],
    [1.2345, "up", "1.24 V"],
    [1.2365, "down", "1.23 V"],
    [1.24, "up", "1.24 V"],
    [0, "up", "0 V"],
  ] as const)("%s rounded to the %s side is %s", (value, rounding, written) => {
    expect(threeDigits(value, "V", rounding).replace(/\s/gu, " ")).toBe(written);
  });
});
