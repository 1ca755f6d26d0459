import { describe, expect, test } from "vitest";
import {
  CONNECTOR_IDS,
  gridProblems,
  pinNamed,
  pinsApartMm,
  viewFace,
  type Connector,
  type Orientation,
  type Side,
} from "@/lib/calc/connector";
import { face } from "../support/face";

type Corner = "upper left" | "upper right" | "lower left" | "lower right";

/** The pin in a corner, as one says it who looks at the connector. */
function cornerPin(connector: Connector, corner: Corner, side: Side, orientation: Orientation = "standing"): string {
  const toRight = corner.endsWith("right") ? 1 : -1;
  const down = corner.startsWith("lower") ? 1 : -1;
  const { pins } = viewFace(connector, side, orientation);
  const far = (pin: (typeof pins)[number]) => toRight * pin.xMm + down * pin.yMm;
  return pins.reduce((best, pin) => (far(pin) > far(best) ? pin : best)).name;
}

describe("a type C connector in the rack", () => {
  const c96 = face("din41612-c96");

  test("seen from the card side has a1 at the upper left, c1 at the upper right, a32 at the lower left", () => {
    expect(cornerPin(c96, "upper left", "card")).toBe("a1");
    expect(cornerPin(c96, "upper right", "card")).toBe("c1");
    expect(cornerPin(c96, "lower left", "card")).toBe("a32");
  });

  test("seen from the solder side has c1 at the upper left and a1 at the upper right; position 1 stays on top", () => {
    expect(cornerPin(c96, "upper left", "solder")).toBe("c1");
    expect(cornerPin(c96, "upper right", "solder")).toBe("a1");
    expect(cornerPin(c96, "lower right", "solder")).toBe("a32");
  });

  test("laid on its side from the card side has position 1 at the left and row a below", () => {
    expect(cornerPin(c96, "lower left", "card", "lying")).toBe("a1");
    expect(cornerPin(c96, "upper left", "card", "lying")).toBe("c1");
    expect(cornerPin(c96, "lower right", "card", "lying")).toBe("a32");
  });

  test("laid on its side from the solder side has position 1 at the left and row a above", () => {
    expect(cornerPin(c96, "upper left", "solder", "lying")).toBe("a1");
    expect(cornerPin(c96, "lower right", "solder", "lying")).toBe("c32");
  });

  test("with 64 pins leaves row b's place empty: a and c stand 5.08 mm apart from either side", () => {
    for (const side of ["card", "solder"] as const) {
      const { pins } = viewFace(face("din41612-c64"), side);
      const [a, c] = ["a7", "c7"].map((name) => pins.find((pin) => pin.name === name));
      expect(Math.abs((a?.xMm ?? 0) - (c?.xMm ?? 0))).toBeCloseTo(5.08, 9);
      expect(a?.yMm).toBe(c?.yMm);
    }
  });
});

test("a pin header seen from where the cable plugs in has 1 at the upper left and 2 at its right", () => {
  expect(cornerPin(face("header-2x5"), "upper left", "card")).toBe("1");
  expect(cornerPin(face("header-2x5"), "upper right", "card")).toBe("2");
  expect(cornerPin(face("header-2x5"), "lower left", "card")).toBe("9");
});

test("a pin header seen from where it is soldered has 2 at the upper left and 1 at its right", () => {
  expect(cornerPin(face("header-2x5"), "upper left", "solder")).toBe("2");
  expect(cornerPin(face("header-2x5"), "upper right", "solder")).toBe("1");
});

test("a card edge seen from the solder side has A where 1 is from the card side", () => {
  expect(cornerPin(face("edge-2x22"), "upper left", "card")).toBe("1");
  expect(cornerPin(face("edge-2x22"), "upper left", "solder")).toBe("A");
  expect(cornerPin(face("edge-2x22"), "lower right", "card")).toBe("Z");
});

describe.each(CONNECTOR_IDS)("%s", (id) => {
  const connector = face(id);

  /** Above zero when row, position and the viewer's eye make a right-handed set. */
  function handedness(side: Side, orientation: Orientation): number {
    const { pins } = viewFace(connector, side, orientation);
    const at = (row: number, position: number) => {
      const pin = pins.find((one) => one.row === row && one.position === position);
      if (!pin) throw new Error("the pin is missing");
      return pin;
    };
    const [first, along, across] = [at(0, 1), at(0, 2), at(1, 1)];
    return Math.sign(
      (across.xMm - first.xMm) * (along.yMm - first.yMm) - (across.yMm - first.yMm) * (along.xMm - first.xMm),
    );
  }

  test("is mirrored by changing sides and by nothing else", () => {
    expect(handedness("card", "lying")).toBe(handedness("card", "standing"));
    expect(handedness("solder", "standing")).toBe(-handedness("card", "standing"));
    expect(handedness("solder", "lying")).toBe(-handedness("card", "standing"));
  });

  test("has every pin inside its outline, and neighbours at their true distance in every view", () => {
    for (const side of ["card", "solder"] as const) {
      for (const orientation of ["standing", "lying"] as const) {
        const view = viewFace(connector, side, orientation);
        for (const { xMm, yMm } of view.pins) {
          expect(xMm > 0 && xMm < view.widthMm && yMm > 0 && yMm < view.heightMm).toBe(true);
        }
        const [one, other] = view.pins.filter((pin) => pin.row === 0);
        if (!one || !other) throw new Error("the row is too short");
        expect(Math.hypot(one.xMm - other.xMm, one.yMm - other.yMm)).toBeCloseTo(connector.pitchMm, 9);
      }
    }
  });
});

test("the distance of two pins goes along and across the rows", () => {
  const c96 = face("din41612-c96");
  const apart = (one: string, other: string) => {
    const [first, second] = [pinNamed(c96, one), pinNamed(c96, other)];
    return first && second ? pinsApartMm(c96, first, second) : undefined;
  };
  expect(apart("a1", "a2")).toBeCloseTo(2.54, 9);
  expect(apart("a1", "c1")).toBeCloseTo(5.08, 9);
  expect(apart("a1", "b2")).toBeCloseTo(2.54 * Math.SQRT2, 9);
});

describe("a grid of one's own", () => {
  const grid = { rows: ["a", "b"], positions: 8, pitchMm: 2.54 };

  test("of two rows is fine, and so is a single row without a name", () => {
    expect(gridProblems(grid)).toEqual([]);
    expect(gridProblems({ ...grid, rows: [""] })).toEqual([]);
  });

  test.each([
    [{ ...grid, rows: [] }, "Give the connector 1 to 26 rows."],
    [{ ...grid, rows: ["a", "A"] }, "Rows 1 and 2 are both called A."],
    [{ ...grid, rows: ["a1"] }, "Row 1 is called “a1”. Name a row with one to three letters, such as a."],
    [{ ...grid, positions: 0 }, "Give each row 1 to 200 positions."],
    [{ ...grid, positions: 2.5 }, "Give each row 1 to 200 positions."],
    [{ ...grid, pitchMm: Number.NaN }, "Give a pitch between 0.2 and 50 mm."],
  ])("of %j is refused with a sentence", (wrong, sentence) => {
    expect(gridProblems(wrong)).toEqual([sentence]);
  });
});
