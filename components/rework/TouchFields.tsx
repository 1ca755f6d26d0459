"use client";

import { NamesField } from "@/components/ui/NamesField";
import type { BoardNames } from "@/lib/board/load-board-names";
import type { Touches } from "@/lib/rework/schema";

type Props = {
  names: BoardNames;
  touches: Touches;
  onChange: (touches: Touches) => void;
  error: string | undefined;
};

const FIELDS: readonly { key: keyof Touches; label: string; placeholder: string }[] = [
  { key: "signals", label: "Signals", placeholder: "PH7, CARRY_N" },
  { key: "pins", label: "Pins", placeholder: "J1 a14, U6-12" },
  { key: "parts", label: "Parts", placeholder: "U6" },
  { key: "blocks", label: "Blocks", placeholder: "Full adder" },
  { key: "rails", label: "Rails", placeholder: "+5V" },
];

/** What the rework touches, picked from the board's pin map, blocks and rails or typed. */
export function TouchFields({ names, touches, onChange, error }: Props) {
  return (
    <fieldset className="min-w-0">
      <legend className="mb-1 text-sm font-semibold">What it touches</legend>
      <p className="text-ink-soft mb-3 text-sm">
        As much as the iron, the knife or the new part could have changed. A pin stands for its signal too.
      </p>
      <div className="grid items-start gap-x-5 gap-y-4 sm:grid-cols-2">
        {FIELDS.map(({ key, label, placeholder }) => (
          <NamesField
            key={key}
            label={label}
            placeholder={placeholder}
            names={touches[key]}
            choices={names[key]}
            onChange={(list) => onChange({ ...touches, [key]: list })}
          />
        ))}
      </div>
      {error && <p className="mt-2 text-sm font-medium text-failed">{error}</p>}
    </fieldset>
  );
}
