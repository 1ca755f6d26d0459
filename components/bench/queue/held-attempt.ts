import type { AttachmentKind } from "@/db/schema/evidence";
import type { Verdict } from "@/db/schema/travelers";

/** What POST …/attempts is sent. Plain JSON, so that a queue survives a new build of the application. */
export type AttemptBody = {
  /** Client-made UUID: the attempt's own id, the same at every repeat. */
  id: string;
  checkId: string;
  /** ISO instant by the device's clock. */
  performedAt: string;
  record: unknown;
  note: string;
  instrumentId: string | null;
  attachmentIds: string[];
  /** Arrival of the newest attempt of the check that the person had seen, to be told of one that came in between. */
  seenArrival: number;
};

/** A file taken at the bench. Once the server keeps it, `attachmentId` names it there and the bytes are let go. */
export type HeldFile = {
  /** Client-made UUID: sending the file again makes no second row. */
  uploadId: string;
  checkId: string;
  userId: string;
  fileName: string;
  /** What it counts as until the server has looked at its content. */
  kind: AttachmentKind;
  /** What is wanted of it, as the server is told. */
  kinds: AttachmentKind[];
  file: Blob | null;
  attachmentId: string | null;
  /** Why the server will not have it; empty while it may still go. */
  refusal: string;
};

/** Why an attempt is still on the device, in the words the person reads. */
export type Trouble = {
  /** waiting: goes out by itself. refused: the person decides. signed-out: goes out after signing in. */
  kind: "waiting" | "refused" | "signed-out";
  sentence: string;
  fields?: Record<string, string>;
};

/** One attempt on its way to the server. It leaves the device only when the server has it or the person discards it. */
export type HeldAttempt = {
  /** Order in which they were made on this device; given by the store. */
  order: number;
  /** Who made it. Another person signed in on the same device neither sees nor sends it. */
  userId: string;
  project: string;
  serial: string;
  checkTitle: string;
  /** The verdict the device gave as one typed; the server gives its own. */
  foreseen: Verdict;
  /** In a few characters: "4.983 V". */
  summary: string;
  body: AttemptBody;
  files: HeldFile[];
  tries: number;
  /** Milliseconds since 1970; not sent before. */
  notBefore: number;
  trouble: Trouble | null;
};

export type NewAttempt = Omit<HeldAttempt, "order" | "tries" | "notBefore" | "trouble">;
