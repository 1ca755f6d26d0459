"use client";

import { useRouter } from "next/navigation";
import { Button } from "@/components/ui/Button";
import { Notice } from "@/components/ui/Notice";
import { toast } from "@/components/ui/toast-store";
import { PurgeDialog } from "@/components/workshop/PurgeDialog";
import type { BoardView } from "@/lib/board/load-board";
import type { BoardActs } from "./board-acts";
import { useAct } from "./use-act";
import { whatGoesWithBoard } from "./what-goes";

type Props = {
  project: string;
  board: BoardView;
  can: { restore: boolean; purge: boolean };
  acts: Pick<BoardActs, "restore" | "purge">;
};

/** Says that the board is put away, and offers the way back and the way out. */
export function ArchivedBoard({ project, board, can, acts }: Props) {
  const router = useRouter();
  const { act, isPending } = useAct();
  const { id: boardId, code, name } = board;
  const restore = (
    <Button
      size="sm"
      isPending={isPending}
      onPress={() =>
        void act(
          () => acts.restore({ project, writeId: crypto.randomUUID(), boardId }),
          () => `${name} is back with its units.`,
        )
      }
    >
      Restore the board
    </Button>
  );
  const purge = (
    <PurgeDialog
      what="the board"
      name={name}
      size="sm"
      ask={`Type the code of the board: ${code}`}
      consequences={whatGoesWithBoard(board)}
      purge={(asked) => acts.purge({ project, boardId, ...asked })}
      onGone={() => {
        toast({ text: `${name} is gone for good.` });
        router.push(`/projects/${project}/boards`);
      }}
    />
  );
  return (
    <Notice
      kind="waiting"
      actions={
        (can.restore || can.purge) && (
          <>
            {can.restore && restore}
            {can.purge && purge}
          </>
        )
      }
    >
      This board is archived. Its units are out of the slots; what was recorded stays.
    </Notice>
  );
}
