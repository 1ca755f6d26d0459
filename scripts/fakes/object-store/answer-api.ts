import { z } from "zod";
import { equalTexts } from "../http/equal-texts";
import { readAs } from "../http/read-json";
import { Refusal } from "../http/refusal";
import { sendJson } from "../http/send";
import type { Call } from "../http/serve-loopback";
import { routeMetadataSchema } from "./route-metadata";
import { signedAddress } from "./signature";
import type { Store } from "./store";
import { aclSchema } from "./stored-object";

const key = z.string().min(1).max(300);
const byKey = { fileKey: key.optional(), customId: key.optional() };
const deleteSchema = z.object({ fileKeys: z.array(key).default([]), customIds: z.array(key).default([]) });
const listSchema = z.object({
  limit: z.number().int().min(1).max(500).default(500),
  offset: z.number().int().min(0).default(0),
});
const aclUpdates = z.object({ updates: z.array(z.object({ ...byKey, acl: aclSchema })) });
const accessSchema = z.object({ ...byKey, expiresIn: z.number().positive().max(604_800).nullish() });
const resultSchema = z.object({ fileKey: key, callbackData: z.unknown(), error: z.string().optional() });

function find(store: Store, { fileKey, customId }: { fileKey?: string; customId?: string }) {
  const found = fileKey !== undefined ? store.files.find(fileKey) : store.files.findByCustomId(customId ?? "");
  if (!found) throw new Refusal(404, "not_found", "No such file.");
  return found;
}

type Answer = (call: Call, store: Store) => Promise<unknown>;

/** What the app's server asks for, each with the secret key in a header. */
const answers: Record<string, Answer> = {
  async "/route-metadata"({ request }, { announced }) {
    const body = await readAs(routeMetadataSchema, request);
    if (body.isDev)
      throw new Refusal(400, "validation_error", "This store calls the app itself: set UPLOADTHING_IS_DEV=false.");
    await announced.register(body);
    return { ok: true };
  },

  async "/callback-result"({ request }, { results }) {
    const { fileKey, callbackData, error } = await readAs(resultSchema, request);
    return { ok: results.report(fileKey, error === undefined ? { serverData: callbackData ?? null } : { error }) };
  },

  async "/v6/deleteFiles"({ request }, { files }) {
    const { fileKeys, customIds } = await readAs(deleteSchema, request);
    const named = customIds.flatMap((customId) => files.findByCustomId(customId)?.key ?? []);
    let deletedCount = 0;
    for (const one of [...fileKeys, ...named]) if (await files.remove(one)) deletedCount += 1;
    return { success: true, deletedCount };
  },

  async "/v6/listFiles"({ request }, { files }) {
    const { limit, offset } = await readAs(listSchema, request);
    const all = files.list();
    const page = all.slice(offset, offset + limit).map(({ key, customId, name, size, uploadedAt }) => {
      return { id: key, customId, key, name, size, status: "Uploaded", uploadedAt };
    });
    return { hasMore: offset + limit < all.length, files: page };
  },

  async "/v6/updateACL"({ request }, store) {
    const { updates } = await readAs(aclUpdates, request);
    for (const update of updates) await store.files.change({ ...find(store, update), acl: update.acl });
    return { success: true };
  },

  async "/v6/requestFileAccess"({ request, url }, store) {
    const { expiresIn, ...named } = await readAs(accessSchema, request);
    const { ufsUrl } = store.addresses(url.origin, find(store, named).key);
    const signed = signedAddress(ufsUrl, store.apiKey, expiresIn ?? 300);
    return { url: signed, ufsUrl: signed };
  },

  async "/v6/getUsageInfo"(_, { files }) {
    const all = files.list();
    const totalBytes = all.reduce((sum, { size }) => sum + size, 0);
    return { totalBytes, appTotalBytes: totalBytes, filesUploaded: all.length, limitBytes: 2_000_000_000 };
  },
};

export function isApi(url: URL): boolean {
  return url.pathname in answers;
}

export async function answerApi(call: Call, store: Store): Promise<void> {
  const given = call.request.headers["x-uploadthing-api-key"];
  if (typeof given !== "string" || !equalTexts(given, store.apiKey))
    throw new Refusal(401, "unauthorized", "The API key is missing or wrong.");
  sendJson(call.response, 200, await answers[call.url.pathname]?.(call, store));
}
