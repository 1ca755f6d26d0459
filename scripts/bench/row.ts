/** One line of the table: ours beside the floor, and what quality asks for. */
export type Row = { work: string; ours: string; floor: string; ratio: string; toReach: string; reached: boolean };

export const milliseconds = (value: number) => `${value.toFixed(value < 10 ? 2 : 1)} ms`;
export const kilobytes = (value: number) => `${(value / 1000).toFixed(1)} kB`;
export const times = (value: number) => `${value.toFixed(2)} ×`;

export function printTable(rows: Row[]): void {
  const lines = [
    ["work", "ours", "floor", "ratio", "to reach", ""],
    ...rows.map((row) => [row.work, row.ours, row.floor, row.ratio, row.toReach, row.reached ? "reached" : "MISSED"]),
  ];
  const widths = (lines[0] ?? []).map((_, column) => Math.max(...lines.map((line) => (line[column] ?? "").length)));
  for (const line of lines) console.log(line.map((cell, column) => cell.padEnd(widths[column] ?? 0)).join("  "));
}
