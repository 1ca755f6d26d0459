import clsx from "clsx";
import Link from "next/link";
import { EvidenceThumb } from "@/components/evidence/EvidenceThumb";
import { fileAddress } from "@/components/evidence/file-address";
import { DateTime } from "@/components/ui/DateTime";
import { StateGlyph } from "@/components/ui/glyphs/StateGlyph";
import type { SentencePart } from "@/lib/event/sentence";
import type { LogItem } from "@/lib/log-entry/load-log";

/** One thing that happened: when, the glyph of the state it led to, the sentence. */
export function LogLine({ project, zone, item }: { project: string; zone: string; item: LogItem }) {
  return (
    <li
      id={`event-${item.id}`}
      className="grid grid-cols-[2.75rem_1.5rem_minmax(0,1fr)] items-baseline gap-x-3 border-b border-rule px-4 py-2.5 last:border-b-0"
    >
      <DateTime at={item.at} zone={zone} form="time" className="mono text-xs text-ink-soft" />
      <span className="translate-y-0.5">{item.glyph && <StateGlyph state={item.glyph} size={14} />}</span>
      <div className="min-w-0">
        <p className={clsx("text-[0.9375rem]", item.glyph === "failed" && "font-medium")}>
          {item.sentence.map((part, index) => (
            <Part key={index} part={part} />
          ))}
        </p>
        {item.evidence && (
          <a href={fileAddress(project, item.evidence.id)} className="mt-2 block w-28">
            <EvidenceThumb project={project} evidence={item.evidence} />
          </a>
        )}
      </div>
    </li>
  );
}

/** Files are fetched from the API, which is no page; everything else is. */
function Part({ part }: { part: SentencePart }) {
  if (!part.href) return <>{part.text}</>;
  if (part.href.startsWith("/api/")) {
    return (
      <a href={part.href} className="link">
        {part.text}
      </a>
    );
  }
  return (
    <Link href={part.href} className="link" prefetch={false}>
      {part.text}
    </Link>
  );
}
