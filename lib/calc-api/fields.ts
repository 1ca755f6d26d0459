import { z } from "zod";

/** Smaller than anything at a bench: a slip, and the way to infinities. */
const LEAST = 1e-18;

/** Figures as scripts send them: plain numbers in the unit that the field's name ends with. */
export const from = (least: number, highest: number) =>
  z
    .number()
    .min(least)
    .max(highest)
    .refine((value) => value === 0 || Math.abs(value) >= LEAST, `Nothing at a bench is smaller than ${LEAST}, but 0.`);
const above = (highest: number) => z.number().min(LEAST).max(highest);

export const volts = above(10_000);
export const voltsFromZero = from(0, 10_000);
export const amps = from(0, 10_000);
export const ohms = above(1e12);
export const hertz = from(0, 1e12);
export const picofarads = from(0, 1e9);
export const seconds = from(0, 1e6);
export const share = from(0, 1);
export const percent = from(0, 100);
export const celsius = from(-100, 300);
export const count = z.int().min(1).max(10_000);
export const countFromZero = z.int().min(0).max(10_000);

/** A name of something in the input, so that results and problems can speak of it. */
export const name = z.string().trim().min(1).max(80);

/** Typical and worst of one quantity, from 0 up to a highest. */
export const spreadTo = (highest: number) =>
  z
    .strictObject({ typical: from(0, highest), worst: from(0, highest) })
    .refine(({ typical, worst }) => worst >= typical, {
      message: "At worst it is at least what it is typically.",
      path: ["worst"],
    });
