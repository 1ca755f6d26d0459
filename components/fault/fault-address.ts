import type { FaultQuery } from "@/lib/fault/load-faults";

const FIRST: FaultQuery = { show: "standing", board: undefined, unit: undefined, q: "" };

/** The address of the list with some filters; what is as in the beginning is left out. */
export function faultsAddress(project: string, query: Partial<FaultQuery>): string {
  const { show, board, unit, q } = { ...FIRST, ...query };
  const search = new URLSearchParams();
  if (show !== FIRST.show) search.set("show", show);
  if (board) search.set("board", board);
  if (unit) search.set("unit", unit);
  if (q) search.set("q", q);
  const text = search.toString();
  return `/projects/${encodeURIComponent(project)}/faults${text === "" ? "" : `?${text}`}`;
}
