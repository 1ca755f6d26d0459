"use client";

import { RadioGroup } from "@/components/ui/RadioGroup";
import { TextField } from "@/components/ui/TextField";
import type { ReworkDraft } from "./rework-draft";

type Wire = ReworkDraft["wire"];
type Props = {
  wire: Wire;
  onChange: (wire: Wire) => void;
  fields: Record<string, string>;
};

const WAYS = [
  { id: "in", label: "Put in" },
  { id: "out", label: "Taken out" },
];

/** Which wire, from where to where. Under a number that is there already it is that wire, moved. */
export function WireFields({ wire, onChange, fields }: Props) {
  const field = (key: Exclude<keyof Wire, "out">) => ({
    value: wire[key],
    onChange: (text: string) => onChange({ ...wire, [key]: text }),
    error: fields[`wire.${key}`],
    autoComplete: "off" as const,
  });
  return (
    <fieldset className="grid min-w-0 gap-3">
      <legend className="sr-only">The wire</legend>
      <RadioGroup
        label="The wire was"
        isLabelHidden
        isInRow
        options={WAYS}
        value={wire.out ? "out" : "in"}
        onChange={(id) => onChange({ ...wire, out: id === "out" })}
      />
      <div className="grid grid-cols-2 items-start gap-x-4 gap-y-3 sm:grid-cols-[5.5rem_minmax(0,1fr)_minmax(0,1fr)_8rem]">
        <TextField label="Wire" mono {...field("number")} />
        <TextField label="Colour" placeholder="white" className="sm:order-last" {...field("colour")} />
        <TextField label="From" placeholder="U6-12" mono {...field("from")} />
        <TextField label="To" placeholder="U9-3" mono {...field("to")} />
      </div>
    </fieldset>
  );
}
