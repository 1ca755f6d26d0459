import { BottomSheet } from "@/components/bench/BottomSheet";
import { KeyTable } from "@/components/bench/KeyTable";

const KEYS = [
  { keys: "Space, Enter", does: "it beeps" },
  { keys: "x", does: "it stays silent" },
  { keys: "0 … 9", does: "begins a resistance; Enter records it, Escape leaves it" },
  { keys: "←", does: "back to the last answer, to correct it" },
  { keys: "n, →", does: "on to the next pair, without an answer" },
  { keys: "?", does: "show or hide the keys" },
] as const;

export function ProbeKeys({ onClose }: { onClose: () => void }) {
  return (
    <BottomSheet title="Keys while probing" onClose={onClose}>
      <KeyTable keys={KEYS} />
      <p className="mt-3 text-sm text-ink-soft">A foot pedal that sends one of these keys works as the key.</p>
    </BottomSheet>
  );
}
