import { Notice } from "@/components/ui/Notice";
import type { BenchKind } from "@/lib/check-kinds/bench-kind";
import type { CheckView } from "@/lib/traveler/traveler-view";
import { BenchButton } from "./BenchButton";
import type { OpenSheet } from "./BenchSheets";
import { CheckBody } from "./CheckBody";
import { CheckTools } from "./CheckTools";
import { InstrumentPicker } from "./InstrumentPicker";
import { LastAttempts } from "./LastAttempts";
import { RefusedNotice } from "./RefusedNotice";
import type { Bench } from "./use-bench";
import type { Recording } from "./use-record";

type Props = {
  bench: Bench;
  recording: Recording;
  current: CheckView;
  kind: BenchKind;
  unitHref: string;
  zone: string;
  reading: { on: boolean; possible: boolean; toggle: () => void };
  onSheet: (sheet: OpenSheet) => void;
  onFile: (() => void) | undefined;
};

/** What one reads: the check, what the server said, with what one measures, what was found before. */
export function CheckColumn({ bench, recording, current, kind, unitHref, zone, reading, onSheet, onFile }: Props) {
  return (
    <main className="min-h-0 flex-1 overflow-y-auto overscroll-contain px-4 pt-4 pb-6">
      <CheckBody
        check={current}
        board={bench.traveler.board}
        expected={kind.expected(current.spec)}
        measured={kind.measured}
      >
        {bench.told && (
          <Notice
            kind="info"
            actions={
              <BenchButton size="md" onClick={bench.dismissTold}>
                Seen
              </BenchButton>
            }
            role="status"
          >
            {bench.told}
          </Notice>
        )}
        {bench.refused.map((attempt) => (
          <RefusedNotice
            key={attempt.body.id}
            attempt={attempt}
            onRetry={() => void bench.queue().retry(attempt)}
            onDiscard={() => void bench.queue().withdraw(attempt.body.id)}
          />
        ))}
        {kind.measured && (
          <InstrumentPicker
            fitting={recording.instrument.fitting}
            chosen={recording.instrument.instrument}
            onChoose={recording.instrument.choose}
            settingsHref="/settings/instruments"
          />
        )}
        {recording.note && (
          <button
            type="button"
            onClick={() => onSheet("note")}
            className="border-rule bg-raised rounded-md border px-4 py-3 text-left"
          >
            <span className="text-ink-soft block text-sm">Note with this attempt</span>
            <span className="whitespace-pre-line">{recording.note}</span>
          </button>
        )}
        <LastAttempts
          attempts={current.attempts}
          coming={bench.coming}
          historyHref={`${unitHref}?check=${current.id}`}
          zone={zone}
        />
        <CheckTools
          hasPrevious={bench.index > 0}
          hasNext={bench.index < bench.checks.length - 1}
          onStep={bench.step}
          reading={reading}
          onKeys={() => onSheet("keys")}
          onFile={onFile}
        />
      </CheckBody>
    </main>
  );
}
