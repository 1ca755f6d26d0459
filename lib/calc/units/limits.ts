import { type Unit } from "./unit-list";

/** One side of a tolerance: 5 % or 50 ppm of the nominal value, or an amount in the base unit of the limits. */
export type Deviation = { amount: number; of: "percent" | "ppm" | "unit" };

/**
 * What a reading may be, in the base unit. At least one bound stands; a bound belongs to the allowed values unless its
 * …Inclusive is false (`< 0.5 Ω`). `nominal` and `tolerance` stand together when the limits were written with ±, and
 * say how to write them again; `lower` and `upper` are what is judged by.
 */
export type Limits = {
  unit: Unit;
  lower?: number;
  upper?: number;
  lowerInclusive?: boolean;
  upperInclusive?: boolean;
  nominal?: number;
  tolerance?: { minus: Deviation; plus: Deviation };
};
