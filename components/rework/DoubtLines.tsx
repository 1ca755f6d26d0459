import { StateGlyph } from "@/components/ui/glyphs/StateGlyph";
import { stageName } from "@/lib/procedure/stages";
import type { DoubtLineView } from "@/lib/rework/doubt-view";

export function DoubtLines({ lines, serial }: { lines: readonly DoubtLineView[]; serial: string }) {
  return (
    <ul className="grid gap-2">
      {lines.map((line) => (
        <li key={line.checkId} className="grid grid-cols-[1.75rem_minmax(0,1fr)] gap-x-2">
          <StateGlyph state={line.state} size={13} label={line.state} className="mt-1" />
          <div>
            <DoubtTitle line={line} serial={serial} />
            {line.sentences.map((sentence) => (
              <p key={sentence} className="text-ink-soft text-sm">
                {sentence}
              </p>
            ))}
          </div>
        </li>
      ))}
    </ul>
  );
}

export function DoubtTitle({ line, serial }: { line: DoubtLineView; serial: string }) {
  const stage = stageName(line.stage).toLowerCase();
  return (
    <p className="min-w-0">
      {line.title}{" "}
      <span className="text-ink-soft text-sm">({line.serial === serial ? stage : `${line.serial}, ${stage}`})</span>
    </p>
  );
}
