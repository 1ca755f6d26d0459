import { createResults, type Addresses } from "./call-app";
import { openObjectFiles } from "./object-files";
import { openRouteMetadata } from "./route-metadata";

type Options = { dataDir: string; apiKey: string; appId: string };

/** Everything the handlers share. */
export async function openStore({ dataDir, apiKey, appId }: Options) {
  return {
    apiKey,
    appId,
    files: await openObjectFiles(dataDir),
    announced: await openRouteMetadata(dataDir),
    results: createResults(),
    /** Uploads under way, by key: one at a time. */
    receiving: new Set<string>(),
    addresses(origin: string, key: string): Addresses {
      const address = `${origin}/a/${appId}/${encodeURIComponent(key)}`;
      return { url: address, appUrl: address, ufsUrl: address };
    },
  };
}

export type Store = Awaited<ReturnType<typeof openStore>>;
