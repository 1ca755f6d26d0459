import { describe, expect, it } from "vitest";
import { press, type PadKey } from "@/components/bench/pad-typing";
import { parseQuantity } from "@/lib/calc/units";

const type = (...keys: PadKey[]) => keys.reduce((typed, key) => press(typed, key), "");

describe("the numeric pad", () => {
  it("writes what the meter shows", () => {
    expect(type("4", ".", "9", "8", "3")).toBe("4.983");
    expect(type("sign", "1", "2", ".", "0")).toBe("-12.0");
    expect(type(".", "5")).toBe("0.5");
    expect(type("0", "7")).toBe("7");
  });

  it("lets the prefix be touched before, between or after the digits, and changed", () => {
    expect(type("m", "1", "2", "1")).toBe("121m");
    expect(type("1", "2", "m", "1")).toBe("121m");
    expect(type("1", "2", "1", "µ", "m")).toBe("121m");
    expect(type("1", "2", "1", "m", "m")).toBe("121");
    expect(type("1", "2", "1", "m", "plain")).toBe("121");
  });

  it("takes one decimal point and one sign", () => {
    expect(type("1", ".", "2", ".", "3")).toBe("1.23");
    expect(type("5", "sign", "sign")).toBe("5");
  });

  it("goes on from what a keyboard wrote", () => {
    expect(press("4k", "7")).toBe("47k");
    expect(press("4k7", "5")).toBe("4k75");
    expect(press("4k7", "backspace")).toBe("4k");
  });

  it("knows the meter's overload and leaves it with the next digit", () => {
    expect(type("1", "OL")).toBe("OL");
    expect(press("OL", "7")).toBe("7");
    expect(type("1", "2", "clear")).toBe("");
  });

  it("writes only what the calculations read", () => {
    for (const typed of [type("4", ".", "7", "k"), type("1", "2", "1", "µ"), type("OL"), type("sign", "5")]) {
      expect(parseQuantity(typed, "Ω").ok, typed).toBe(true);
    }
  });
});
