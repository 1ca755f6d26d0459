import { useId } from "react";
import { BenchButton } from "./BenchButton";
import { BottomSheet } from "./BottomSheet";

const LONGEST = 2000;

type Props = {
  note: string;
  onNote: (note: string) => void;
  onClose: () => void;
  /** Present when the note is what a verdict still lacks. */
  asked?: { sentence: string; onRecord: () => void };
};

/** The note that goes with the attempt. Kept as one types. */
export function NoteSheet({ note, onNote, onClose, asked }: Props) {
  const id = useId();
  return (
    <BottomSheet title={asked ? "Does not conform" : "Note"} onClose={onClose}>
      <form
        className="grid gap-3"
        onSubmit={(event) => {
          event.preventDefault();
          if (asked) asked.onRecord();
          else onClose();
        }}
      >
        <label htmlFor={id} className="font-semibold">
          {asked ? asked.sentence : "Goes on the traveler with this attempt"}
        </label>
        <textarea
          id={id}
          value={note}
          rows={4}
          maxLength={LONGEST}
          onChange={(event) => onNote(event.currentTarget.value)}
          onKeyDown={(event) => {
            if (event.key === "Enter" && (event.ctrlKey || event.metaKey)) event.currentTarget.form?.requestSubmit();
          }}
          className="border-edge bg-raised field-sizing-content max-h-[40dvh] min-h-28 w-full rounded-md border p-3 text-lg"
        />
        {asked ? (
          <BenchButton type="submit" kind="failed" disabled={note.trim() === ""}>
            Record: does not conform
          </BenchButton>
        ) : (
          <BenchButton type="submit" kind="primary">
            Keep the note
          </BenchButton>
        )}
      </form>
    </BottomSheet>
  );
}
