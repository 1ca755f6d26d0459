import type { Coverage, Stage } from "@/db/schema/procedures";
import { checkKind } from "@/lib/check-kinds/list";
import type { Starter } from "./starter";

export type NewCheck = {
  key: string;
  stage: Stage;
  title: string;
  instruction: string;
  caution: string;
  reference: string;
  holdPoint: boolean;
  kind: string;
  spec: unknown;
  covers: Coverage;
  needs: string[];
};

const NOTHING: Coverage = { signals: [], pins: [], rails: [], blocks: [] };

/** A starter as rows of a new draft: own keys, and specs read by the kinds as if somebody had typed them. */
export function readStarter(starter: Starter, newKey: () => string): NewCheck[] {
  const keys = new Map(starter.checks.map((check) => [check.id, newKey()]));
  const keyOf = (id: string) => {
    const key = keys.get(id);
    if (key === undefined) throw new Error(`The starter ${starter.id} has no check ${id}.`);
    return key;
  };
  return starter.checks.map((check) => {
    const spec = checkKind(check.kind).readTyped(check.typed);
    if (!spec.ok)
      throw new Error(`The starter ${starter.id} has a flaw in ${check.id}: ${JSON.stringify(spec.fields)}`);
    return {
      key: keyOf(check.id),
      stage: check.stage,
      title: check.title,
      instruction: check.instruction,
      caution: check.caution ?? "",
      reference: check.reference ?? "",
      holdPoint: check.holdPoint ?? false,
      kind: check.kind,
      spec: spec.value,
      covers: { ...NOTHING, ...check.covers },
      needs: (check.needs ?? []).map(keyOf),
    };
  });
}
