import type { LogQuery } from "./load-log";

/** The address with some filters changed; the page begins anew unless `before` is given. */
export function logAddress(project: string, query: Partial<LogQuery>): string {
  const search = new URLSearchParams();
  for (const name of ["show", "unit", "by", "before"] as const) {
    const value = query[name];
    if (value !== undefined) search.set(name, String(value));
  }
  const text = search.toString();
  return `/projects/${encodeURIComponent(project)}/log${text === "" ? "" : `?${text}`}`;
}
