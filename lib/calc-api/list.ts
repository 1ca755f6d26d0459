import { conformity } from "./conformity";
import { continuity } from "./continuity";
import type { Calculation } from "./define-calculation";
import { delay } from "./delay";
import { forecast } from "./forecast";
import { interconnect } from "./interconnect";
import { levels } from "./levels";
import { packing } from "./packing";
import { power } from "./power";
import { pullUp } from "./pull-up";
import { sequence } from "./sequence";

/** Every calculation that is served without state, in the order of the work. */
export const CALCULATIONS: readonly Calculation[] = [
  interconnect,
  levels,
  pullUp,
  power,
  packing,
  delay,
  conformity,
  continuity,
  sequence,
  forecast,
];

export const findCalculation = (name: string) => CALCULATIONS.find((calculation) => calculation.name === name);
