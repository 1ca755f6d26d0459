import type { Ref } from "react";
import { BenchButton } from "@/components/bench/BenchButton";
import type { Probing } from "./use-probing";

type Props = {
  probing: Probing;
  field: Ref<HTMLInputElement>;
  reading: { on: boolean; possible: boolean; toggle: () => void };
  onKeys: () => void;
};

/** What one touches: beeps, silent, or a figure. */
export function AnswerPanel({ probing, field, reading, onKeys }: Props) {
  const { typed, setTyped, problem, answer, back, next } = probing;
  return (
    <section
      aria-label="Answer"
      className="flex shrink-0 flex-col gap-2.5 border-t border-rule bg-sheet px-4 pt-3 pb-[max(0.75rem,env(safe-area-inset-bottom))] lg:self-start lg:border-t-0 lg:pt-6"
    >
      <div className="grid grid-cols-2 gap-2">
        <BenchButton kind="passed" onClick={() => answer({ beeps: true })} aria-keyshortcuts="Space Enter">
          Beeps
        </BenchButton>
        <BenchButton onClick={() => answer({ beeps: false })} aria-keyshortcuts="x">
          Silent
        </BenchButton>
      </div>
      <form
        noValidate
        className="grid grid-cols-[minmax(0,1fr)_auto] items-end gap-2"
        onSubmit={(event) => {
          event.preventDefault();
          if (typed.trim() !== "") answer({ typed });
        }}
      >
        <label className="block text-sm text-ink-soft">
          Or the resistance
          <input
            ref={field}
            value={typed}
            onChange={(event) => setTyped(event.target.value)}
            onKeyDown={(event) => {
              if (event.key === "Escape") event.currentTarget.blur();
            }}
            inputMode="decimal"
            autoComplete="off"
            spellCheck={false}
            placeholder="0R3, 4k7, OL"
            aria-invalid={problem !== undefined}
            aria-describedby={problem === undefined ? undefined : "typed-problem"}
            className="mono mt-1 block min-h-14 w-full rounded-md border border-edge bg-raised px-3 text-2xl font-semibold text-ink placeholder:text-base placeholder:font-normal placeholder:text-ink-faint"
          />
        </label>
        <BenchButton type="submit" kind="primary" className="min-h-14" disabled={typed.trim() === ""}>
          Ω<span className="sr-only">: record the resistance</span>
        </BenchButton>
      </form>
      {problem && (
        <p id="typed-problem" role="alert" className="text-sm font-medium text-failed">
          {problem}
        </p>
      )}
      <div className="flex flex-wrap items-center gap-1">
        <BenchButton size="md" kind="quiet" onClick={back} aria-keyshortcuts="ArrowLeft">
          ← Back and correct
        </BenchButton>
        <BenchButton size="md" kind="quiet" onClick={next} aria-keyshortcuts="n ArrowRight">
          Next →
        </BenchButton>
        {reading.possible && (
          <BenchButton size="md" kind="quiet" aria-pressed={reading.on} onClick={reading.toggle}>
            {reading.on ? "Reads aloud: on" : "Read aloud"}
          </BenchButton>
        )}
        <BenchButton size="md" kind="quiet" onClick={onKeys} className="pointer-coarse:hidden">
          Keys <span className="mono text-ink-soft">?</span>
        </BenchButton>
      </div>
    </section>
  );
}
