import { database } from "@/db/client";
import { searchBoards, searchChecks, searchCovered, searchFaults, searchLog, searchUnits } from "@/db/queries/search";
import type { ProjectScope } from "@/lib/access/scope";
import { ok, type Answer } from "@/lib/actions/answer";
import { STATE_WORDS } from "@/lib/fault/fault-words";
import { stageName } from "@/lib/procedure/stages";
import { excerpt } from "./excerpt";
import type { SearchAnswer, SearchHit, SearchInput } from "./schema";

/** A palette shows few, the page more. */
const FEW = 6;
const MANY = 50;

const COVERED = { signals: "Signal", pins: "Pin", rails: "Rail" } as const;

/** Looks for every word in boards, units, checks, what checks cover, and the log of one project. */
export async function searchProject(
  scope: ProjectScope,
  input: SearchInput,
  most = FEW,
): Promise<Answer<SearchAnswer>> {
  // A zero byte can stand in no text of the database, so nothing is found by it.
  const words = input.q.replaceAll("\u0000", "").split(/\s+/u).filter(Boolean).slice(0, 8);
  if (words.length === 0) return ok({ q: input.q, hits: [], cut: false });
  const db = database();
  // One more than is shown tells whether there are more.
  const wanted = { words, limit: most + 1 };
  const base = `/projects/${scope.slug}`;
  const found = await Promise.all([
    searchBoards(db, scope, wanted).then((rows) =>
      rows.map((row): SearchHit => ({
        kind: "board",
        id: row.id,
        title: row.name,
        detail: [row.code, excerpt(row.summary, words)].filter(Boolean).join(" · "),
        state: null,
        href: `${base}/boards/${encodeURIComponent(row.code)}`,
      })),
    ),
    searchUnits(db, scope, wanted).then((rows) =>
      rows.map((row): SearchHit => ({
        kind: "unit",
        id: row.id,
        title: row.serial,
        detail: `${row.board}, rev ${row.revision}`,
        state: null,
        href: `${base}/units/${encodeURIComponent(row.serial)}`,
      })),
    ),
    searchChecks(db, scope, wanted).then((rows) =>
      rows.map((row): SearchHit => ({
        kind: "check",
        id: row.id,
        title: row.title,
        detail: `${row.serial} · ${stageName(row.stage)}`,
        state: row.state,
        href: `${base}/units/${encodeURIComponent(row.serial)}?check=${row.id}`,
      })),
    ),
    searchCovered(db, scope, wanted).then((rows) =>
      rows.map((row): SearchHit => ({
        kind: "signal",
        id: `${row.what} ${row.name}`,
        title: row.name,
        detail: `${COVERED[row.what]}, ${row.count === 1 ? "1 check" : `${row.count} checks`} on ${row.serials.slice(0, 3).join(", ")}${row.serials.length > 3 ? " …" : ""}`,
        state: null,
        href: `${base}/units/${encodeURIComponent(row.serials[0] ?? "")}?check=${row.first}`,
      })),
    ),
    searchFaults(db, scope, wanted).then((rows) =>
      rows.map((row): SearchHit => ({
        kind: "fault",
        id: row.id,
        title: `F${row.number} ${row.title}`,
        detail: [`${row.serial}, ${STATE_WORDS[row.state]}`, excerpt(row.says, words)].filter(Boolean).join(" · "),
        state: null,
        href: `${base}/faults/${row.number}`,
      })),
    ),
    searchLog(db, scope, wanted).then((rows) =>
      rows.map((row): SearchHit => ({
        kind: "log",
        id: row.id,
        title: row.title,
        detail: excerpt(row.body, words),
        state: null,
        href: `${base}/log/${row.id}`,
      })),
    ),
  ]);
  return ok({
    q: input.q,
    hits: found.flatMap((hits) => hits.slice(0, most)),
    cut: found.some((hits) => hits.length > most),
  });
}

export const searchProjectWhole = (scope: ProjectScope, input: SearchInput) => searchProject(scope, input, MANY);
