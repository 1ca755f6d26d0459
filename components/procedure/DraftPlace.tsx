"use client";

import { useRouter } from "next/navigation";
import { useRef, type ReactNode } from "react";
import { Page } from "@/components/shell/Page";
import { Button } from "@/components/ui/Button";
import { ConfirmDialog } from "@/components/ui/ConfirmDialog";
import { Dialog } from "@/components/ui/Dialog";
import { FormTextArea } from "@/components/ui/form/bound-fields";
import { Form } from "@/components/ui/form/Form";
import { toast } from "@/components/ui/toast-store";
import type { ProcedureView } from "@/lib/procedure/load-procedure";
import { issueProcedureInput } from "@/lib/procedure/schema";
import { compareVersions } from "@/lib/traveler/compare-versions";
import { DifferenceSheet } from "./DifferenceSheet";
import { DraftEditor } from "./DraftEditor";
import type { ProcedureActs } from "./procedure-acts";
import { useDraftState } from "./use-draft-state";

type Props = {
  project: string;
  view: ProcedureView;
  draft: NonNullable<ProcedureView["draft"]>;
  acts: ProcedureActs;
  aside: ReactNode;
};

const note = issueProcedureInput.pick({ note: true });

export function DraftPlace({ project, view, draft, acts, aside }: Props) {
  const router = useRouter();
  const { board, versions } = view;
  const state = useDraftState(project, board.code, draft);
  const { checks } = state;
  const holds = checks.filter((check) => check.holdPoint).length;
  const issued = useRef(false);
  return (
    <Page
      title={`Procedure of ${board.name}, draft of version ${draft.number}`}
      lede={`${checks.length === 1 ? "1 check" : `${checks.length} checks`}, ${holds === 1 ? "1 hold point" : `${holds} hold points`}. Saved as you go; units get it when it is issued.`}
      actions={
        <>
          <ConfirmDialog
            title="Throw the draft away?"
            trigger={<Button>Throw it away</Button>}
            consequences={[
              `${checks.length === 1 ? "1 check goes" : `${checks.length} checks go`} with it. It cannot be taken back.`,
              versions[0] ? `Version ${versions[0].number} stays as it is.` : "The board is without a procedure again.",
            ]}
            confirmLabel="Throw the draft away"
            onConfirm={async () => {
              const reply = await state.send((asked) => acts.discard(asked));
              return reply.ok ? undefined : reply.error.message;
            }}
          />
          <Dialog title={`Issue version ${draft.number}`} width="lg" trigger={<Button kind="primary">Issue it</Button>}>
            {(close) => (
              <Form
                label="Issue the version"
                schema={note}
                defaults={{ note: "" }}
                action={(values) => state.send((asked) => acts.issue({ ...asked, ...values }))}
                onDone={({ number, started }) => {
                  issued.current = true;
                  close();
                  const units =
                    started === 0
                      ? ""
                      : ` ${started === 1 ? "1 unit has" : `${started} units have`} it as the traveler.`;
                  toast({ text: `Version ${number} is issued.${units}` });
                  router.refresh();
                }}
                submitLabel={`Issue version ${draft.number}`}
                actions={<Button onPress={close}>Not yet</Button>}
              >
                <ul className="flex list-disc flex-col gap-1 pl-5 text-[0.9375rem]">
                  <li>An issued version never changes again. The next change is the next version.</li>
                  <li>
                    {view.without.length === 0
                      ? "No unit waits for its first traveler."
                      : `${view.without.join(", ")} ${view.without.length === 1 ? "gets" : "get"} it as the traveler at once.`}
                  </li>
                  {versions.length > 0 && <li>Travelers in progress keep their version until you move them over.</li>}
                </ul>
                {versions[0] && (
                  <section className="rounded-md border border-rule p-4">
                    <h3 className="mb-2 text-base">What differs from version {versions[0].number}</h3>
                    <DifferenceSheet difference={compareVersions(view.newest, checks)} />
                  </section>
                )}
                <FormTextArea
                  name="note"
                  label="Note"
                  rows={3}
                  description="Why there is a new version. Stands in the log and in the list of versions."
                />
              </Form>
            )}
          </Dialog>
        </>
      }
      aside={aside}
    >
      <DraftEditor state={state} acts={acts} />
    </Page>
  );
}
