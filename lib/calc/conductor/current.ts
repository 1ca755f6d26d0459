import { computed, needsPositive, type Computed, type Fault } from "../computed";

export type ConductorLayer = "external" | "internal";

/** Thickness that goes by the name of one ounce a square foot: 1.378 mil. */
export const OUNCE_COPPER_UM = 1.378 * 25.4;

/** I = k · ΔT^b · A^c, A in square mils, ΔT in K, I in A. */
type Fit = Record<ConductorLayer, { k: number; b: number; c: number }>;

/**
 * Fits to the charts of IPC-2221, which were not opened; the constants were read in two public calculators.
 * `charts` is the usual one. `older`, from the charts of IPC-D-275, is also published as IPC-2221's and gives 14 % more
 * outside and 18 % less inside for a 10 mil conductor.
 */
const FITS = {
  charts: { external: { k: 0.048, b: 0.44, c: 0.725 }, internal: { k: 0.024, b: 0.44, c: 0.725 } },
  older: { external: { k: 0.0647, b: 0.4281, c: 0.6732 }, internal: { k: 0.015, b: 0.5453, c: 0.7349 } },
} satisfies Record<string, Fit>;

export type CurrentFit = keyof typeof FITS;

const UM_PER_MIL = 25.4;
const UM_PER_MM = 1000;

type Surroundings = {
  copperUm: number;
  /** How much warmer than the board the conductor may get, K. */
  riseK: number;
  layer: ConductorLayer;
  fit?: CurrentFit;
};

export type ConductorCurrent = { currentA: number; areaMil2: number };

/**
 * Current that warms a conductor by riseK.
 * Leaves out: neighbours, planes, holes and ventilation, which matter more than the formula's digits; the charts end at
 * about 35 A, 100 K and 400 mil, and beyond them the fit is a guess.
 */
export function conductorCurrent(conductor: Surroundings & { widthMm: number }): Computed<ConductorCurrent> {
  const bad = needsPositive("widthMm", "width of the conductor", conductor.widthMm) ?? badSurroundings(conductor);
  if (bad) return bad;
  const { k, b, c } = FITS[conductor.fit ?? "charts"][conductor.layer];
  const areaMil2 = ((conductor.widthMm * UM_PER_MM) / UM_PER_MIL) * (conductor.copperUm / UM_PER_MIL);
  return computed({ currentA: k * conductor.riseK ** b * areaMil2 ** c, areaMil2 });
}

export type ConductorWidth = { widthMm: number; areaMil2: number };

/** Width at which a current warms a conductor by riseK: the same formula the other way. */
export function conductorWidth(conductor: Surroundings & { currentA: number }): Computed<ConductorWidth> {
  const bad = needsPositive("currentA", "current", conductor.currentA) ?? badSurroundings(conductor);
  if (bad) return bad;
  const { k, b, c } = FITS[conductor.fit ?? "charts"][conductor.layer];
  const areaMil2 = (conductor.currentA / (k * conductor.riseK ** b)) ** (1 / c);
  return computed({ widthMm: (areaMil2 * UM_PER_MIL ** 2) / conductor.copperUm / UM_PER_MM, areaMil2 });
}

function badSurroundings({ copperUm, riseK }: Surroundings): Fault | undefined {
  return (
    needsPositive("copperUm", "thickness of the copper", copperUm) ?? needsPositive("riseK", "temperature rise", riseK)
  );
}
