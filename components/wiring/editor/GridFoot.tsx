import { Kbd } from "@/components/ui/Kbd";
import type { Said } from "./use-pin-grid";

const KEYS: readonly (readonly [string[], string])[] = [
  [["↑", "↓", "←", "→"], "move"],
  [["Enter"], "edit"],
  [["Shift ↓"], "select"],
  [["Ctrl D"], "fill down"],
  [["Ctrl C", "Ctrl V"], "copy and paste a block"],
  [["Ctrl Z"], "undo"],
  [["Ctrl S"], "save"],
];

type Props = { said: Said | undefined; isReadOnly: boolean; unsaved: number };

/** What just happened, and the keys. */
export function GridFoot({ said, isReadOnly, unsaved }: Props) {
  const keys = isReadOnly ? KEYS.filter(([, word]) => word === "move") : KEYS;
  return (
    <div className="flex flex-col gap-1.5 border-t border-rule px-4 py-2.5 text-sm sm:px-5">
      <p role="status" className={said?.isRefusal ? "font-medium text-failed" : "text-ink"}>
        {said?.text}
      </p>
      <p className="flex flex-wrap items-center gap-x-4 gap-y-1.5 text-xs text-ink-soft">
        {keys.map(([caps, word]) => (
          <span key={word} className="flex items-center gap-1">
            {caps.map((cap) => (
              <Kbd key={cap}>{cap}</Kbd>
            ))}
            {word}
          </span>
        ))}
        {!isReadOnly && (
          <span>
            <b className="mono font-semibold text-ink">D[7:0]</b> over eight pins fills D7 to D0.
          </span>
        )}
        {unsaved > 0 && <span>What is not saved stays on this device, also when you leave the page.</span>}
      </p>
    </div>
  );
}
