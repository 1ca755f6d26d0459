import { z } from "zod";

/** Figures as scripts send them: plain numbers in the unit that the field's name ends with. */
const most = (least: number, highest: number) => z.number().min(least).max(highest);
const above = (least: number, highest: number) => z.number().gt(least).max(highest);

export const volts = above(0, 10_000);
export const voltsFromZero = most(0, 10_000);
export const amps = most(0, 10_000);
export const ohms = above(0, 1e12);
export const hertz = most(0, 1e12);
export const picofarads = most(0, 1e9);
export const seconds = most(0, 1e6);
export const share = most(0, 1);
export const percent = most(0, 100);
export const celsius = most(-100, 300);
export const count = z.int().min(1).max(10_000);
export const countFromZero = z.int().min(0).max(10_000);

/** A name of something in the input, so that results and problems can speak of it. */
export const name = z.string().trim().min(1).max(80);

/** Typical and worst of one quantity, from 0 up to a highest. */
export const spreadTo = (highest: number) =>
  z
    .strictObject({ typical: most(0, highest), worst: most(0, highest) })
    .refine(({ typical, worst }) => worst >= typical, {
      message: "At worst it is at least what it is typically.",
      path: ["worst"],
    });
