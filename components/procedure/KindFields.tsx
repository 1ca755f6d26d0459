import { RadioGroup } from "@/components/ui/RadioGroup";
import { CHECK_KINDS } from "@/lib/check-kinds/list";
import { SpecForm } from "@/lib/check-kinds/spec-forms";
import type { CheckDraft } from "./check-draft";
import { under } from "./problem-paths";

type Props = {
  draft: Pick<CheckDraft, "kind" | "typed">;
  problems: Record<string, string>;
  onChange: (change: Partial<Pick<CheckDraft, "kind" | "typed">>) => void;
};

/** The kind of the check, and under it what that kind wants to know. */
export function KindFields({ draft, problems, onChange }: Props) {
  return (
    <>
      <RadioGroup
        label="Kind of check"
        value={draft.kind}
        onChange={(id) => {
          const next = CHECK_KINDS.find((one) => one.name === id);
          if (next && next.name !== draft.kind) onChange({ kind: next.name, typed: next.emptyTyped });
        }}
        options={CHECK_KINDS.map(({ name, label, description }) => ({ id: name, label, description }))}
      />
      <div className="rounded-md border border-rule bg-raised/60 p-4">
        <SpecForm
          kind={draft.kind}
          value={draft.typed}
          onChange={(typed) => onChange({ typed })}
          errors={under(problems, "check.typed.")}
        />
      </div>
    </>
  );
}
