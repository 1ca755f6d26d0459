import { BottomSheet } from "./BottomSheet";
import { HeldSheet } from "./HeldSheet";
import { KeysSheet } from "./KeysSheet";
import { NoteSheet } from "./NoteSheet";
import { OverviewSheet } from "./OverviewSheet";
import type { HeldAttempt } from "./queue/held-attempt";
import { restore, type Bench } from "./use-bench";
import type { Recording } from "./use-record";

export type OpenSheet = "overview" | "held" | "note" | "verdict-note" | "keys" | "no-room";

type Props = {
  sheet: OpenSheet | undefined;
  onSheet: (sheet: OpenSheet | undefined) => void;
  bench: Bench;
  recording: Recording;
  onRecord: (entry: unknown) => void;
};

export function BenchSheets({ sheet, onSheet, bench, recording, onRecord }: Props) {
  const close = () => onSheet(undefined);
  const edit = async (attempt: HeldAttempt) => {
    await bench.queue().withdraw(attempt.body.id);
    await restore(attempt).catch(() => undefined);
    bench.open(attempt.body.checkId);
    close();
  };
  switch (sheet) {
    case "overview":
      return (
        <OverviewSheet
          checks={bench.checks}
          openId={bench.current?.id}
          onClose={close}
          onOpen={(id) => {
            bench.open(id);
            close();
          }}
        />
      );
    case "held":
      return (
        <HeldSheet
          queue={bench.queueState}
          signInHref={`/sign-in?next=${encodeURIComponent(location.pathname + location.search)}`}
          onClose={close}
          onTryNow={() => void bench.queue().runNow()}
          onEdit={(attempt) => void edit(attempt)}
          onRetry={(attempt) => void bench.queue().retry(attempt)}
          onDiscard={(attempt) => void bench.queue().withdraw(attempt.body.id)}
        />
      );
    case "note":
      return <NoteSheet note={recording.note} onNote={recording.setNote} onClose={close} />;
    case "verdict-note":
      return (
        <NoteSheet
          note={recording.note}
          onNote={recording.setNote}
          onClose={close}
          asked={{
            sentence: recording.trouble?.sentence ?? "What does not conform?",
            onRecord: () => onRecord(recording.entry),
          }}
        />
      );
    case "keys":
      return <KeysSheet onClose={close} />;
    case "no-room":
      return (
        <BottomSheet title="The file was not kept" onClose={close}>
          <p>This device has no room left for it, or its storage is forbidden. Nothing else was changed.</p>
        </BottomSheet>
      );
    case undefined:
      return null;
  }
}
