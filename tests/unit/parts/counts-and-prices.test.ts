import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { saveBlockInput } from "@/lib/block/schema";
import { readCount } from "@/lib/form/whole-count";
import { money, price, priceText } from "@/lib/part/price";

const messageOf = (typed: string) => {
  const read = readCount(typed);
  return typeof read === "number" ? read : read.message;
};

describe("a count", () => {
  it("is a whole number of one or more, whatever blanks stand around it", () => {
    expect([" 4 ", "+7", "007"].map(messageOf)).toEqual([4, 7, 7]);
  });

  it("that is none says why", () => {
    expect(["", "0", "-2", "−2", "1.5", "1,5", "four", "1e3", "10001"].map(messageOf)).toEqual([
      "say how many.",
      "0 is too few; at least 1.",
      "-2 is too few; at least 1.",
      "−2 is too few; at least 1.",
      "1.5 is no whole number. There is no part of one.",
      "1,5 is no whole number. There is no part of one.",
      "“four” is no count.",
      "“1e3” is no count.",
      "10001 is too many; at most 10,000.",
    ]);
  });

  it("never reads as anything but a whole number within its bounds", () => {
    fc.assert(
      fc.property(fc.string(), (typed) => {
        const read = readCount(typed);
        if (typeof read === "number") expect(Number.isInteger(read) && read >= 1 && read <= 10_000).toBe(true);
        else expect(read.message).toMatch(/\.$/);
      }),
    );
  });

  it("of a row that is wrong is named by its row, and so is a row that says the same twice", () => {
    const read = saveBlockInput.safeParse({
      ...{ project: "x", writeId: crypto.randomUUID(), block: "", version: 0, name: "Adder", summary: "" },
      gates: [
        { gateFunction: "xor2", count: "0" },
        { gateFunction: "", count: "1" },
        { gateFunction: "xor2", count: "2" },
      ],
      children: [],
    });
    expect(read.error?.issues.map(({ path, message }) => [path.join("."), message])).toEqual([
      ["gates.1.gateFunction", "Row 2: choose what the gates do."],
      ["gates.2.gateFunction", "Row 3: it names the same as row 1. Put the two counts together."],
      ["gates.0.count", "Row 1: 0 is too few; at least 1."],
    ]);
  });
});

describe("a price", () => {
  const read = (typed: string) => {
    const parsed = price.safeParse(typed);
    return parsed.success ? parsed.data : parsed.error.issues[0]?.message;
  };

  it("is kept in cents, without a rounding error, with either decimal mark", () => {
    expect(["0.45", "0,45", "12", "1.1", "0.29", ""].map(read)).toEqual([45, 45, 1200, 110, 29, null]);
  });

  it("with three digits after the mark, a currency or a sign is refused", () => {
    expect(read("0.455")).toContain("more than two digits");
    expect(read("€ 0.45")).toContain("without the currency");
    expect(read("-1")).toContain("is no price");
    expect(read("1000000")).toContain("at most 100,000");
  });

  it("comes back as it is written", () => {
    fc.assert(
      fc.property(fc.integer({ min: 0, max: 10_000_000 }), (cents) => {
        expect(read(priceText(cents))).toBe(cents);
      }),
    );
    expect(money(123_456_789, "EUR")).toBe("1\u202f234\u202f567.89\u00a0EUR");
  });
});
