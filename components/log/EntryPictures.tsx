"use client";

import { EvidencePicker } from "@/components/evidence/EvidencePicker";
import { EvidenceThumb } from "@/components/evidence/EvidenceThumb";
import { fileAddress } from "@/components/evidence/file-address";
import { Button } from "@/components/ui/Button";
import { IconButton } from "@/components/ui/IconButton";
import { TextField } from "@/components/ui/TextField";
import { FILE_LIMITS } from "@/lib/storage/limits";
import type { EvidenceView } from "@/lib/traveler/traveler-view";
import type { EntryDraft } from "./entry-draft";
import { withoutPicture } from "./excerpt";

type Change = (part: (before: EntryDraft) => Partial<EntryDraft>) => void;
type Props = {
  project: string;
  draft: EntryDraft;
  change: Change;
  onBusy: (busy: boolean) => void;
  error: string | undefined;
};

/** The pictures of the entry with their captions, in the order in which they will stand under the text. */
export function EntryPictures({ project, draft, change, onBusy, error }: Props) {
  const { pictures } = draft;
  const update = (id: string, part: Partial<EvidenceView>) =>
    change((before) => ({ pictures: before.pictures.map((one) => (one.id === id ? { ...one, ...part } : one)) }));
  const leaveOut = (id: string) =>
    change((before) => ({
      pictures: before.pictures.filter((one) => one.id !== id),
      body: withoutPicture(before.body, id),
    }));
  const intoText = (picture: EvidenceView) =>
    change((before) => ({ body: `${before.body.trimEnd()}\n\n${asMarkdown(project, picture)}\n`.trimStart() }));

  return (
    <fieldset className="flex min-w-0 flex-col gap-3">
      <legend className="mb-1.5 text-sm font-semibold">Pictures</legend>
      {pictures.length > 0 && (
        <ol className="flex flex-col gap-2">
          {pictures.map((picture, index) => (
            <li
              key={picture.id}
              className="flex flex-wrap items-center gap-3 rounded-md border border-rule bg-raised p-2"
            >
              <div className="w-24 shrink-0">
                <EvidenceThumb project={project} evidence={picture} />
              </div>
              <TextField
                label={`Caption of picture ${index + 1}`}
                isLabelHidden
                placeholder="What it shows"
                value={picture.caption}
                onChange={(caption) => update(picture.id, { caption })}
                maxLength={FILE_LIMITS.captionCharacters}
                className="min-w-48 flex-1"
              />
              <div className="flex items-center gap-0.5 max-sm:ml-auto">
                {draft.body.includes(picture.id) ? (
                  <span className="px-2 text-sm text-ink-soft">in the text</span>
                ) : (
                  <Button size="sm" kind="quiet" onPress={() => intoText(picture)}>
                    Into the text
                  </Button>
                )}
                <IconButton
                  size="sm"
                  icon="chevron-up"
                  label={`Move picture ${index + 1} up`}
                  isDisabled={index === 0}
                  onPress={() => change((before) => ({ pictures: swapped(before.pictures, index, index - 1) }))}
                />
                <IconButton
                  size="sm"
                  icon="chevron-down"
                  label={`Move picture ${index + 1} down`}
                  isDisabled={index === pictures.length - 1}
                  onPress={() => change((before) => ({ pictures: swapped(before.pictures, index, index + 1) }))}
                />
                <IconButton
                  size="sm"
                  icon="close"
                  label={`Leave picture ${index + 1} out`}
                  onPress={() => leaveOut(picture.id)}
                />
              </div>
            </li>
          ))}
        </ol>
      )}
      <EvidencePicker
        project={project}
        target={{}}
        kinds={["photo"]}
        onBusy={onBusy}
        onUploaded={(picture) => change((before) => ({ pictures: [...before.pictures, picture] }))}
      />
      {error && <p className="text-sm font-medium text-failed">{error}</p>}
    </fieldset>
  );
}

function asMarkdown(project: string, picture: EvidenceView): string {
  const words = picture.caption.replace(/[[\]\\]/g, "").trim();
  return `![${words}](${fileAddress(project, picture.id, "large")})`;
}

function swapped<Item>(list: readonly Item[], from: number, to: number): Item[] {
  const next = [...list];
  const [item] = next.splice(from, 1);
  if (item !== undefined) next.splice(to, 0, item);
  return next;
}
