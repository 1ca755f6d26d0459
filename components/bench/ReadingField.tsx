"use client";

import clsx from "clsx";
import { useContext, useId, type Ref } from "react";
import { StateGlyph } from "@/components/ui/glyphs/StateGlyph";
import type { Verdict } from "@/db/schema/travelers";
import type { Judged } from "@/lib/check-kinds/kind";
import { VERDICTS } from "@/lib/check-kinds/verdict-word";
import { Pad } from "./PadSlot";

type Props = {
  ref: Ref<HTMLInputElement>;
  label: string;
  unit: string;
  typed: string;
  judged: Judged | undefined;
  verdict: Verdict | undefined;
  disabled: boolean;
  onTyped: (typed: string) => void;
  onEnter: () => void;
};

const BOXES: Record<Verdict, string> = {
  conforms: "border-passed bg-passed-ground",
  "guard-band": "border-doubtful bg-doubtful-ground",
  "does-not-conform": "border-failed bg-failed-ground",
};
const WORDS: Record<Verdict, string> = {
  conforms: "text-passed",
  "guard-band": "text-doubtful",
  "does-not-conform": "text-failed",
};

/** The reading as large as a meter shows it. The phone's own keyboard stays away; the pad is there. */
export function ReadingField({ ref, label, unit, typed, judged, verdict, disabled, onTyped, onEnter }: Props) {
  const id = useId();
  const pad = useContext(Pad);
  const wrong = judged && !judged.ok && typed.trim() !== "";
  return (
    <form
      className="min-w-0 flex-1"
      onSubmit={(event) => {
        event.preventDefault();
        onEnter();
      }}
    >
      <label htmlFor={id} className="text-ink-soft mb-1 block text-sm">
        {label}
      </label>
      <div
        className={clsx(
          "focus-within:outline-focus flex min-h-17 flex-wrap items-center gap-x-3 rounded-md border-2 px-3 py-1 outline-offset-2 focus-within:outline-2",
          verdict ? BOXES[verdict] : wrong ? "border-failed bg-raised" : "border-edge bg-raised",
        )}
      >
        <span className="mono flex min-w-0 flex-1 basis-40 items-baseline gap-2 text-4xl font-semibold">
          <input
            ref={ref}
            id={id}
            value={typed}
            disabled={disabled}
            onChange={(event) => onTyped(event.currentTarget.value)}
            onKeyDown={(event) => event.key === "Escape" && event.currentTarget.blur()}
            onFocus={pad.open}
            placeholder="–.––"
            inputMode="none"
            autoComplete="off"
            autoCorrect="off"
            spellCheck={false}
            enterKeyHint="done"
            maxLength={60}
            aria-invalid={wrong ? true : undefined}
            aria-describedby={`${id}-verdict`}
            size={Math.max(5, typed.length)}
            className="field-sizing-content placeholder:text-rule-strong max-w-full min-w-[2ch] bg-transparent outline-none"
          />
          <span className="text-2xl font-normal">{unit}</span>
        </span>
        <span id={`${id}-verdict`} role="status" className="text-base leading-tight font-semibold">
          {verdict && (
            <span className={clsx("flex items-center gap-2", WORDS[verdict])}>
              <StateGlyph state={VERDICTS[verdict].state} size={16} />
              {VERDICTS[verdict].word}
            </span>
          )}
        </span>
      </div>
      {wrong && <p className="text-failed mt-1 text-sm font-medium">{judged.message}</p>}
    </form>
  );
}
