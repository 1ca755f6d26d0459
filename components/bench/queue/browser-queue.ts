import { createQueue, type AttemptQueue } from "./attempt-queue";
import { deviceStore } from "./device-store";
import { sendWithFiles } from "./send-with-files";
import { uploadHeldFile } from "./upload-held-file";

const LOCK = "boardwake-bench-queue";
const queues = new Map<string, AttemptQueue>();

/** One tab at a time. Browsers without locks (none that Boardwake supports) still send each once: the id is the key. */
function exclusively<T>(work: () => Promise<T>): Promise<T> {
  if (!("locks" in navigator)) return work();
  return navigator.locks.request(LOCK, work);
}

function later(work: () => void, ms: number) {
  const timer = setTimeout(work, ms);
  return () => clearTimeout(timer);
}

/** The queue of one person in this tab; the store and the lock are shared by all tabs of the device. */
export function browserQueue(userId: string): AttemptQueue {
  const known = queues.get(userId);
  if (known) return known;
  const channel = new BroadcastChannel(LOCK);
  const queue = createQueue(userId, {
    store: deviceStore,
    send: (attempt) =>
      sendWithFiles({ attempt, upload: (held, file) => uploadHeldFile(held.project, file), keep: deviceStore.put }),
    now: Date.now,
    exclusively,
    later,
    tellOthers: () => channel.postMessage("changed"),
  });
  channel.onmessage = () => void queue.look();
  addEventListener("online", () => void queue.runNow());
  addEventListener("pageshow", () => void queue.run());
  document.addEventListener("visibilitychange", () => {
    if (document.visibilityState === "visible") void queue.run();
  });
  queues.set(userId, queue);
  void queue.look().then(queue.run);
  return queue;
}
