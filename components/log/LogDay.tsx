import type { LogItem } from "@/lib/log-entry/load-log";
import { EntryCard } from "./EntryCard";
import { LogLine } from "./LogLine";

type Props = { project: string; zone: string; label: string; items: readonly LogItem[] };

/** One day: its date in the margin, its lines on the sheet; entries stand out as sheets of their own. */
export function LogDay({ project, zone, label, items }: Props) {
  return (
    <section aria-label={label} className="grid gap-x-6 gap-y-2 lg:grid-cols-[9.5rem_minmax(0,1fr)]">
      <h2 className="text-base lg:sticky lg:top-4 lg:self-start lg:pt-3 lg:text-right">{label}</h2>
      <ol className="flex min-w-0 flex-col gap-3">
        {runs(items).map((run) =>
          "entry" in run ? (
            <li key={run.item.id}>
              <EntryCard project={project} zone={zone} entry={run.entry} />
            </li>
          ) : (
            <li key={run.lines[0]?.id} className="rounded-lg border border-rule bg-sheet">
              <ol>
                {run.lines.map((item) => (
                  <LogLine key={item.id} project={project} zone={zone} item={item} />
                ))}
              </ol>
            </li>
          ),
        )}
      </ol>
    </section>
  );
}

type Run = { item: LogItem; entry: NonNullable<LogItem["entry"]> } | { lines: LogItem[] };

/** Lines that follow one another share a sheet. */
function runs(items: readonly LogItem[]): Run[] {
  const all: Run[] = [];
  for (const item of items) {
    const last = all.at(-1);
    if (item.entry) all.push({ item, entry: item.entry });
    else if (last && "lines" in last) last.lines.push(item);
    else all.push({ lines: [item] });
  }
  return all;
}
