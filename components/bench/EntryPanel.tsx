import clsx from "clsx";
import { Icon } from "@/components/ui/Icon";
import type { BenchKind } from "@/lib/check-kinds/bench-kind";
import { BenchButton } from "./BenchButton";
import type { Recording } from "./use-record";

type Props = {
  kind: BenchKind;
  spec: unknown;
  checkId: string;
  recording: Recording;
  rule: "simple" | "guarded";
  blocked: boolean;
  may: { attach: boolean };
  padShown: boolean;
  onPad: () => void;
  onRecord: (entry?: unknown) => void;
  onPhoto: () => void;
  onFile: () => void;
  onNote: () => void;
};

/** Everything one touches, at the lower edge where the thumb is. */
export function EntryPanel({
  kind,
  spec,
  checkId,
  recording,
  rule,
  blocked,
  may,
  padShown,
  onPad,
  onRecord,
  onPhoto,
  onFile,
  onNote,
}: Props) {
  const { BenchForm, stated } = kind;
  const required = kind.requires(spec);
  const there = required
    ? recording.files.filter((file) => file.refusal === "" && required.kinds.includes(file.kind)).length
    : 0;
  return (
    <div className="flex min-h-0 flex-col gap-2.5">
      <div className="grid min-h-0 gap-2.5 overflow-y-auto p-0.5 -m-0.5">
        {!blocked && (
          <BenchForm
            key={checkId}
            spec={spec}
            draft={recording.entry}
            onDraft={recording.setEntry}
            judged={recording.judged}
            onSubmit={(entry) => onRecord(entry)}
            busy={blocked}
            rule={rule}
          />
        )}
        {recording.trouble && recording.trouble.field !== "note" && !recording.judged && (
          <p role="alert" className="text-failed font-semibold">
            {recording.trouble.sentence}
          </p>
        )}
        {required && (
          <p
            className={
              there < required.minimum ? "text-doubtful text-sm font-semibold" : "text-passed text-sm font-semibold"
            }
          >
            {there} of {required.minimum}{" "}
            {required.kinds.includes("photo") ? (required.minimum === 1 ? "photo" : "photos") : "captures"} taken
          </p>
        )}
      </div>
      <div
        className={clsx(
          "grid shrink-0 gap-2",
          stated
            ? "grid-cols-[1fr_1fr_auto_auto] max-[389px]:grid-cols-2"
            : "grid-cols-[minmax(0,1.3fr)_minmax(0,1fr)_auto_auto] max-[389px]:grid-cols-2 lg:grid-cols-[1fr_1fr_auto_auto]",
        )}
      >
        {stated ? (
          <>
            <BenchButton
              kind="passed"
              disabled={blocked}
              onClick={() => onRecord(stated(true))}
              aria-keyshortcuts="Space"
            >
              Conforms
            </BenchButton>
            <BenchButton
              kind="failed"
              disabled={blocked}
              onClick={() => onRecord(stated(false))}
              aria-keyshortcuts="x"
              className="text-base sm:text-lg"
            >
              Does not conform
            </BenchButton>
          </>
        ) : (
          <>
            <BenchButton
              kind="primary"
              disabled={blocked || !recording.judged?.ok}
              onClick={() => onRecord()}
              aria-keyshortcuts="Enter"
              className="lg:col-span-2"
            >
              Record
            </BenchButton>
            <BenchButton onClick={onPad} aria-expanded={padShown} className="lg:hidden">
              {padShown ? "Hide pad" : "Pad"}
            </BenchButton>
          </>
        )}
        <BenchButton
          disabled={!may.attach}
          onClick={required && !required.kinds.includes("photo") ? onFile : onPhoto}
          aria-keyshortcuts="p"
          aria-label={required && !required.kinds.includes("photo") ? "Add a capture" : "Take a photo"}
          className="w-16 max-[389px]:w-full"
        >
          <Icon name={required && !required.kinds.includes("photo") ? "file" : "camera"} size={24} />
        </BenchButton>
        <BenchButton onClick={onNote} aria-keyshortcuts="n" className="w-16 text-base max-[389px]:w-full">
          Note
        </BenchButton>
      </div>
    </div>
  );
}
