import type { Coverage, Stage } from "@/db/schema/procedures";
import { checkKind } from "@/lib/check-kinds/list";

/** A check as a version of the procedure has it. */
export type VersionCheck = {
  /** Stays the same from version to version. */
  key: string;
  position: number;
  stage: Stage;
  title: string;
  instruction: string;
  caution: string;
  reference: string;
  holdPoint: boolean;
  kind: string;
  spec: unknown;
  covers: Coverage;
  needs: readonly string[];
};

/** One thing that differs, in words a person can compare. */
export type Edit = { what: string; from: string; to: string };

export type Difference = {
  /** Its attempts stay; edits are wording or order, which do not touch what was proved. */
  kept: { key: string; title: string; stage: Stage; edits: Edit[] }[];
  /** What it proves is another thing now: it starts afresh and the old one is kept as history. */
  changed: { key: string; title: string; stage: Stage; edits: Edit[] }[];
  added: { key: string; title: string; stage: Stage }[];
  /** No longer asked for; kept as history. */
  dropped: { key: string; title: string; stage: Stage }[];
};

/**
 * What a traveler that moves from one version to another keeps. An attempt goes on counting as long as the stage, the
 * kind, the limits and what else the kind asks for, and what the check covers are the same. New wording (title,
 * instruction, caution, reference), a hold point more or less, other prerequisites or another place leave attempts
 * alone, and are listed.
 */
export function compareVersions(from: readonly VersionCheck[], to: readonly VersionCheck[]): Difference {
  const before = new Map(from.map((check) => [check.key, check]));
  const after = new Map(to.map((check) => [check.key, check]));
  const names = new Map([...from, ...to].map((check) => [check.key, check.title]));
  const places = { before: predecessors(from, after), after: predecessors(to, before) };
  const difference: Difference = { kept: [], changed: [], added: [], dropped: [] };
  for (const check of inOrder(to)) {
    const { key, title, stage } = check;
    const old = before.get(key);
    if (!old) {
      difference.added.push({ key, title, stage });
      continue;
    }
    const substance = substanceEdits(old, check);
    const wording = [...wordingEdits(old, check, names), ...placeEdits(key, places, names)];
    if (substance.length > 0) difference.changed.push({ key, title, stage, edits: [...substance, ...wording] });
    else difference.kept.push({ key, title, stage, edits: wording });
  }
  for (const { key, title, stage } of inOrder(from)) {
    if (!after.has(key)) difference.dropped.push({ key, title, stage });
  }
  return difference;
}

const inOrder = (checks: readonly VersionCheck[]) => [...checks].sort((a, b) => a.position - b.position);

function substanceEdits(old: VersionCheck, now: VersionCheck): Edit[] {
  const edits = edited("stage", old.stage, now.stage);
  if (old.kind !== now.kind || !sameJson(old.spec, now.spec)) {
    edits.push({ what: "expectation", from: expectation(old), to: expectation(now) });
  }
  for (const part of ["signals", "pins", "rails", "blocks"] as const) {
    edits.push(...edited(part, [...old.covers[part]].sort().join(", "), [...now.covers[part]].sort().join(", ")));
  }
  return edits;
}

function wordingEdits(old: VersionCheck, now: VersionCheck, names: ReadonlyMap<string, string>): Edit[] {
  const needs = (check: VersionCheck) =>
    [...check.needs]
      .map((key) => names.get(key) ?? "a check that is gone")
      .sort()
      .join(", ");
  return [
    ...edited("title", old.title, now.title),
    ...edited("instruction", old.instruction, now.instruction),
    ...edited("caution", old.caution, now.caution),
    ...edited("reference", old.reference, now.reference),
    ...edited("hold point", old.holdPoint ? "yes" : "no", now.holdPoint ? "yes" : "no"),
    ...edited("needs", needs(old), needs(now)),
  ];
}

type Places = { before: ReadonlyMap<string, string | undefined>; after: ReadonlyMap<string, string | undefined> };

function placeEdits(key: string, places: Places, names: ReadonlyMap<string, string>): Edit[] {
  const say = (before: string | undefined) => (before === undefined ? "first" : `after “${names.get(before) ?? ""}”`);
  return edited("place", say(places.before.get(key)), say(places.after.get(key)));
}

/** For each check that both versions have: the one of them before it. Checks that came or went move nothing. */
function predecessors(
  checks: readonly VersionCheck[],
  other: ReadonlyMap<string, unknown>,
): Map<string, string | undefined> {
  const shared = inOrder(checks).filter((check) => other.has(check.key));
  return new Map(shared.map((check, index) => [check.key, shared[index - 1]?.key]));
}

const edited = (what: string, from: string, to: string): Edit[] => (from === to ? [] : [{ what, from, to }]);

function expectation({ kind, spec }: VersionCheck): string {
  const known = checkKind(kind);
  return `${known.label}: ${known.expectation(spec)}`;
}

/** Whether two JSON values say the same, whatever the order of their keys. */
function sameJson(a: unknown, b: unknown): boolean {
  return JSON.stringify(sorted(a)) === JSON.stringify(sorted(b));
}

function sorted(value: unknown): unknown {
  if (Array.isArray(value)) return value.map(sorted);
  if (typeof value !== "object" || value === null) return value;
  return Object.fromEntries(
    Object.entries(value)
      .sort(([a], [b]) => (a < b ? -1 : 1))
      .map(([key, inner]) => [key, sorted(inner)]),
  );
}
