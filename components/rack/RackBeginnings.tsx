import Link from "next/link";
import { ButtonLink } from "@/components/ui/ButtonLink";
import { EmptyState } from "@/components/ui/EmptyState";
import type { RackView } from "@/lib/rack/rack-view";
import { EmptyRackDrawing } from "./EmptyRackDrawing";
import { boardAddress, boardsAddress } from "./rack-addresses";

/** Before there is anything to draw: first boards, then slots. */
export function RackBeginnings({ rack, project, canEdit }: { rack: RackView; project: string; canEdit: boolean }) {
  if (rack.boards.length === 0) {
    return (
      <EmptyState
        title="No boards yet"
        drawing={<EmptyRackDrawing />}
        action={
          canEdit && (
            <ButtonLink kind="primary" href={boardsAddress(project)}>
              Add the first board
            </ButtonLink>
          )
        }
      >
        <p>
          The machine is drawn here: the backplane, its slots, and a card in each. Begin with the boards it is made of,
          the backplane among them.{canEdit ? "" : " A maintainer of the project adds them."}
        </p>
      </EmptyState>
    );
  }
  return (
    <>
      <EmptyState
        title="No slots yet"
        drawing={<EmptyRackDrawing />}
        action={
          canEdit && (
            <ButtonLink kind="primary" href={`${boardsAddress(project)}#slots`}>
              Add slots
            </ButtonLink>
          )
        }
      >
        <p>
          A slot is a place on the backplane that takes one card. Say how many there are, how wide, and which board each
          is wired for; then put units in.
        </p>
      </EmptyState>
      <MissingProcedures rack={rack} project={project} />
    </>
  );
}

/** Boards whose units cannot be checked yet, and where that is mended. */
export function MissingProcedures({ rack, project }: { rack: RackView; project: string }) {
  const without = rack.boards.filter((board) => board.procedureNumber === null);
  if (without.length === 0) return null;
  return (
    <EmptyState title={without.length === rack.boards.length ? "No procedure yet" : "Boards without a procedure"}>
      <p>
        A procedure is the list of checks that every unit of a board goes through. Take a starter for its kind of board
        and change it, then issue it: each unit gets it as its traveler.
      </p>
      <ul className="mt-2 flex flex-wrap gap-x-4 gap-y-1">
        {without.map((board) => (
          <li key={board.id}>
            <Link href={`${boardAddress(project, board.code)}/procedure`} className="link">
              {board.name}
            </Link>
          </li>
        ))}
      </ul>
    </EmptyState>
  );
}
