import { describe, expect, it } from "vitest";
import { CONTACT_OHM, contactCurrentA, contactDrop, judgeContacts, loopDropVolts } from "@/lib/calc/contact";

function at(ambientC: number): number {
  const found = contactCurrentA(ambientC);
  if (!found.ok) throw new Error(found.message);
  return found.value;
}

describe("DIN 41612, IEC 60603-2: current of a contact", () => {
  it.each([
    [20, 2, "read in a maker's sheets of half-size types"],
    [70, 1, "read there; another maker gives it with all contacts loaded, for a relative of 160 ways"],
    [100, 0.5, "read there"],
    [40, 1.6, "computed by straight lines, a modelling choice"],
    [50, 1.4, "computed by straight lines"],
    [85, 0.75, "computed by straight lines"],
  ])("at %d °C it bears %d A (%s)", (ambientC, currentA) => {
    expect(at(ambientC)).toBeCloseTo(currentA, 12);
  });

  it("common practice: below 20 °C it is not taken to bear more", () => {
    expect(at(0)).toBe(2);
    expect(at(-40)).toBe(2);
  });

  it("above 100 °C the sheets promise nothing, and neither does the calculation", () => {
    const found = contactCurrentA(101);
    expect(found).toMatchObject({ ok: false, field: "ambientC" });
    expect(!found.ok && found.message.replaceAll("\u202f", " ")).toBe(
      "The contacts' current is known from −55 °C to 100 °C, not at 101 °C.",
    );
  });
});

describe("DIN 41612: contacts of at most 20 mΩ, read in two makers' sheets", () => {
  it("computed: 3 A over 6 supply and 6 ground contacts is 0.5 A, 10 mV and 5 mW each, 20 mV in all", () => {
    const six = { contacts: 6, contactOhm: CONTACT_OHM };
    const one = contactDrop({ currentA: 3, ...six });
    expect(one.ok && one.value.perContactA).toBeCloseTo(0.5, 12);
    expect(one.ok && one.value.dropVolts).toBeCloseTo(0.01, 12);
    expect(one.ok && one.value.perContactW).toBeCloseTo(0.005, 12);
    const loop = loopDropVolts(3, six, six);
    expect(loop.ok && loop.value).toBeCloseTo(0.02, 12);
  });

  it("computed: 5 A at 50 °C want four contacts of 1.4 A; three carry too much", () => {
    const row = { currentA: 5, contactOhm: CONTACT_OHM };
    expect(judgeContacts({ ...row, contacts: 4 }, 50)).toMatchObject({ value: { holds: true, contactsNeeded: 4 } });
    expect(judgeContacts({ ...row, contacts: 3 }, 50)).toMatchObject({ value: { holds: false, contactsNeeded: 4 } });
  });
});
