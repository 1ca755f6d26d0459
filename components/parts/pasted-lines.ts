type Line = { partNumber: string; description: string; count: string; designators: string };

/**
 * Rows of a spreadsheet as they lie on the clipboard: cells apart by tabs, rows by line ends; undefined for text that
 * goes into one field. Columns: count, part, what it is, on the board; or part first where the first cell is no number.
 */
export function pastedLines(text: string): Line[] | undefined {
  const rows = text.replace(/\r\n?/g, "\n").replace(/\n+$/, "").split("\n");
  if (rows.length < 2 && !text.includes("\t")) return undefined;
  return rows
    .filter((row) => row.trim() !== "")
    .map((row) => {
      const cells = row.split("\t").map((cell) => cell.trim());
      const hasCount = cells.length > 1 && /^[−+-]?\d+([.,]\d+)?$/.test(cells[0] ?? "");
      const [count = "1", partNumber = "", description = "", designators = ""] = hasCount ? cells : ["1", ...cells];
      return { count, partNumber, description, designators };
    });
}
