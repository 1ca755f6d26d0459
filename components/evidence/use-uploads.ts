"use client";

import { useCallback, useEffect, useRef, useState } from "react";
import type { AttachmentKind } from "@/db/schema/evidence";
import type { EvidenceTarget } from "@/lib/attachment/schema";
import { FILE_LIMITS } from "@/lib/storage/limits";
import type { EvidenceView } from "@/lib/traveler/traveler-view";
import { uploadEvidence } from "./upload-evidence";

export type UploadLine = {
  uploadId: string;
  file: File;
  state: "waiting" | "sending" | "failed";
  /** 0 … 1 */
  progress: number;
  message: string;
  /** Whether sending the same file again can help. */
  canRetry: boolean;
};

type Options = {
  project: string;
  target: EvidenceTarget;
  kinds: readonly AttachmentKind[];
  onUploaded: (evidence: EvidenceView) => void;
  onBusy?: ((busy: boolean) => void) | undefined;
};

/** Two at a time: more only makes each of them slower on a poor network. */
const AT_ONCE = 2;

/** The files on their way: started two at a time, each with its progress, cancel and retry. Done ones leave the list. */
export function useUploads(options: Options) {
  const [lines, setLines] = useState<UploadLine[]>([]);
  const [notice, setNotice] = useState("");
  const running = useRef(new Map<string, AbortController>());
  const latest = useRef(options);
  useEffect(() => {
    latest.current = options;
  });

  const patch = useCallback((uploadId: string, change: Partial<UploadLine>) => {
    setLines((before) => before.map((line) => (line.uploadId === uploadId ? { ...line, ...change } : line)));
  }, []);
  const drop = useCallback(
    (uploadId: string) => setLines((before) => before.filter((line) => line.uploadId !== uploadId)),
    [],
  );

  const send = useCallback(
    async (line: UploadLine) => {
      const stop = new AbortController();
      running.current.set(line.uploadId, stop);
      patch(line.uploadId, { state: "sending", progress: 0, message: "" });
      const { project, target, kinds } = latest.current;
      const result = await uploadEvidence({
        project,
        target,
        kinds,
        file: line.file,
        uploadId: line.uploadId,
        signal: stop.signal,
        onProgress: (progress) => patch(line.uploadId, { progress }),
      });
      running.current.delete(line.uploadId);
      if (stop.signal.aborted) return drop(line.uploadId);
      if (!result.ok) return patch(line.uploadId, { state: "failed", message: result.message, canRetry: result.retry });
      latest.current.onUploaded(result.evidence);
      drop(line.uploadId);
    },
    [patch, drop],
  );

  useEffect(() => {
    const free = AT_ONCE - running.current.size;
    for (const line of lines.filter((one) => one.state === "waiting").slice(0, Math.max(0, free))) {
      if (!running.current.has(line.uploadId)) void send(line);
    }
  }, [lines, send]);

  const busy = lines.some((line) => line.state !== "failed");
  useEffect(() => latest.current.onBusy?.(busy), [busy]);
  useEffect(() => {
    const open = running.current;
    return () => open.forEach((stop) => stop.abort());
  }, []);

  const add = useCallback((files: readonly File[]) => {
    const taken = files.slice(0, FILE_LIMITS.filesAtOnce);
    setNotice(
      files.length > taken.length
        ? `Took the first ${taken.length} of ${files.length} files. Add the rest after these.`
        : "",
    );
    setLines((before) => [
      ...before,
      ...taken.map((file): UploadLine => ({
        uploadId: crypto.randomUUID(),
        file,
        state: "waiting",
        progress: 0,
        message: "",
        canRetry: true,
      })),
    ]);
  }, []);

  const cancel = useCallback(
    (uploadId: string) => {
      const stop = running.current.get(uploadId);
      if (stop) stop.abort();
      else drop(uploadId);
    },
    [drop],
  );
  const retry = useCallback(
    (uploadId: string) => patch(uploadId, { state: "waiting", progress: 0, message: "" }),
    [patch],
  );

  return { lines, notice, busy, add, cancel, retry };
}
