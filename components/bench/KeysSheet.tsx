import { BottomSheet } from "./BottomSheet";
import { KeyTable } from "./KeyTable";
import { KEYS_FOR_PEOPLE } from "./key-map";

export function KeysSheet({ onClose }: { onClose: () => void }) {
  return (
    <BottomSheet title="Keys at the bench" onClose={onClose}>
      <KeyTable keys={KEYS_FOR_PEOPLE} />
      <p className="text-ink-soft mt-3 text-sm">
        A foot pedal that sends one of these keys works as the key. Typing a figure begins the reading. While you type
        in a field the keys are letters again; Escape leaves the field.
      </p>
    </BottomSheet>
  );
}
