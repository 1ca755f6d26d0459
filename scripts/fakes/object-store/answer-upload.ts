import { setTimeout as delay } from "node:timers/promises";
import { Refusal } from "../http/refusal";
import { sendEmpty, sendJson } from "../http/send";
import type { Call } from "../http/serve-loopback";
import { tellFailed, tellUploaded } from "./call-app";
import { receiveFile } from "./receive-file";
import { checkSignature } from "./signature";
import type { Store } from "./store";
import type { StoredObject, UploadClaim } from "./stored-object";
import { readUploadClaim } from "./upload-claim";

/** A resumed upload may come before the end of the cut-off one was noticed. */
async function untilFree(store: Store, key: string): Promise<void> {
  for (let attempt = 0; store.receiving.has(key); attempt += 1) {
    if (attempt === 40) throw new Refusal(409, "conflict", "This file is being uploaded already.");
    await delay(50);
  }
}

/** HEAD: where a resumed upload should go on. */
export async function answerResume({ response, url }: Call, store: Store): Promise<void> {
  checkSignature(url, store.apiKey);
  const { key } = readUploadClaim(url, store.appId);
  await untilFree(store, key);
  sendEmpty(response, 200, { "x-ut-range-start": String(await store.files.partialSize(key)) });
}

async function receive({ request }: Call, store: Store, claim: UploadClaim): Promise<StoredObject> {
  await untilFree(store, claim.key);
  store.receiving.add(claim.key);
  try {
    const object = await receiveFile(request, claim, store.files);
    await store.files.commit(object);
    return object;
  } catch (error) {
    const callback =
      claim.slug === undefined || !(error instanceof Refusal) ? undefined : await store.announced.find(claim.key);
    if (callback && error instanceof Refusal) void tellFailed(callback, claim.key, error.message, store.apiKey);
    throw error;
  } finally {
    store.receiving.delete(claim.key);
  }
}

async function serverDataOf(store: Store, object: StoredObject, origin: string) {
  const callback = await store.announced.wait(object.key, 10_000);
  if (!callback) return { error: "The app never announced this file." };
  const addresses = store.addresses(origin, object.key);
  const told = tellUploaded({ callback, object, addresses, origin, apiKey: store.apiKey }, store.results);
  const finished = told.finally(() => store.announced.forget(object.key));
  return callback.awaitServerData ? finished : { serverData: null };
}

/** PUT: the file itself. A file from the browser (with a slug) is told to the app; one from the server is not. */
export async function answerUpload(call: Call, store: Store): Promise<void> {
  const { response, url } = call;
  checkSignature(url, store.apiKey);
  const claim = readUploadClaim(url, store.appId);
  const object = await receive(call, store, claim);
  const result = claim.slug === undefined ? { serverData: null } : await serverDataOf(store, object, url.origin);
  sendJson(response, 200, { ...store.addresses(url.origin, object.key), fileHash: object.fileHash, ...result });
}
