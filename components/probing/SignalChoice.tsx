"use client";

import { Button } from "@/components/ui/Button";
import { ComboBox } from "@/components/ui/ComboBox";
import { IconButton } from "@/components/ui/IconButton";
import type { TouchedByRework } from "@/lib/probing/load-rounds";

type Props = {
  signals: readonly string[];
  known: readonly string[];
  reworks: readonly TouchedByRework[];
  error: string | undefined;
  onChange: (signals: string[]) => void;
};

/** Signals one by one, or all that a rework touched. */
export function SignalChoice({ signals, known, reworks, error, onChange }: Props) {
  const add = (names: readonly string[]) => onChange([...new Set([...signals, ...names])]);
  return (
    <div className="flex flex-col gap-2">
      <ComboBox
        label="Add a signal"
        className="max-w-72"
        options={known.filter((name) => !signals.includes(name)).map((id) => ({ id, label: id }))}
        value=""
        onChange={(id) => id && add([id])}
        error={signals.length === 0 ? error : undefined}
      />
      {signals.length > 0 && (
        <ul aria-label="Signals of the round" className="flex max-h-40 flex-wrap gap-1.5 overflow-y-auto">
          {signals.map((name) => (
            <li key={name} className="flex items-center rounded border border-rule-strong bg-raised pl-2">
              <span className="mono text-sm">{name}</span>
              <IconButton
                label={`Leave ${name} out`}
                icon="close"
                size="sm"
                onPress={() => onChange(signals.filter((one) => one !== name))}
              />
            </li>
          ))}
        </ul>
      )}
      {reworks.length > 0 && (
        <div className="flex flex-wrap gap-2">
          {reworks.map((rework) => (
            <Button key={rework.number} size="sm" onPress={() => add(rework.signals)}>
              Those of rework R{rework.number}
            </Button>
          ))}
        </div>
      )}
    </div>
  );
}
