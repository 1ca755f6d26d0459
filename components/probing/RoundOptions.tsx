"use client";

import { Checkbox } from "@/components/ui/Checkbox";
import { ComboBox } from "@/components/ui/ComboBox";
import { QuantityField } from "@/components/ui/QuantityField";
import { RadioGroup } from "@/components/ui/RadioGroup";
import { Select } from "@/components/ui/Select";
import { PROBE_LIMIT_CLASSES } from "@/lib/calc/continuity";
import { shortQuantity } from "@/lib/calc/units";
import type { RoundsView } from "@/lib/probing/load-rounds";
import { LIMIT_CLASSES, ROUND_SCOPES } from "@/lib/probing/schema";
import type { NewRoundState } from "./use-new-round";
import { SignalChoice } from "./SignalChoice";

const CLASS_OPTIONS = [
  ...PROBE_LIMIT_CLASSES.map(({ class: id, continuityOhm, isolationOhm }) => ({
    id,
    label: `IPC-9252 class ${id}`,
    description: `joined at most ${shortQuantity(continuityOhm, "Ω")}, apart at least ${shortQuantity(isolationOhm, "Ω")}`,
  })),
  { id: "own", label: "Limits of our own" },
];

type Props = { state: NewRoundState; chosen: NonNullable<RoundsView["chosen"]> };

/** What a round is about: how much of the board, bare or not, by which limits. */
export function RoundOptions({ state: { options, refused, choose }, chosen }: Props) {
  const said = (field: string) => refused?.fields?.[`options.${field}`];
  return (
    <div className="grid gap-x-8 gap-y-5 md:grid-cols-2">
      <RadioGroup
        label="The board is"
        options={[
          {
            id: "populated",
            label: "Populated",
            description: "Low voltage; isolation says only that there is no short.",
          },
          { id: "bare", label: "Bare", description: "The limits of the class hold." },
        ]}
        value={options.populated ? "populated" : "bare"}
        onChange={(id) => choose({ populated: id === "populated" })}
      />
      <RadioGroup
        label="Probe"
        options={[
          { id: "all", label: "The whole board" },
          { id: "connector", label: "One connector or part" },
          { id: "signals", label: "Some signals", description: "For instance those that a rework touched." },
          { id: "rails", label: "Only rails and grounds" },
        ]}
        value={options.only}
        onChange={(id) => choose({ only: ROUND_SCOPES.find((one) => one === id) ?? "all" })}
      />
      <div className="flex flex-col gap-3">
        <Select
          label="Limits"
          className="max-w-72"
          options={CLASS_OPTIONS}
          value={options.limits}
          onChange={(id) => choose({ limits: LIMIT_CLASSES.find((one) => one === id) ?? "3" })}
        />
        {options.limits === "own" && (
          <div className="flex flex-wrap gap-4">
            <QuantityField
              label="Joined, at most"
              className="w-40"
              value={options.continuityOhm}
              error={said("continuityOhm")}
              onChange={(continuityOhm) => choose({ continuityOhm })}
            />
            <QuantityField
              label="Apart, at least"
              className="w-40"
              value={options.isolationOhm}
              error={said("isolationOhm")}
              onChange={(isolationOhm) => choose({ isolationOhm })}
            />
          </div>
        )}
      </div>
      <div className="flex flex-col gap-3">
        {options.only === "connector" && (
          <ComboBox
            label="Connector or part"
            className="max-w-72"
            options={chosen.parts.map((id) => ({ id, label: id }))}
            value={options.connector}
            onChange={(id) => choose({ connector: id ?? "" })}
            error={said("connector")}
          />
        )}
        {options.only === "signals" && (
          <SignalChoice
            signals={options.signals}
            known={chosen.signals}
            reworks={chosen.reworks}
            error={said("signals")}
            onChange={(signals) => choose({ signals })}
          />
        )}
        <div className="flex flex-col">
          <Checkbox label="Vias and mid-points, too" value={options.vias} onChange={(vias) => choose({ vias })} />
          <Checkbox
            label="Unconnected pads touch nothing"
            value={options.unconnected}
            onChange={(unconnected) => choose({ unconnected })}
          />
        </div>
      </div>
    </div>
  );
}
