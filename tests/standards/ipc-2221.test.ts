import { describe, expect, it } from "vitest";
import {
  conductorCurrent,
  conductorDrop,
  type ConductorLayer,
  conductorOhm,
  conductorWidth,
  type CurrentFit,
  OUNCE_COPPER_UM,
  sheetOhm,
} from "@/lib/calc/conductor";
import type { Computed } from "@/lib/calc/computed";

const MM_PER_MIL = 0.0254;

function value<T>(answer: Computed<T>): T {
  if (!answer.ok) throw new Error(answer.message);
  return answer.value;
}

describe("IPC-2221, fit to its charts (constants read in two calculators; the charts were not opened), computed", () => {
  it.each<[string, number, number, number, ConductorLayer, number]>([
    // what, width mm, copper µm, rise K, layer, current A
    ["10 mil, 1 oz, 10 K outside", 10 * MM_PER_MIL, OUNCE_COPPER_UM, 10, "external", 0.88552],
    ["10 mil, 1 oz, 10 K inside", 10 * MM_PER_MIL, OUNCE_COPPER_UM, 10, "internal", 0.44276],
    ["100 mil, 1 oz, 10 K outside", 100 * MM_PER_MIL, OUNCE_COPPER_UM, 10, "external", 4.7011],
    ["100 mil, 1 oz, 20 K outside", 100 * MM_PER_MIL, OUNCE_COPPER_UM, 20, "external", 6.3775],
    ["1.0 mm of 35 µm, 10 K outside", 1, 35, 10, "external", 2.3916],
    ["1.0 mm of 35 µm, 20 K inside", 1, 35, 20, "internal", 1.6222],
  ])("%s", (_, widthMm, copperUm, riseK, layer, currentA) => {
    expect(value(conductorCurrent({ widthMm, copperUm, riseK, layer })).currentA).toBeCloseTo(currentA, 4);
  });

  it("areas: 13.78 square mils for 10 mil of 1 oz, 54.2501 for 1.0 mm of 35 µm", () => {
    const rest = { riseK: 10, layer: "external" } as const;
    const ounce = conductorCurrent({ widthMm: 10 * MM_PER_MIL, copperUm: OUNCE_COPPER_UM, ...rest });
    expect(value(ounce).areaMil2).toBeCloseTo(13.78, 10);
    expect(value(conductorCurrent({ widthMm: 1, copperUm: 35, ...rest })).areaMil2).toBeCloseTo(54.2501, 4);
  });

  it("a published lesson prints 0.884 A where the formula gives 0.88552 A: rounding", () => {
    const found = conductorCurrent({ widthMm: 0.254, copperUm: OUNCE_COPPER_UM, riseK: 10, layer: "external" });
    expect(Math.abs(value(found).currentA / 0.884 - 1)).toBeLessThan(0.002);
  });

  it.each<[number, ConductorLayer, number, number]>([
    // current A, layer, area mil², width mm; 1 oz, 10 K
    [1, "external", 16.296, 0.3004],
    [1, "internal", 42.393, 0.7814],
    [3, "external", 74.162, 1.367],
  ])("%d A at 10 K and 1 oz, %s: %d square mils, %d mm", (currentA, layer, areaMil2, widthMm) => {
    const found = value(conductorWidth({ currentA, copperUm: OUNCE_COPPER_UM, riseK: 10, layer }));
    expect(found.areaMil2).toBeCloseTo(areaMil2, 3);
    expect(found.widthMm).toBeCloseTo(widthMm, 4);
  });

  it("an inner conductor wants 2.6014 times the width, not twice", () => {
    const at = (layer: ConductorLayer) =>
      value(conductorWidth({ currentA: 2, copperUm: 35, riseK: 10, layer })).widthMm;
    expect(at("internal") / at("external")).toBeCloseTo(2.6014, 4);
  });

  it.each<[CurrentFit, ConductorLayer, number]>([
    ["older", "external", 1.0138],
    ["older", "internal", 0.3619],
  ])("the %s fit, also published as IPC-2221's, gives another current: %s %d A", (fit, layer, currentA) => {
    const conductor = { widthMm: 0.254, copperUm: OUNCE_COPPER_UM, riseK: 10, layer };
    expect(value(conductorCurrent({ ...conductor, fit })).currentA).toBeCloseTo(currentA, 4);
    expect(value(conductorCurrent(conductor)).currentA).not.toBeCloseTo(currentA, 1);
  });
});

describe("copper foil, ρ 1.72 µΩ cm read, α 0.00393 / K; computed", () => {
  it.each([
    [35, 0.49143],
    [34.8, 0.49425],
    [70, 0.24571],
    [17.5, 0.98286],
  ])("a square of %d µm has %d mΩ at 20 °C", (copperUm, milliohm) => {
    expect(value(sheetOhm({ copperUm, celsius: 20 })) * 1e3).toBeCloseTo(milliohm, 5);
  });

  it.each([
    [100, 1, 20, 49.143],
    [100, 1, 70, 58.799],
    [160, 0.25, 20, 314.51],
    [160, 0.25, 85, 394.86],
  ])("%d mm × %d mm of 35 µm at %d °C: %d mΩ", (lengthMm, widthMm, celsius, milliohm) => {
    const found = value(conductorOhm({ lengthMm, widthMm, copperUm: 35, celsius })) * 1e3;
    expect(Math.abs(found - milliohm)).toBeLessThan(0.006);
  });

  it("2 A through 100 mm × 1 mm lose 98.286 mV and 196.57 mW at 20 °C", () => {
    const found = value(conductorDrop({ lengthMm: 100, widthMm: 1, copperUm: 35, celsius: 20, currentA: 2 }));
    expect(found.dropVolts * 1e3).toBeCloseTo(98.286, 3);
    expect(found.heatW * 1e3).toBeCloseTo(196.57, 2);
  });
});
