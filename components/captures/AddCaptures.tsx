"use client";

import { useRouter } from "next/navigation";
import { useState } from "react";
import { EvidencePicker } from "@/components/evidence/EvidencePicker";
import { Button } from "@/components/ui/Button";
import { Dialog } from "@/components/ui/Dialog";
import { DialogActions } from "@/components/ui/DialogActions";
import { Icon } from "@/components/ui/Icon";
import type { AttachmentKind } from "@/db/schema/evidence";

/** Files that belong to no check: they are listed, and can be looked at and downloaded, all the same. */
export function AddCaptures({ project, kind }: { project: string; kind: AttachmentKind }) {
  const router = useRouter();
  const [busy, setBusy] = useState(false);
  const [kept, setKept] = useState(0);
  const kinds: AttachmentKind[] = kind === "photo" ? ["photo"] : ["scope-picture", "scope-data"];
  return (
    <Dialog
      title={kind === "photo" ? "Add photos" : "Add captures"}
      isDismissable={!busy}
      onOpenChange={() => setKept(0)}
      trigger={
        <Button kind="primary">
          <Icon name="upload" /> {kind === "photo" ? "Add photos" : "Add captures"}
        </Button>
      }
    >
      {(close) => (
        <>
          <EvidencePicker
            project={project}
            target={{}}
            kinds={kinds}
            onBusy={setBusy}
            onUploaded={() => {
              setKept((before) => before + 1);
              router.refresh();
            }}
          />
          <p role="status" className="mt-3 min-h-5 text-sm text-ink-soft">
            {kept > 0 && `${kept === 1 ? "1 file is" : `${kept} files are`} kept.`}
          </p>
          <DialogActions>
            <Button kind="primary" isDisabled={busy} onPress={close}>
              Done
            </Button>
          </DialogActions>
        </>
      )}
    </Dialog>
  );
}
