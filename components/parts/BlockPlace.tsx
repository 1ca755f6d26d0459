"use client";

import { useRouter } from "next/navigation";
import { useAct } from "@/components/board/use-act";
import { Page } from "@/components/shell/Page";
import { Button } from "@/components/ui/Button";
import { ButtonLink } from "@/components/ui/ButtonLink";
import { ConfirmDialog } from "@/components/ui/ConfirmDialog";
import { Notice } from "@/components/ui/Notice";
import { Panel } from "@/components/ui/Panel";
import type { BlockLine } from "@/lib/block/load-blocks";
import type { BlockView } from "@/lib/block/load-block";
import { BlockContents } from "./BlockContents";
import { BlockEditor } from "./BlockEditor";
import { BlockUses } from "./BlockUses";
import { GateTotals } from "./GateTotals";
import { OutdatedNotice } from "./OutdatedNotice";
import type { BlockActs } from "./parts-acts";

type Props = { project: string; zone: string; view: BlockView; canEdit: boolean; acts: BlockActs };

export function BlockPlace({ project, zone, view, canEdit, acts }: Props) {
  const router = useRouter();
  const { act } = useAct();
  const { block } = view;
  const home = `/projects/${project}/parts/blocks`;
  const isUsed = view.uses.length + view.parents.length > 0;
  const write = () => ({ project, writeId: crypto.randomUUID(), block: block?.id ?? "" });
  const restore = () =>
    act(
      () => acts.restore(write()),
      () => `${block?.name} is back.`,
    );
  return (
    <Page
      title={block?.name ?? "New block"}
      lede={
        block ? block.summary || undefined : "Count the gates that it has itself, and the blocks that are inside it."
      }
      actions={
        block &&
        canEdit &&
        !block.archived && (
          <ConfirmDialog
            title={`Archive ${block.name}?`}
            trigger={<Button>Archive</Button>}
            kind="primary"
            consequences={
              isUsed
                ? ["It is used, so it cannot go: take it out of the boards and blocks beside first."]
                : ["Nothing uses it. It is no longer offered, and can be restored."]
            }
            confirmLabel="Archive the block"
            onConfirm={() =>
              act(
                () => acts.archive(write()),
                () => `${block.name} is archived.`,
                restore,
              )
            }
          />
        )
      }
      aside={
        block && (
          <>
            <BlockUses project={project} view={view} />
            <GateTotals title="With everything inside it" gates={block.allGates} />
          </>
        )
      }
    >
      {block?.archived && (
        <Notice
          kind="waiting"
          actions={
            canEdit && (
              <Button size="sm" onPress={() => void restore()}>
                Restore it
              </Button>
            )
          }
        >
          <p>This block is archived. It is not offered any more.</p>
        </Notice>
      )}
      {block && (
        <OutdatedNotice project={project} zone={zone} units={view.outdated.map((unit) => ({ ...unit, block }))} />
      )}
      {canEdit && !block?.archived ? (
        <Panel>
          <BlockEditor
            project={project}
            view={view}
            save={acts.save}
            onSaved={({ id, outdated, tiesReopened }) => {
              void act(
                async () => ({ ok: true, value: null }),
                () => savedText(block, outdated, tiesReopened),
              );
              if (!block) router.replace(`${home}/${id}`);
            }}
            actions={<ButtonLink href={home}>{block ? "Back to the blocks" : "Cancel"}</ButtonLink>}
          />
        </Panel>
      ) : (
        block && <BlockContents home={home} block={block} />
      )}
    </Page>
  );
}

function savedText(block: BlockLine | undefined, outdated: string[], tiesReopened: string[]): string {
  const parts = [
    block ? "The block is saved." : "The block is there.",
    outdated.length > 0 ? `${outdated.join(", ")} ${outdated.length === 1 ? "was" : "were"} built before.` : "",
    tiesReopened.length > 0 ? `Other gates are spare now on ${tiesReopened.join(", ")}: look at their ties.` : "",
  ];
  return parts.filter(Boolean).join(" ");
}
