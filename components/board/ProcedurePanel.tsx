import { ButtonLink } from "@/components/ui/ButtonLink";
import { DateTime } from "@/components/ui/DateTime";
import { Panel } from "@/components/ui/Panel";
import type { BoardView } from "@/lib/board/load-board";

type Props = { project: string; zone: string; board: BoardView; canEdit: boolean };

export function ProcedurePanel({ project, zone, board, canEdit }: Props) {
  const href = `/projects/${project}/boards/${board.code}/procedure`;
  const behind = board.units.filter(
    (unit) => !unit.archived && unit.procedure !== null && unit.procedure !== board.issued?.number,
  );
  return (
    <Panel title="Procedure">
      {board.issued ? (
        <div className="flex flex-col gap-1 text-[0.9375rem]">
          <p>
            Version {board.issued.number}, issued <DateTime at={board.issued.at} zone={zone} form="day" />.
          </p>
          {board.issued.note && <p className="whitespace-pre-line text-ink-soft">{board.issued.note}</p>}
          {behind.length > 0 && (
            <p className="text-ink-soft">
              {behind.length === 1 ? "1 traveler follows" : `${behind.length} travelers follow`} an older version.
            </p>
          )}
        </div>
      ) : (
        <p className="text-[0.9375rem] text-ink-soft">
          None issued yet. Until then its units have no checks.{canEdit ? " Begin with a starter or from scratch." : ""}
        </p>
      )}
      <div className="mt-3 flex flex-wrap gap-2">
        {(board.issued || board.hasDraft || canEdit) && (
          <ButtonLink href={href} kind={board.issued ? "plain" : "primary"}>
            {board.hasDraft && canEdit
              ? "Go on with the draft"
              : board.issued
                ? "Look at the procedure"
                : "Write the procedure"}
          </ButtonLink>
        )}
      </div>
    </Panel>
  );
}
