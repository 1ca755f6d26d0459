import fc from "fast-check";
import { describe, expect, test } from "vitest";
import { block, design, packed } from "./design";

const count = fc.integer({ min: 1, max: 9 });
const gateCounts = fc.dictionary(fc.constantFrom("nand2", "xor2", "inv", "dff", "nand8", "mux2"), count, {
  maxKeys: 4,
});

/** Blocks that contain only earlier ones, a board that uses some of them and has loose gates. */
const boards = fc
  .array(fc.tuple(gateCounts, fc.array(fc.tuple(fc.nat(), fc.integer({ min: 1, max: 3 })), { maxLength: 2 })), {
    maxLength: 4,
  })
  .chain((rows) => {
    const blocks = rows.map(([own, children], index) =>
      block(
        `B${index}`,
        own,
        Object.fromEntries(index === 0 ? [] : children.map(([pick, times]) => [`B${pick % index}`, times])),
      ),
    );
    const use = fc.dictionary(fc.constantFrom(...blocks.map((one) => one.id), "B0"), fc.integer({ min: 1, max: 5 }));
    return fc.tuple(fc.constant(blocks), blocks.length > 0 ? use : fc.constant({}), gateCounts);
  });

describe("however a board is made up", () => {
  test("pooling is never below the lower bound and never above keeping blocks apart", () => {
    fc.assert(
      fc.property(boards, ([blocks, use, loose]) => {
        const pooled = packed(design(blocks, use, { loose }));
        const apart = packed(design(blocks, use, { loose, mode: "per-block" }));
        expect(pooled.packageCount).toBeGreaterThanOrEqual(pooled.lowerBound);
        expect(apart.packageCount).toBeGreaterThanOrEqual(pooled.packageCount);
        expect(pooled.poolingSaves).toBe(apart.packageCount - pooled.packageCount);
        expect(apart.perBlockCount).toBe(apart.packageCount);
        expect(pooled.pooledCount).toBe(pooled.packageCount);
      }),
    );
  });

  test("every gate has one place, every place one user or none, and nothing is lost", () => {
    fc.assert(
      fc.property(boards, fc.constantFrom("pooled" as const, "per-block" as const), ([blocks, use, loose], mode) => {
        const packing = packed(design(blocks, use, { loose, mode }));
        const all = packing.packages.flatMap((one) => one.gates);
        expect(all.filter((gate) => gate.usedBy !== null)).toHaveLength(packing.gatesUsed);
        expect(all.filter((gate) => gate.usedBy === null)).toHaveLength(packing.spares.length);
        expect(new Set(packing.packages.map((one) => one.designator)).size).toBe(packing.packageCount);
        const lines = packing.lines.reduce(
          (sum, line) => ({
            count: sum.count + line.count,
            used: sum.used + line.gatesUsed,
            spare: sum.spare + line.spareGates,
          }),
          { count: 0, used: 0, spare: 0 },
        );
        expect(lines).toEqual({ count: packing.packageCount, used: packing.gatesUsed, spare: packing.spares.length });
        expect(packing.decoupling.packageCapacitors).toBe(packing.packageCount);
        for (const one of packing.packages) expect(one.gates.some((gate) => gate.usedBy !== null)).toBe(true);
      }),
    );
  });
});
