import type { CapturesQuery } from "./load-captures";

export function capturesAddress(project: string, query: Partial<CapturesQuery>): string {
  const search = new URLSearchParams();
  if (query.kind && query.kind !== "scope-picture") search.set("kind", query.kind);
  if (query.unit) search.set("unit", query.unit);
  if (query.page && query.page > 1) search.set("page", String(query.page));
  const text = search.toString();
  return `/projects/${encodeURIComponent(project)}/captures${text === "" ? "" : `?${text}`}`;
}
