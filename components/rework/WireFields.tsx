"use client";

import { TextField } from "@/components/ui/TextField";
import type { ReworkDraft } from "./rework-draft";

type Props = {
  wire: ReworkDraft["wire"];
  onChange: (wire: ReworkDraft["wire"]) => void;
  fields: Record<string, string>;
};

export function WireFields({ wire, onChange, fields }: Props) {
  const field = (key: keyof ReworkDraft["wire"]) => ({
    value: wire[key],
    onChange: (text: string) => onChange({ ...wire, [key]: text }),
    error: fields[`wire.${key}`],
    autoComplete: "off" as const,
  });
  return (
    <fieldset className="grid min-w-0 grid-cols-2 items-start gap-x-4 gap-y-3 sm:grid-cols-[5.5rem_minmax(0,1fr)_minmax(0,1fr)_8rem]">
      <legend className="sr-only">The wire</legend>
      <TextField label="Wire" mono {...field("number")} />
      <TextField label="Colour" placeholder="white" className="sm:order-last" {...field("colour")} />
      <TextField label="From" placeholder="U6-12" mono {...field("from")} />
      <TextField label="To" placeholder="U9-3" mono {...field("to")} />
    </fieldset>
  );
}
