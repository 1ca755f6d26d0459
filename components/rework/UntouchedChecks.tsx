"use client";

import { Button } from "@/components/ui/Button";
import { StateGlyph } from "@/components/ui/glyphs/StateGlyph";
import type { DoubtLineView } from "@/lib/rework/doubt-view";
import { DoubtTitle } from "./DoubtLines";
import type { Choice } from "./rework-draft";

type Props = {
  lines: readonly DoubtLineView[];
  serial: string;
  added: readonly Choice[];
  onAdded: (list: Choice[]) => void;
};

/** Those that stay as they are; one that the builder does not trust can be put in doubt by hand. */
export function UntouchedChecks({ lines, serial, added, onAdded }: Props) {
  return (
    <ul className="grid gap-2">
      {lines.map((line) => (
        <li key={line.checkId} className="grid grid-cols-[1.75rem_minmax(0,1fr)_auto] items-start gap-x-2">
          <StateGlyph state={line.state} size={13} label={line.state} className="mt-1" />
          <DoubtTitle line={line} serial={serial} />
          {line.state === "passed" && (
            <Button
              size="sm"
              kind="quiet"
              onPress={() => onAdded([...added, { checkId: line.checkId, reason: "" }])}
              aria-label={`Put “${line.title}” in doubt, too`}
            >
              Doubt it
            </Button>
          )}
        </li>
      ))}
    </ul>
  );
}
