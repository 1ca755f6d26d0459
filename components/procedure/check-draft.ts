import { checkKind, CHECK_KINDS, type CheckKindName } from "@/lib/check-kinds/list";
import type { Stage } from "@/db/schema/procedures";
import type { CheckRow } from "@/lib/procedure/check-row";
import { readSpec } from "@/lib/procedure/read-check";
import { checkFields, type CheckFields } from "@/lib/procedure/schema";

/** A check as the form holds it: lists as one line of text, the kind's part as the kind's form has it. */
export type CheckDraft = {
  stage: Stage;
  title: string;
  instruction: string;
  caution: string;
  reference: string;
  holdPoint: boolean;
  kind: CheckKindName;
  typed: unknown;
  signals: string;
  pins: string;
  rails: string;
  blocks: string;
  needs: string[];
};

export function emptyDraft(stage: Stage): CheckDraft {
  const kind = CHECK_KINDS[0];
  const texts = {
    title: "",
    instruction: "",
    caution: "",
    reference: "",
    signals: "",
    pins: "",
    rails: "",
    blocks: "",
  };
  return { stage, kind: kind.name, typed: kind.emptyTyped, holdPoint: false, needs: [], ...texts };
}

export function draftOf(check: CheckRow): CheckDraft {
  const { stage, title, instruction, caution, reference, holdPoint, covers, needs } = check;
  const kind = checkKind(check.kind);
  return {
    ...{ stage, title, instruction, caution, reference, holdPoint, needs },
    kind: kind.name,
    typed: kind.typedFromSpec(check.spec),
    signals: covers.signals.join(", "),
    pins: covers.pins.join(", "),
    rails: covers.rails.join(", "),
    blocks: covers.blocks.join(", "),
  };
}

const listed = (text: string) =>
  text
    .split(/[,;\n]/)
    .map((name) => name.trim())
    .filter(Boolean);

export function fieldsOf(draft: CheckDraft): CheckFields {
  const { signals, pins, rails, blocks, ...rest } = draft;
  return {
    ...rest,
    covers: { signals: listed(signals), pins: listed(pins), rails: listed(rails), blocks: listed(blocks) },
  };
}

/** One sentence by field of the form, from the same schemas as the server's. Paths as the server gives them. */
export function problemsOf(draft: CheckDraft): Record<string, string> {
  const fields = fieldsOf(draft);
  const problems: Record<string, string> = {};
  const parsed = checkFields.safeParse(fields);
  for (const issue of parsed.error?.issues ?? []) problems[`check.${issue.path.join(".")}`] ??= issue.message;
  const spec = readSpec(fields);
  return spec.ok ? problems : { ...problems, ...spec.error.fields };
}
