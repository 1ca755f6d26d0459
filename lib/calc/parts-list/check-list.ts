import { type PartsListInput, type PartsListProblem } from "./parts-list";

const LARGEST_COUNT = 1_000_000;
/** 10 million of the currency's unit, in cents. */
const LARGEST_PRICE = 1_000_000_000;

const isCount = (count: number, least: number): boolean =>
  Number.isInteger(count) && count >= least && count <= LARGEST_COUNT;

/** What keeps a parts list from being added up, each with its row. */
export function checkList({ boards, spares, known }: PartsListInput): PartsListProblem[] {
  const problems: PartsListProblem[] = [];
  const want = (holds: boolean, row: string, message: string) => {
    if (!holds) problems.push({ row, message });
  };
  boards.forEach(({ code, units, lines }, board) => {
    want(isCount(units, 0), `boards/${board}`, `Board ${code}: ${units} is no number of units. ${range(0)}`);
    lines.forEach(({ part, count }, line) => {
      const row = `boards/${board}/lines/${line}`;
      want(part.trim() !== "", row, `Board ${code}, row ${line + 1}: the part has no number.`);
      want(isCount(count, 1), row, `Board ${code}, row ${line + 1} (${part}): ${count} is no count. ${range(1)}`);
    });
  });
  const share = spares.percent >= 0 && spares.percent <= 1000;
  want(share, "spares", `Spares: ${spares.percent} % is no share. Give 0 to 1000 %.`);
  want(isCount(spares.minimum, 0), "spares", `Spares: ${spares.minimum} is no minimum. ${range(0)}`);
  for (const [part, { stock, price, minimumSpares = 0 }] of Object.entries(known)) {
    const row = `known/${part}`;
    want(isCount(stock, 0), row, `${part}: a stock of ${stock} cannot be. ${range(0)}`);
    want(isCount(minimumSpares, 0), row, `${part}: ${minimumSpares} is no minimum of spares. ${range(0)}`);
    if (!price) continue;
    const fits = Number.isInteger(price.minor) && price.minor >= 0 && price.minor <= LARGEST_PRICE;
    want(fits, row, `${part}: a price is a whole number of the currency's smallest unit, from 0.`);
    want(isCount(price.pieces, 1), row, `${part}: a price is for a whole number of pieces, from 1.`);
  }
  return problems;
}

const range = (least: number): string => `Give a whole number from ${least} to ${LARGEST_COUNT}.`;
