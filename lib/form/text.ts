import { z } from "zod";

/** C0 and C1 controls, which no keyboard types on purpose; tab and line breaks are allowed where lines are. */
const CONTROLS_IN_LINE = /[\u0000-\u001f\u007f-\u009f\u2028\u2029]/;
const CONTROLS_IN_LINES = /[\u0000-\u0008\u000b\u000c\u000e-\u001f\u007f-\u009f]/;

/** Half of a surrogate pair is no character; PostgreSQL would refuse it. */
const isWellFormed = (value: string) =>
  !/[\ud800-\udbff](?![\udc00-\udfff])|(?<![\ud800-\udbff])[\udc00-\udfff]/.test(value);

const cleanOf = (controls: RegExp) => (value: string) => !controls.test(value) && isWellFormed(value);
const CLEAN = "There is a control character in it that nobody can see. Type it again.";

/** One line that may be empty. */
export const optionalLine = (max: number) =>
  z
    .string({ message: "This should be text." })
    .trim()
    .max(max, `At most ${max} characters fit here.`)
    .refine(cleanOf(CONTROLS_IN_LINE), CLEAN);

/** One line that must say something; `missing` is the sentence when it does not. */
export const line = (max: number, missing: string) =>
  z
    .string({ message: missing })
    .trim()
    .min(1, missing)
    .max(max, `At most ${max} characters fit here.`)
    .refine(cleanOf(CONTROLS_IN_LINE), CLEAN);

/** Several lines that may be empty. */
export const optionalLines = (max: number) =>
  z
    .string({ message: "This should be text." })
    .trim()
    .max(max, `At most ${max.toLocaleString("en-GB")} characters fit here.`)
    .refine(cleanOf(CONTROLS_IN_LINES), CLEAN);

/** Several lines that must say something. */
export const lines = (max: number, missing: string) =>
  z
    .string({ message: missing })
    .trim()
    .min(1, missing)
    .max(max, `At most ${max.toLocaleString("en-GB")} characters fit here.`)
    .refine(cleanOf(CONTROLS_IN_LINES), CLEAN);
