"use client";

import { Button } from "@/components/ui/Button";
import { DateTime } from "@/components/ui/DateTime";
import { StateGlyph } from "@/components/ui/glyphs/StateGlyph";
import type { DoubtLineView } from "@/lib/rework/doubt-view";
import { DoubtTitle } from "./DoubtLines";
import type { Choice } from "./rework-draft";

type Props = {
  lines: readonly DoubtLineView[];
  serial: string;
  zone: string;
  /** As the device's clock writes it; empty is now. */
  performedAt: string;
  added: readonly Choice[];
  spared: readonly Choice[];
  onAdded: (list: Choice[]) => void;
  onSpared: (list: Choice[]) => void;
};

/** Those that must be repeated, each with its reason. What is being spared stands in a list of its own. */
export function DoubtfulChecks({ lines, serial, zone, performedAt, added, spared, onAdded, onSpared }: Props) {
  const done = performedAt === "" ? undefined : new Date(performedAt).getTime();
  const shown = lines.filter((line) => !spared.some(({ checkId }) => checkId === line.checkId));
  return (
    <ul className="border-rule divide-rule divide-y border-y empty:hidden">
      {shown.map((line) => (
        <li key={line.checkId} className="grid grid-cols-[1.75rem_minmax(0,1fr)_auto] items-start gap-x-2 py-2.5">
          <StateGlyph state="doubtful" size={14} className="mt-1" />
          <div className="min-w-0">
            <DoubtTitle line={line} serial={serial} />
            {line.sentences.map((sentence) => (
              <p key={sentence} className="text-ink-soft text-sm">
                {sentence}
              </p>
            ))}
            {done !== undefined && line.lastAt !== null && Date.parse(line.lastAt) > done && (
              <p className="text-doubtful text-sm font-medium">
                It was last carried out <DateTime at={line.lastAt} zone={zone} form="short" />, after the rework. Spare
                it if that proved it with the rework in place.
              </p>
            )}
          </div>
          {line.isAdded && added.some(({ checkId }) => checkId === line.checkId) ? (
            <Button
              size="sm"
              kind="quiet"
              onPress={() => onAdded(added.filter(({ checkId }) => checkId !== line.checkId))}
              aria-label={`Take “${line.title}” out again`}
            >
              Take out
            </Button>
          ) : (
            <Button
              size="sm"
              kind="quiet"
              onPress={() => onSpared([...spared, { checkId: line.checkId, reason: "" }])}
              aria-label={`Spare “${line.title}”`}
            >
              Spare
            </Button>
          )}
        </li>
      ))}
    </ul>
  );
}
