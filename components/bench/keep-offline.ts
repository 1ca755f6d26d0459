const WORKER = "/bench-worker.js";

/** Lets this page work without network from now on: the worker keeps it and the files it is made of. */
export async function keepOffline(): Promise<void> {
  if (!("serviceWorker" in navigator)) return;
  await navigator.serviceWorker.register(WORKER);
  const { active } = await navigator.serviceWorker.ready;
  const assets = performance.getEntriesByType("resource").map((entry) => entry.name);
  active?.postMessage({
    kind: "keep",
    page: location.pathname,
    assets: assets.filter((name) => name.includes("/_next/static/")),
  });
}
