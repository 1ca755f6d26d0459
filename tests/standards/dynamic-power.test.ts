import { describe, expect, it } from "vitest";
import { switchingPower, ttlInputCurrent } from "@/lib/calc/power";

const MHZ = 1e6;
const loads = (count: number, loadPf: number, hz: number) => Array.from({ length: count }, () => ({ loadPf, hz }));
const milliwatts = (watts: number) => watts * 1000;

describe("PD = Cpd · VCC² · fi · N + Σ CL · VCC² · fo (NXP 74HC283 rev. 3, 74HC86 rev. 4, read); values computed", () => {
  it("one HC00 gate, Cpd 22 pF (Philips 1990, per gate, read), 5 V, 1 MHz, one output into 50 pF: 0.550 + 1.250 mW", () => {
    const power = switchingPower({
      volts: 5,
      cpdPf: 22,
      inputHz: 1 * MHZ,
      switching: 1,
      outputs: loads(1, 50, 1 * MHZ),
    });
    expect(milliwatts(power.internalW)).toBeCloseTo(0.55, 9);
    expect(milliwatts(power.loadW)).toBeCloseTo(1.25, 9);
    expect(milliwatts(power.totalW)).toBeCloseTo(1.8, 9);
  });

  it("one HC283, Cpd 88 pF (per package, read), 5 V, 2 MHz, five outputs into 50 pF: 4.4 + 12.5 = 16.9 mW", () => {
    const power = switchingPower({
      volts: 5,
      cpdPf: 88,
      inputHz: 2 * MHZ,
      switching: 1,
      outputs: loads(5, 50, 2 * MHZ),
    });
    expect(milliwatts(power.internalW)).toBeCloseTo(4.4, 9);
    expect(milliwatts(power.loadW)).toBeCloseTo(12.5, 9);
  });

  it("eight channels of 30 pF at 5 MHz into 100 pF each, 5 V: 30 + 100 = 130 mW", () => {
    const power = switchingPower({
      volts: 5,
      cpdPf: 30,
      inputHz: 5 * MHZ,
      switching: 8,
      outputs: loads(8, 100, 5 * MHZ),
    });
    expect(milliwatts(power.internalW)).toBeCloseTo(30, 9);
    expect(milliwatts(power.loadW)).toBeCloseTo(100, 9);
  });

  it.each([
    [6, 1.44],
    [3.3, 0.4356],
  ])("%s V instead of 5 V: %s of the power", (volts, share) => {
    const at = (supply: number) =>
      switchingPower({ volts: supply, cpdPf: 22, inputHz: MHZ, switching: 4, outputs: loads(4, 50, MHZ) }).totalW;
    expect(at(volts) / at(5)).toBeCloseTo(share, 12);
  });

  it("trap: the output of a divide by two changes at half the frequency, so its load takes half", () => {
    const at = (hz: number) =>
      switchingPower({ volts: 5, cpdPf: 0, inputHz: MHZ, switching: 1, outputs: loads(1, 50, hz) }).totalW;
    expect(at(MHZ / 2) / at(MHZ)).toBeCloseTo(0.5, 12);
  });
});

describe("current at rest", () => {
  it("computed: 80 µA at 5 V are 0.4 mW", () => {
    expect(milliwatts(80e-6 * 5)).toBeCloseTo(0.4, 12);
  });

  it("HCT08 with four inputs at VCC − 2.1 V, 0.6 × 360 µA each (TI, read): 4.32 mW at 5 V, more than it takes switching", () => {
    expect(milliwatts(ttlInputCurrent(4, 0.6 * 360e-6, 1) * 5)).toBeCloseTo(4.32, 9);
    expect(ttlInputCurrent(4, 0.6 * 360e-6, 0.5)).toBeCloseTo(432e-6, 12);
  });
});
