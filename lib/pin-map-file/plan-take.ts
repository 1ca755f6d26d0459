import { EMPTY_TEXTS, isEmptyRow, type PinTexts } from "@/lib/pin-map/pin-columns";
import type { TakeTarget } from "./resolve-target";
import { sameTexts, type FilePin } from "./judge-rows";

export type PinChange = { pin: string; kind: "added" | "changed" | "cleared"; before: PinTexts; after: PinTexts };

/** What taking the file would do to one connector. */
export type TargetPlan = { target: TakeTarget; changes: PinChange[]; unchanged: number };

export type TakePlan = { targets: TargetPlan[]; added: number; changed: number; cleared: number; unchanged: number };

/** Pins that the file does not name stay as they are, or are cleared on the connectors that it does name. */
export type Unnamed = "keep" | "clear";

/** Compares what the file says with what is kept. Nothing is changed by it. */
export function planTake(pins: readonly FilePin[], unnamed: Unnamed): TakePlan {
  const byTarget = new Map<TakeTarget, Map<string, PinTexts>>();
  for (const { target, pin, texts } of pins) {
    const named = byTarget.get(target) ?? new Map<string, PinTexts>();
    named.set(pin, texts);
    byTarget.set(target, named);
  }
  const targets = [...byTarget].map(([target, named]) => planTarget(target, named, unnamed));
  const count = (kind: PinChange["kind"]) =>
    targets.reduce((total, { changes }) => total + changes.filter((change) => change.kind === kind).length, 0);
  return {
    targets,
    added: count("added"),
    changed: count("changed"),
    cleared: count("cleared"),
    unchanged: targets.reduce((total, target) => total + target.unchanged, 0),
  };
}

function planTarget(target: TakeTarget, named: ReadonlyMap<string, PinTexts>, unnamed: Unnamed): TargetPlan {
  const left = unnamed === "clear" ? Object.keys(target.kept).filter((pin) => !named.has(pin)) : [];
  const order = new Map(target.face.pins.map(({ name }, at) => [name, at]));
  const place = (pin: string) => order.get(pin) ?? order.size;
  const all = [...named, ...left.map((pin) => [pin, EMPTY_TEXTS] as const)].sort(([a], [b]) => place(a) - place(b));
  const changes = all.flatMap(([pin, after]): PinChange[] => {
    const before = target.kept[pin] ?? EMPTY_TEXTS;
    if (sameTexts(before, after)) return [];
    const kind = isEmptyRow(after) ? "cleared" : isEmptyRow(before) ? "added" : "changed";
    return [{ pin, kind, before, after }];
  });
  return { target, changes, unchanged: all.length - changes.length };
}
