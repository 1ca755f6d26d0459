"use client";

import { Button } from "@/components/ui/Button";
import { ComboBox } from "@/components/ui/ComboBox";
import { Icon } from "@/components/ui/Icon";
import type { CheckRow } from "@/lib/procedure/check-row";
import { stageName } from "@/lib/procedure/stages";

type Props = {
  value: readonly string[];
  onChange: (keys: string[]) => void;
  error: string | undefined;
  others: readonly CheckRow[];
};

/** Other checks of the board that must hold first, besides the hold points before it. */
export function NeedsField({ value, onChange, error, others }: Props) {
  const chosen = value.flatMap((key) => others.find((check) => check.key === key) ?? []);
  return (
    <div className="flex flex-col gap-2">
      <ComboBox
        key={value.join()}
        label="Waits for"
        description="Checks that must hold first. Hold points before it count anyway."
        error={error}
        value={null}
        onChange={(key) => key && onChange([...value, key])}
        options={others
          .filter((check) => !value.includes(check.key))
          .map((check) => ({ id: check.key, label: check.title, description: stageName(check.stage) }))}
      />
      {chosen.length > 0 && (
        <ul className="flex flex-wrap gap-2">
          {chosen.map((check) => (
            <li key={check.key}>
              <Button
                size="sm"
                aria-label={`Do not wait for ${check.title}`}
                onPress={() => onChange(value.filter((key) => key !== check.key))}
              >
                {check.title} <Icon name="close" size={10} />
              </Button>
            </li>
          ))}
        </ul>
      )}
    </div>
  );
}
