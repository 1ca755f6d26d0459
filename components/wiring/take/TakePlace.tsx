"use client";

import { useRouter } from "next/navigation";
import { useMemo } from "react";
import type { z } from "zod";
import { Page } from "@/components/shell/Page";
import { buttonStyle } from "@/components/ui/button-style";
import { ButtonLink } from "@/components/ui/ButtonLink";
import { EmptyState } from "@/components/ui/EmptyState";
import { FileDrop } from "@/components/ui/FileDrop";
import type { Reply } from "@/components/ui/form/reply";
import { Notice } from "@/components/ui/Notice";
import { Panel } from "@/components/ui/Panel";
import { Select } from "@/components/ui/Select";
import { toast } from "@/components/ui/toast-store";
import { counted } from "@/components/workshop/counted";
import { nameOf } from "@/lib/pin-map-file/resolve-target";
import type { TakeView } from "@/lib/pin-map-file/load-take-sources";
import { withFaces } from "@/lib/pin-map-file/with-faces";
import type { takePinMapsInput } from "@/lib/pin-map/schema";
import { HowItWasRead } from "./HowItWasRead";
import { useTakeState } from "./use-take-state";
import { TakeConfirm } from "./TakeConfirm";
import { WhatCannot } from "./WhatCannot";
import { WhatWouldChange } from "./WhatWouldChange";

type Taken = { connectors: number; pins: number };
type Props = TakeView & {
  /** "TIM.J1" of the address. */
  asked: string | null;
  project: string;
  take: (input: z.input<typeof takePinMapsInput>) => Promise<Reply<Taken>>;
};

const MACHINE = "machine";
const FILES = [".csv", ".tsv", ".txt", "text/csv", "text/tab-separated-values", "text/plain"];

/** A pin map from a spreadsheet's file: how it was read, what cannot be taken, what would change, and then the taking. */
export function TakePlace({ sources, known, asked, project, take }: Props) {
  const router = useRouter();
  const targets = useMemo(() => withFaces(sources), [sources]);
  const addressOf = ({ board, reference }: (typeof targets)[number]) => `${board}.${reference}`;
  const state = useTakeState(targets, known, targets.find((target) => addressOf(target) === asked)?.id ?? null);
  const { chosenId, file, read, refused } = state;
  const chosen = targets.find(({ id }) => id === chosenId);
  const editor = `/projects/${project}/wiring${chosen ? `?connector=${encodeURIComponent(addressOf(chosen))}` : ""}`;

  if (targets.length === 0) {
    return (
      <Page title="Take a file">
        <EmptyState
          title="No connector yet"
          action={
            <ButtonLink kind="primary" href={`/projects/${project}/wiring`}>
              Go to the pins
            </ButtonLink>
          }
        >
          A file says what the pins of connectors carry. Give the boards their connectors first.
        </EmptyState>
      </Page>
    );
  }
  return (
    <Page
      title="Take a file"
      lede="A table of pins as a spreadsheet saves it. Nothing is taken until you have seen what would change and confirm it."
      actions={
        <>
          <a
            href={`/api/projects/${project}/pin-map${chosen ? `?connector=${chosen.id}` : ""}`}
            download
            className={buttonStyle()}
          >
            {chosen ? `${nameOf(chosen)} as CSV` : "All pins as CSV"}
          </a>
          <ButtonLink href={editor}>Back to the pins</ButtonLink>
        </>
      }
    >
      <div className="flex min-w-0 flex-col gap-5">
        <Panel>
          <div className="grid items-start gap-x-6 gap-y-4 md:grid-cols-[minmax(0,20rem)_minmax(0,1fr)]">
            <Select
              label="For"
              options={[
                { id: MACHINE, label: "The whole machine", description: "The file names the connector of each row." },
                ...targets.map((target) => ({
                  id: target.id,
                  label: nameOf(target),
                  description: `${target.face.label}, ${counted(Object.keys(target.kept).length, "pin")} in use`,
                })),
              ]}
              value={chosenId ?? MACHINE}
              onChange={(id) => state.setChosen(id === MACHINE ? null : id)}
            />
            <FileDrop
              label={file ? `${file.name} is open. Another file?` : "A file with a row for each pin"}
              hint="CSV or tab-separated text, UTF-8, UTF-16 or Latin-1, up to 10,000 rows."
              accept={FILES}
              isMultiple={false}
              onFiles={(files) => void state.open(files)}
            />
          </div>
          {refused && (
            <Notice kind="error" className="mt-4">
              {refused} Nothing was changed.
            </Notice>
          )}
        </Panel>
        {file && read && (
          <>
            <HowItWasRead file={file} read={read} correct={state.correct} />
            <WhatCannot judged={read.judged} />
            <WhatWouldChange read={read} unnamed={state.unnamed} onUnnamed={state.setUnnamed} />
            <TakeConfirm
              key={file.name}
              read={read}
              project={project}
              take={take}
              onTaken={({ pins, connectors }) => {
                toast({
                  text: `${counted(pins, "pin")} on ${counted(connectors, "connector")} taken. The machine was checked again.`,
                });
                state.forget();
                router.push(editor);
                router.refresh();
              }}
            />
          </>
        )}
      </div>
    </Page>
  );
}
