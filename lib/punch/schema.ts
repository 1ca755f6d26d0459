import { z } from "zod";
import { lines } from "@/lib/form/text";
import { writeId } from "@/lib/form/write-id";

export const takePunchInput = z.object({
  project: z.string(),
  writeId,
  revisionId: z.uuid({ message: "This is not the id of a revision." }),
});
export type TakePunchInput = z.output<typeof takePunchInput>;

const onItem = {
  project: z.string(),
  writeId,
  itemId: z.uuid({ message: "Name the item of the punch list." }),
  version: z.int(),
};

export const dealPunchInput = z.object({
  ...onItem,
  how: lines(1000, "Say how it was dealt with, so that nobody asks again."),
});
export type DealPunchInput = z.output<typeof dealPunchInput>;

export const reopenPunchInput = z.object(onItem);
export type ReopenPunchInput = z.output<typeof reopenPunchInput>;
