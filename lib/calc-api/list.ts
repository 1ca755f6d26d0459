import { conformity } from "./conformity";
import type { Calculation } from "./define-calculation";
import { delay } from "./delay";
import { levels } from "./levels";
import { packing } from "./packing";

/** Every calculation that is served without state, in the order of the work. */
export const CALCULATIONS: readonly Calculation[] = [levels, packing, delay, conformity];

export const findCalculation = (name: string) => CALCULATIONS.find((calculation) => calculation.name === name);
