import { TextField } from "@/components/ui/TextField";
import type { CheckDraft } from "./check-draft";
import { firstUnder } from "./problem-paths";

type Name = "signals" | "pins" | "rails" | "blocks";
type Props = {
  draft: Pick<CheckDraft, Name>;
  problems: Record<string, string>;
  onChange: (change: Partial<Pick<CheckDraft, Name>>) => void;
};

/** What the check proves: signals, pins, rails and blocks, each a line of names. */
export function CoversFields({ draft, problems, onChange }: Props) {
  const covered = (name: Name) => ({
    value: draft[name],
    onChange: (value: string) => onChange({ [name]: value }),
    error: problems[`check.covers.${name}`] ?? firstUnder(problems, `check.covers.${name}.`),
  });
  return (
    <fieldset className="flex flex-col gap-3">
      <legend className="mb-1 text-sm font-semibold">What it proves</legend>
      <p className="text-sm text-ink-soft">
        Separated by commas. A rework that touches one of these puts the check in doubt; pins light up on the bench.
      </p>
      <div className="grid gap-3 sm:grid-cols-2">
        <TextField label="Signals" mono placeholder="CLK, PH7" {...covered("signals")} />
        <TextField label="Pins" mono placeholder="J1 a4, J1 c4" {...covered("pins")} />
        <TextField label="Rails" mono placeholder="+5 V, GND" {...covered("rails")} />
        <TextField label="Blocks" mono placeholder="divider" {...covered("blocks")} />
      </div>
    </fieldset>
  );
}
