import { expect, test } from "vitest";
import { viewFace } from "@/lib/calc/connector";
import { face } from "../support/face";

/*
 * IEC 60603-2 (DIN 41612). The standard was not opened: grid, rows and columns were read in an article on DIN 41612, the
 * half size in a maker's sheet of type C/2; the rest is arithmetic, or from memory where it says so.
 */

test("type C has 96 contacts in rows a, b and c of 32, at 2.54 mm along and between the rows (read)", () => {
  const c96 = face("din41612-c96");
  expect(c96.pins).toHaveLength(96);
  expect(c96.rows.map(({ name, offsetMm }) => [name, offsetMm])).toEqual([
    ["a", 0],
    ["b", 2.54],
    ["c", 5.08],
  ]);
  expect(c96.pitchMm).toBe(2.54);
});

test("positions 1 and 32 stand 31 × 2.54 = 78.74 mm apart (computed)", () => {
  const { pins } = viewFace(face("din41612-c64"), "card");
  const [first, last] = ["a1", "a32"].map((name) => pins.find((pin) => pin.name === name)?.yMm ?? Number.NaN);
  expect((last ?? Number.NaN) - (first ?? Number.NaN)).toBeCloseTo(78.74, 9);
});

test("half sizes have 16 columns, 15 × 2.54 = 38.1 mm, in a body of 54 × 11.1 mm at most (read)", () => {
  const { positions, pitchMm, outline } = face("din41612-c48");
  expect((positions - 1) * pitchMm).toBeCloseTo(38.1, 9);
  expect(outline).toEqual({ lengthMm: 54, widthMm: 11.1 });
});

test("the full size is 16 columns longer, 94.6 mm, printed as 95 mm (computed; 95 mm from memory)", () => {
  const { outline } = face("din41612-c96");
  expect(Math.abs(outline.lengthMm - (54 + 16 * 2.54))).toBeLessThan(0.5);
});
