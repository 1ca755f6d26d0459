import { Badge } from "@/components/ui/Badge";
import type { Tone } from "@/components/ui/tone";
import { stageName } from "@/lib/procedure/stages";
import type { Difference, Edit } from "@/lib/traveler/compare-versions";

type Line = { key: string; title: string; word: string; tone: Tone; stage: string; edits: Edit[] };

/** What differs between two versions, and what it means for attempts already recorded. */
export function DifferenceSheet({ difference }: { difference: Difference }) {
  const edited = difference.kept.filter((check) => check.edits.length > 0);
  const lines: Line[] = [
    ...difference.added.map((check) => ({ ...check, word: "new", tone: "passed" as const, edits: [] })),
    ...difference.changed.map((check) => ({ ...check, word: "starts afresh", tone: "doubtful" as const })),
    ...difference.dropped.map((check) => ({ ...check, word: "dropped", tone: "failed" as const, edits: [] })),
    ...edited.map((check) => ({ ...check, word: "attempts stay", tone: "plain" as const })),
  ].map((line) => ({ ...line, stage: stageName(line.stage) }));
  const untouched = difference.kept.length - edited.length;
  return (
    <div className="flex flex-col gap-3">
      {lines.length === 0 && <p className="text-ink-soft">Nothing differs.</p>}
      <ul className="flex flex-col">
        {lines.map((line) => (
          <li key={line.key} className="flex flex-col gap-1 border-b border-rule py-2 last:border-b-0">
            <span className="flex flex-wrap items-baseline gap-x-3">
              <Badge tone={line.tone}>{line.word}</Badge>
              <span className="font-semibold">{line.title}</span>
              <span className="text-sm text-ink-soft">{line.stage}</span>
            </span>
            {line.edits.map((edit) => (
              <span key={edit.what} className="grid grid-cols-[6.5rem_minmax(0,1fr)] gap-x-3 text-sm">
                <span className="text-ink-soft">{edit.what}</span>
                <span className="min-w-0">
                  <del className="text-ink-soft decoration-failed">{edit.from || "(empty)"}</del>{" "}
                  <ins className="no-underline">→ {edit.to || "(empty)"}</ins>
                </span>
              </span>
            ))}
          </li>
        ))}
      </ul>
      {lines.length > 0 && untouched > 0 && (
        <p className="text-sm text-ink-soft">
          {untouched === 1 ? "1 check is" : `${untouched} checks are`} the same in both.
        </p>
      )}
    </div>
  );
}
