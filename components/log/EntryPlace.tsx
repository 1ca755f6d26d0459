import { EvidenceGallery } from "@/components/evidence/EvidenceGallery";
import type { EvidenceActions } from "@/components/evidence/use-evidence-acts";
import { Page } from "@/components/shell/Page";
import { ButtonLink } from "@/components/ui/ButtonLink";
import { Markdown } from "@/components/ui/Markdown";
import { Notice } from "@/components/ui/Notice";
import { Panel } from "@/components/ui/Panel";
import type { EntryView } from "@/lib/log-entry/entry-view";
import { ArchiveEntry, RestoreEntry, type EntryActions } from "./EntryActs";
import { Byline } from "./Byline";
import { picturesBesideText } from "./excerpt";

type Props = {
  project: string;
  zone: string;
  entry: EntryView;
  /** Only for people who may write. */
  actions: EntryActions | undefined;
  evidenceActions: EvidenceActions | undefined;
};

/** One entry, whole. */
export function EntryPlace({ project, zone, entry, actions, evidenceActions }: Props) {
  const isArchived = entry.archivedAt !== null;
  const beside = picturesBesideText(entry.body, entry.pictures);
  return (
    <Page
      title={entry.title}
      lede={<Byline project={project} zone={zone} entry={entry} />}
      width="prose"
      actions={
        actions &&
        !isArchived && (
          <>
            <ArchiveEntry project={project} entry={entry} actions={actions} />
            <ButtonLink kind="primary" href={`/projects/${project}/log/${entry.id}/edit`}>
              Edit
            </ButtonLink>
          </>
        )
      }
    >
      <div className="flex flex-col gap-4">
        {isArchived && (
          <Notice
            kind="waiting"
            title="This entry is archived."
            actions={actions && <RestoreEntry project={project} entry={entry} actions={actions} />}
          >
            It no longer stands in the log.
          </Notice>
        )}
        <Panel>
          {entry.body === "" ? (
            <p className="text-ink-soft">{beside.length > 0 ? "No text, only pictures." : "No text."}</p>
          ) : (
            <Markdown text={entry.body} />
          )}
          <EvidenceGallery
            project={project}
            zone={zone}
            evidence={beside}
            actions={isArchived ? undefined : evidenceActions}
            className="mt-5"
          />
        </Panel>
      </div>
    </Page>
  );
}
