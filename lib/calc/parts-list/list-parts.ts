import { checkList } from "./check-list";
import { countSpares } from "./count-spares";
import {
  type PartsList,
  type PartsListInput,
  type PartsListLine,
  type PartsListProblem,
  type Price,
} from "./parts-list";

export type PartsListResult = { ok: true; list: PartsList } | { ok: false; problems: PartsListProblem[] };

type Gathered = Pick<PartsListLine, "description" | "perBoard">;

/**
 * What to order for all units of all boards: needed + spares − stock, and what it costs, in whole smallest units of the
 * currency. The same part on several lines or boards is one line. Parts keep the order in which they first appear.
 * Leaves out price breaks, packs of a fixed size and delivery.
 */
export function listParts(input: PartsListInput): PartsListResult {
  const problems = checkList(input);
  if (problems.length > 0) return { ok: false, problems };

  const lines = [...gather(input)].map(([part, { description, perBoard }]): PartsListLine => {
    const known = Object.hasOwn(input.known, part) ? input.known[part] : undefined;
    const needed = perBoard.reduce((sum, board) => sum + board.total, 0);
    const minimum = Math.max(input.spares.minimum, known?.minimumSpares ?? 0);
    const spares = countSpares(needed, input.spares.percent, minimum);
    const stock = known?.stock ?? 0;
    const toBuy = Math.max(0, needed + spares - stock);
    const price = known?.price ?? null;
    const costMinor = price && costOf(toBuy, price);
    return { part, description, perBoard, needed, spares, stock, toBuy, price, costMinor };
  });
  const sum = (of: (line: PartsListLine) => number) => lines.reduce((total, line) => total + of(line), 0);
  return {
    ok: true,
    list: {
      lines,
      totals: {
        parts: lines.length,
        needed: sum((line) => line.needed),
        toBuy: sum((line) => line.toBuy),
        costMinor: sum((line) => line.costMinor ?? 0),
        withoutPrice: lines.flatMap((line) => (line.toBuy > 0 && !line.price ? line.part : [])),
      },
    },
  };
}

function gather({ boards }: PartsListInput): Map<string, Gathered> {
  const parts = new Map<string, Gathered>();
  for (const { code, units, lines } of boards) {
    for (const { part, description, count } of lines) {
      const gathered = parts.get(part) ?? { description: "", perBoard: [] };
      gathered.description ||= description;
      const here = gathered.perBoard.find((board) => board.code === code && board.units === units);
      if (here) {
        here.perUnit += count;
        here.total = here.perUnit * units;
      } else {
        gathered.perBoard.push({ code, perUnit: count, units, total: count * units });
      }
      parts.set(part, gathered);
    }
  }
  return parts;
}

/** Rounded up: ten pieces at 3.4 cents are 34 cents, one is 4. In big integers, so that large orders stay exact. */
function costOf(pieces: number, price: Price): number {
  const per = BigInt(price.pieces);
  return Number((BigInt(pieces) * BigInt(price.minor) + per - 1n) / per);
}
