import { z } from "zod";
import { writeId } from "@/lib/form/write-id";

const REASON_MOST = 300;

/** needs: `boardId` waits for `otherId`. despite: `boardId` may come first though the machine says `otherId` does. */
export const sayBoardOrderInput = z
  .object({
    project: z.string(),
    writeId,
    boardId: z.uuid("Choose a board."),
    otherId: z.uuid("Choose the other board."),
    rule: z.enum(["needs", "despite"]),
    reason: z.string().trim().max(REASON_MOST, `A reason has at most ${REASON_MOST} characters.`),
  })
  .superRefine(({ boardId, otherId, rule, reason }, context) => {
    if (boardId === otherId) {
      context.addIssue({ code: "custom", path: ["otherId"], message: "Choose another board: none waits for itself." });
    }
    if (rule === "despite" && reason === "") {
      const message = "Say why this is safe: somebody will ask before power is switched on.";
      context.addIssue({ code: "custom", path: ["reason"], message });
    }
  });
export type SayBoardOrderInput = z.output<typeof sayBoardOrderInput>;

export const withdrawBoardOrderInput = z.object({ project: z.string(), writeId, id: z.uuid() });
export type WithdrawBoardOrderInput = z.output<typeof withdrawBoardOrderInput>;
