import { checkDesign } from "./check-design";
import { fewestPackages, perBlockPackages } from "./count-packages";
import { decouple } from "./decouple";
import { type PackingInput, type PackingProblem } from "./design";
import { boardTotals, expandBlocks, ownersOf, type Owner } from "./expand";
import { type PackageLine, type Packing } from "./packing";
import { placeGates, type Placed } from "./place-gates";
import { tieSpares } from "./tie-spares";

/** More gates make no board that anybody lays out by hand. */
const MOST_GATES = 20_000;

export type PackingResult = { ok: true; packing: Packing } | { ok: false; problems: PackingProblem[] };

/**
 * Gates of a board to packages: for each function ⌈gates / gates per package⌉, over the whole board (pooled) or for each
 * instance of a block and the loose gates apart (per-block). Gates are placed in the order of the blocks.
 *
 * Leaves out: one function done by another's spare gates (a NAND as an inverter), distance between gates, and whether
 * gates that share a select or enable may share it; a note says where that matters. Problems name their rows.
 */
export function pack(input: PackingInput): PackingResult {
  const problems = checkDesign(input);
  if (problems.length > 0) return { ok: false, problems };
  const expanded = expandBlocks(input.blocks);
  const totals = boardTotals(input, expanded);
  const gatesUsed = [...totals.values()].reduce((sum, count) => sum + count, 0);
  const instances = input.board.use.reduce((sum, { count }) => sum + count, 0);
  if (gatesUsed > MOST_GATES || instances > MOST_GATES) {
    const message = `The board comes to more than ${MOST_GATES} gates. Look for a count that is too large.`;
    return { ok: false, problems: [{ row: "board/use", message }] };
  }

  const owners = ownersOf(input, expanded);
  const placed = placeGates(poolsOf(owners, input.mode), input.packages, input.family.name);
  const perBlockCount = perBlockPackages(owners, input.packages);
  const lowerBound = fewestPackages(totals, input.packages);
  return {
    ok: true,
    packing: {
      mode: input.mode,
      lines: linesOf(placed),
      packages: placed.map(({ designator, part, gateFunction, gates }) => ({ designator, part, gateFunction, gates })),
      packageCount: placed.length,
      gatesUsed,
      spares: tieSpares(placed, input.family.technology),
      decoupling: decouple(placed.length),
      perBlockCount,
      pooledCount: lowerBound,
      poolingSaves: perBlockCount - lowerBound,
      lowerBound,
      notes: notesOf(placed),
    },
  };
}

const poolsOf = (owners: Owner[], mode: PackingInput["mode"]): { forBlock: string | null; owners: Owner[] }[] =>
  mode === "pooled"
    ? [{ forBlock: null, owners }]
    : owners.map((owner) => ({ forBlock: owner.block, owners: [owner] }));

function linesOf(placed: readonly Placed[]): PackageLine[] {
  const lines = new Map<string, PackageLine>();
  for (const { part, gateFunction, forBlock, logic, gates } of placed) {
    const key = JSON.stringify([forBlock, gateFunction]);
    const used = gates.filter((gate) => gate.usedBy !== null).length;
    const line = lines.get(key);
    lines.set(key, {
      part,
      partName: logic.name,
      gateFunction,
      count: (line?.count ?? 0) + 1,
      gatesPerPackage: logic.gatesPerPackage,
      gatesUsed: (line?.gatesUsed ?? 0) + used,
      spareGates: (line?.spareGates ?? 0) + gates.length - used,
      forBlock,
    });
  }
  return [...lines.values()];
}

/** Gates with a common select or enable were put together by count alone: only people know whether they may be. */
function notesOf(placed: readonly Placed[]): string[] {
  const shared = placed.filter(({ logic, gates }) => {
    const owners = new Set(gates.flatMap((gate) => gate.usedBy ?? []));
    return logic.sharedInputs.length > 0 && owners.size > 1;
  });
  return [...new Map(shared.map((one) => [one.part, one])).values()].map(
    ({ part, logic }) =>
      `All gates of a ${part} share pins ${logic.sharedInputs.join(" and ")}. Blocks with another select or enable need a package of their own.`,
  );
}
