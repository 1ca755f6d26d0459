"use client";

import Link from "next/link";
import { Page } from "@/components/shell/Page";
import { DateTime } from "@/components/ui/DateTime";
import { Notice } from "@/components/ui/Notice";
import { Panel } from "@/components/ui/Panel";
import type { ProcedureView } from "@/lib/procedure/load-procedure";
import type { MoveView } from "@/lib/traveler/load-move";
import { BeginDraft } from "./BeginDraft";
import { DraftPlace } from "./DraftPlace";
import { MoveTravelers } from "./MoveTravelers";
import type { ProcedureActs, StarterChoice } from "./procedure-acts";
import { VersionSheet } from "./VersionSheet";

type Props = {
  project: string;
  zone: string;
  view: ProcedureView;
  moves: readonly MoveView[];
  starters: readonly StarterChoice[];
  canEdit: boolean;
  acts: ProcedureActs;
};

export function ProcedurePlace({ project, zone, view, moves, starters, canEdit, acts }: Props) {
  const { board, versions, draft } = view;
  const base = `/projects/${project}/boards/${board.code}`;
  const newest = versions[0];
  const aside = (
    <>
      <VersionsPanel base={base} zone={zone} view={view} />
      {canEdit && moves.length > 0 && <MoveTravelers project={project} moves={moves} move={acts.move} />}
    </>
  );
  if (draft && canEdit) {
    return <DraftPlace {...{ project, view, acts, aside }} draft={draft} />;
  }
  return (
    <Page
      title={`Procedure of ${board.name}`}
      lede={
        newest ? (
          <>
            Version {newest.number}, {view.newest.length} checks, issued{" "}
            <DateTime at={newest.issuedAt} zone={zone} form="day" />.
          </>
        ) : (
          "The list of checks that every unit of this board goes through."
        )
      }
      aside={aside}
    >
      {draft && <Notice kind="info">A maintainer is writing version {draft.number}.</Notice>}
      {!newest && !canEdit && !draft && <p className="text-ink-soft">There is none yet. A maintainer writes it.</p>}
      {canEdit && !board.archived && !newest && (
        <BeginDraft
          project={project}
          board={board.code}
          kind="first"
          newest={undefined}
          starters={starters}
          start={acts.start}
        />
      )}
      {newest && <VersionSheet checks={view.newest} />}
      {canEdit && !board.archived && newest && (
        <BeginDraft
          project={project}
          board={board.code}
          kind="next"
          newest={newest.number}
          starters={starters}
          start={acts.start}
        />
      )}
    </Page>
  );
}

function VersionsPanel({ base, zone, view }: { base: string; zone: string; view: ProcedureView }) {
  return (
    <Panel title="Versions">
      {view.versions.length === 0 ? (
        <p className="text-[0.9375rem] text-ink-soft">None issued yet. An issued version never changes again.</p>
      ) : (
        <ol className="flex flex-col gap-3">
          {view.versions.map((version) => (
            <li key={version.number} className="flex flex-col text-[0.9375rem]">
              <Link href={`${base}/procedure/${version.number}`} className="link w-fit font-semibold">
                Version {version.number}
              </Link>
              <span className="text-sm text-ink-soft">
                <DateTime at={version.issuedAt} zone={zone} form="day" />
              </span>
              {version.note && <span className="whitespace-pre-line text-sm text-ink-soft">{version.note}</span>}
            </li>
          ))}
        </ol>
      )}
      <p className="mt-3 border-t border-rule pt-3 text-sm">
        <Link href={base} className="link">
          {view.board.name}, its units and revisions
        </Link>
      </p>
    </Panel>
  );
}
