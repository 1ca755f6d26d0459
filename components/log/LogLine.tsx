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
      className="grid grid-cols-[2.75rem_1.5rem_minmax(0,1fr)] items-baseline gap-x-2 border-b border-rule px-3.5 sm:gap-x-3 sm:px-4 py-2.5 last:border-b-0"
    >
      <DateTime at={item.at} zone={zone} form="time" className="mono text-xs text-ink-soft" />
      <span className="translate-y-0.5">{item.glyph && <StateGlyph state={item.glyph} size={14} />}</span>
      <div className="min-w-0">
        <p className={clsx("text-[0.9375rem]", item.glyph === "failed" && "font-medium")}>
          {item.sentence.map((part, index) => (
            <Part key={index} part={part} />
          ))}
        </p>
        {item.evidence.length > 0 && (
          <ul className="mt-2 flex flex-wrap gap-2">
            {item.evidence.map((one) => (
              <li key={one.id} className="w-24">
                <a href={fileAddress(project, one.id)} className="block rounded hover:brightness-95">
                  <EvidenceThumb project={project} evidence={one} />
                </a>
              </li>
            ))}
          </ul>
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
    <Link href={part.href} className={clsx("link", !part.text.includes(" ") && "whitespace-nowrap")} prefetch={false}>
      {part.text}
    </Link>
  );
}
