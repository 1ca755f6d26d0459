import { Icon } from "@/components/ui/Icon";
import { BenchButton } from "./BenchButton";

type Props = {
  hasPrevious: boolean;
  hasNext: boolean;
  onStep: (by: 1 | -1) => void;
  reading: { on: boolean; possible: boolean; toggle: () => void };
  onKeys: () => void;
  onFile: (() => void) | undefined;
};

/** What one needs less often, at the end of the sheet: walking the checks, adding a file, reading aloud, the keys. */
export function CheckTools({ hasPrevious, hasNext, onStep, reading, onKeys, onFile }: Props) {
  return (
    <div className="border-rule grid gap-2 border-t pt-4">
      <div className="grid grid-cols-2 gap-2">
        <BenchButton disabled={!hasPrevious} onClick={() => onStep(-1)} aria-keyshortcuts="ArrowLeft">
          <Icon name="chevron-left" /> Previous
        </BenchButton>
        <BenchButton disabled={!hasNext} onClick={() => onStep(1)} aria-keyshortcuts="ArrowRight">
          Next <Icon name="chevron-right" />
        </BenchButton>
      </div>
      <div className="flex flex-wrap gap-2">
        {onFile && (
          <BenchButton size="md" kind="quiet" onClick={onFile}>
            <Icon name="file" /> Add a file
          </BenchButton>
        )}
        {reading.possible && (
          <BenchButton size="md" kind="quiet" aria-pressed={reading.on} onClick={reading.toggle}>
            {reading.on ? "Reads aloud: on" : "Read aloud"}
          </BenchButton>
        )}
        <BenchButton size="md" kind="quiet" onClick={onKeys} className="pointer-coarse:hidden">
          Keys <span className="mono text-ink-soft">?</span>
        </BenchButton>
      </div>
    </div>
  );
}
