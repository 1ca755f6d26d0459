import Link from "next/link";
import { EvidenceThumb } from "@/components/evidence/EvidenceThumb";
import { Markdown } from "@/components/ui/Markdown";
import type { EntryView } from "@/lib/log-entry/entry-view";
import { Byline } from "./Byline";
import { excerpt, picturesBesideText } from "./excerpt";

const SHOWN = 4;

/** An entry in the stream: its beginning and its first pictures; the rest is one step away. */
export function EntryCard({ project, zone, entry }: { project: string; zone: string; entry: EntryView }) {
  const href = `/projects/${project}/log/${entry.id}`;
  const { text, isWhole } = excerpt(entry.body);
  const pictures = picturesBesideText(text, entry.pictures);
  const more = pictures.length - SHOWN;
  return (
    <article className="rounded-lg border border-rule border-l-4 border-l-copper bg-raised px-4 py-4 sm:px-5">
      <h3 className="text-lg">
        <Link href={href} className="decoration-copper underline-offset-4 hover:underline">
          {entry.title}
        </Link>
      </h3>
      <p className="mt-0.5 text-sm text-ink-soft">
        <Byline project={project} zone={zone} entry={entry} />
      </p>
      {text !== "" && <Markdown text={text} className="mt-3 [&_img]:max-h-80 [&_img]:w-auto" />}
      {pictures.length > 0 && (
        <Link href={href} className="mt-3 grid max-w-prose grid-cols-4 gap-2" aria-label={`Pictures of ${entry.title}`}>
          {pictures.slice(0, SHOWN).map((picture) => (
            <EvidenceThumb key={picture.id} project={project} evidence={picture} />
          ))}
        </Link>
      )}
      {(!isWhole || more > 0) && (
        <p className="mt-3 text-sm">
          <Link href={href} className="link">
            {isWhole ? `${more} more ${more === 1 ? "picture" : "pictures"}` : "Read on"}
          </Link>
        </p>
      )}
    </article>
  );
}
