import type { AttachmentKind } from "@/db/schema/evidence";
import type { HeldFile } from "./queue/held-attempt";
import { Icon } from "@/components/ui/Icon";

const NAMES: Record<AttachmentKind, string> = {
  photo: "Photo",
  "scope-picture": "Scope picture",
  "scope-data": "Scope data",
};

type Props = {
  files: readonly HeldFile[];
  smallHref: (attachmentId: string) => string;
  onRemove: (file: HeldFile) => void;
};

/** What will go with the attempt: small pictures, where each of them is, and a way to leave one out. */
export function EvidenceStrip({ files, smallHref, onRemove }: Props) {
  if (files.length === 0) return null;
  return (
    <ul aria-label="Goes with this attempt" className="flex gap-2 overflow-x-auto pb-1">
      {files.map((file) => (
        <li
          key={file.uploadId}
          className={`flex shrink-0 items-center gap-2 rounded-md border p-1 pr-0 ${file.refusal ? "border-failed bg-failed-ground" : "border-rule bg-raised"}`}
        >
          <Thumbnail file={file} smallHref={smallHref} />
          <span className="max-w-40 text-sm leading-tight">
            {NAMES[file.kind]}
            <span className="text-ink-soft block text-xs">
              {file.refusal || (file.attachmentId ? "stored" : "on this device")}
            </span>
          </span>
          <button
            type="button"
            aria-label={`Leave out ${file.fileName}`}
            onClick={() => onRemove(file)}
            className="grid min-h-14 min-w-11 place-items-center"
          >
            <Icon name="close" />
          </button>
        </li>
      ))}
    </ul>
  );
}

function Thumbnail({ file, smallHref }: { file: HeldFile; smallHref: Props["smallHref"] }) {
  const picture = "size-14 rounded object-cover";
  if (file.kind === "scope-data") return <Icon name="file" size={28} className="m-3.5" />;
  // Local or private pictures; the image optimiser must not fetch them.
  // eslint-disable-next-line @next/next/no-img-element
  if (file.file) return <img ref={(node) => showBlob(node, file.file)} alt="" className={picture} />;
  if (!file.attachmentId) return <Icon name="file" size={28} className="m-3.5" />;
  // eslint-disable-next-line @next/next/no-img-element
  return <img src={smallHref(file.attachmentId)} alt="" className={picture} />;
}

/** Shows bytes that lie on the device; answers how to let go of them. */
function showBlob(node: HTMLImageElement | null, blob: Blob | null) {
  if (!node || !blob) return undefined;
  const address = URL.createObjectURL(blob);
  node.src = address;
  return () => URL.revokeObjectURL(address);
}
