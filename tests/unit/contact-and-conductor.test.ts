import fc from "fast-check";
import { describe, expect, it } from "vitest";
import {
  conductorCurrent,
  conductorDrop,
  conductorOhm,
  conductorWidth,
  sheetOhm,
  type ConductorLayer,
} from "@/lib/calc/conductor";
import type { Computed } from "@/lib/calc/computed";
import { contactCurrentA, contactDrop, judgeContacts, loopDropVolts } from "@/lib/calc/contact";

function value<T>(answer: Computed<T>): T {
  if (!answer.ok) throw new Error(answer.message);
  return answer.value;
}

const plain = (text: string) => text.replaceAll("\u202f", " ");
const layer = fc.constantFrom<ConductorLayer>("external", "internal");
const some = (min: number, max: number) => fc.double({ min, max, noNaN: true });

describe("a contact", () => {
  it("never bears more in warmer air", () => {
    fc.assert(
      fc.property(some(-55, 100), some(-55, 100), (a, b) => {
        expect(value(contactCurrentA(Math.max(a, b)))).toBeLessThanOrEqual(value(contactCurrentA(Math.min(a, b))));
      }),
    );
  });

  it("follows another curve when there is one", () => {
    const header = [
      { ambientC: 25, currentA: 3 },
      { ambientC: 105, currentA: 1 },
    ] as const;
    expect(value(contactCurrentA(65, [...header]))).toBeCloseTo(2, 12);
    expect(contactCurrentA(106, [...header]).ok).toBe(false);
    expect(value(contactCurrentA(20, [{ ambientC: 20, currentA: 2 }]))).toBe(2);
  });

  it("carries too much or not, in a sentence that says how many would do", () => {
    const row = { currentA: 5, contactOhm: 0.02 };
    expect(plain(value(judgeContacts({ ...row, contacts: 3 }, 50)).sentence)).toBe(
      "1.67 A a contact; one bears 1.40 A at 50 °C: 4 contacts would do.",
    );
    expect(plain(value(judgeContacts({ ...row, contacts: 5 }, 50)).sentence)).toBe(
      "1.00 A a contact; one bears 1.40 A at 50 °C.",
    );
  });

  it("holds exactly its limit: 4.2 A on three contacts at 50 °C", () => {
    expect(judgeContacts({ currentA: 4.2, contacts: 3, contactOhm: 0.02 }, 50)).toMatchObject({
      value: { holds: true, contactsNeeded: 3 },
    });
  });

  it("loses less with more of them", () => {
    fc.assert(
      fc.property(some(0, 50), fc.integer({ min: 1, max: 60 }), (currentA, contacts) => {
        const drop = (count: number) => value(contactDrop({ currentA, contacts: count, contactOhm: 0.02 })).dropVolts;
        expect(drop(contacts + 1)).toBeLessThanOrEqual(drop(contacts));
      }),
    );
  });

  it.each<[Partial<Parameters<typeof contactDrop>[0]>, string, string]>([
    [{ currentA: -1 }, "currentA", "The current must not be below 0."],
    [{ contacts: 0 }, "contacts", "There is no contact to carry the current."],
    [{ contacts: 2.5 }, "contacts", "The number of contacts must be a whole number."],
    [{ contactOhm: 0 }, "contactOhm", "The resistance of a contact must be more than 0."],
  ])("is refused for figures that cannot be: %j", (part, field, message) => {
    const row = { currentA: 1, contacts: 2, contactOhm: 0.02, ...part };
    expect(contactDrop(row)).toEqual({ ok: false, field, message });
    expect(judgeContacts(row, 20)).toEqual({ ok: false, field, message });
    const good = { contacts: 2, contactOhm: 0.02 };
    expect(loopDropVolts(row.currentA, good, row)).toEqual({ ok: false, field, message });
    expect(contactCurrentA(Number.NaN).ok).toBe(false);
  });
});

describe("a conductor", () => {
  it("of the width that a current asks for bears that current", () => {
    fc.assert(
      fc.property(some(0.01, 35), some(5, 100), some(5, 210), layer, (currentA, riseK, copperUm, where) => {
        const rest = { riseK, copperUm, layer: where };
        const { widthMm } = value(conductorWidth({ currentA, ...rest }));
        expect(value(conductorCurrent({ widthMm, ...rest })).currentA / currentA).toBeCloseTo(1, 9);
      }),
    );
  });

  it("loses more when it is longer, narrower or warmer", () => {
    const conductor = { lengthMm: 100, widthMm: 1, copperUm: 35, celsius: 20, currentA: 1 };
    const drop = (part: Partial<typeof conductor>) => value(conductorDrop({ ...conductor, ...part })).dropVolts;
    expect(drop({ lengthMm: 101 })).toBeGreaterThan(drop({}));
    expect(drop({ widthMm: 0.9 })).toBeGreaterThan(drop({}));
    expect(drop({ celsius: 21 })).toBeGreaterThan(drop({}));
    expect(drop({ copperUm: 70 })).toBeCloseTo(drop({}) / 2, 12);
    expect(drop({ currentA: 0 })).toBe(0);
  });

  it("is refused for figures that cannot be, naming the field", () => {
    const thermal = { copperUm: 35, riseK: 10, layer: "external" } as const;
    const message = (answer: Computed<unknown>) => (answer.ok ? "" : `${answer.field}: ${answer.message}`);
    expect(message(conductorCurrent({ ...thermal, widthMm: 0 }))).toBe(
      "widthMm: The width of the conductor must be more than 0.",
    );
    expect(message(conductorCurrent({ ...thermal, widthMm: 1, copperUm: -35 }))).toBe(
      "copperUm: The thickness of the copper must be more than 0.",
    );
    expect(message(conductorWidth({ ...thermal, currentA: 1, riseK: 0 }))).toBe(
      "riseK: The temperature rise must be more than 0.",
    );
    expect(message(conductorWidth({ ...thermal, currentA: Number.NaN }))).toBe("currentA: The current is no number.");
    const straight = { lengthMm: 100, widthMm: 1, copperUm: 35, celsius: 20 };
    expect(message(conductorOhm({ ...straight, lengthMm: 0 }))).toBe(
      "lengthMm: The length of the conductor must be more than 0.",
    );
    expect(message(conductorDrop({ ...straight, currentA: -1 }))).toBe("currentA: The current must not be below 0.");
    expect(message(sheetOhm({ copperUm: 35, celsius: 300 }))).toBe(
      "celsius: The temperature lies outside −55 to 260 °C, where the formula holds.",
    );
    expect(message(sheetOhm({ copperUm: 35, celsius: Infinity }))).toBe("celsius: The temperature is no number.");
  });
});
