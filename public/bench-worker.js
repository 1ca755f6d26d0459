/*
 * The bench without network. Plain JavaScript on purpose: no build step, and everything it does can be read here.
 *
 * It keeps, on this device, bench pages that were opened before, the travelers they show, and the static files they
 * need. The network always comes first for pages and data. Nothing else is kept: no other page, no file, no picture.
 * What is kept of a person goes when they sign out (a message from the page, or the sign-in page being asked for).
 */
const PAGES = "boardwake-bench-pages-1";
const STATIC = "boardwake-bench-static-1";
const MOST_PAGES = 40;
const MOST_STATIC = 300;
const PATIENCE_MS = 6000;

const isBench = (url) => /^\/projects\/[^/]+\/bench\/[^/]+\/?$/.test(url.pathname);
const isTraveler = (url) => /^\/api\/projects\/[^/]+\/units\/[^/]+\/traveler$/.test(url.pathname);
const isStatic = (url) => url.pathname.startsWith("/_next/static/");
const isSignIn = (url) => url.pathname === "/sign-in";

self.addEventListener("install", () => self.skipWaiting());

self.addEventListener("activate", (event) => {
  event.waitUntil(
    (async () => {
      const names = await caches.keys();
      const old = names.filter((name) => name.startsWith("boardwake-bench-") && name !== PAGES && name !== STATIC);
      await Promise.all(old.map((name) => caches.delete(name)));
      await self.clients.claim();
    })(),
  );
});

self.addEventListener("message", (event) => {
  if (event.data?.kind === "forget") event.waitUntil(caches.delete(PAGES));
  // The first visit came before this worker did: the page says what it is made of.
  if (event.data?.kind === "keep") event.waitUntil(keepVisit(event.data.page, event.data.assets));
});

self.addEventListener("fetch", (event) => {
  const { request } = event;
  const url = new URL(request.url);
  if (request.method !== "GET" || url.origin !== self.location.origin) return;
  if (isSignIn(url)) event.waitUntil(caches.delete(PAGES));
  else if (isStatic(url)) event.respondWith(staticFile(event));
  else if (request.mode === "navigate" && isBench(url)) event.respondWith(networkFirst(event, url.pathname, notHere));
  else if (isTraveler(url)) event.respondWith(networkFirst(event, url.pathname, noNetwork));
});

/** Fresh when there is a network, else what was kept. One page is kept for a unit, whatever check the address asks for. */
async function networkFirst(event, key, otherwise) {
  const pages = await caches.open(PAGES);
  const fresh = fetch(event.request).then(async (response) => {
    if (response.ok && !response.redirected) await put(pages, key, response.clone(), MOST_PAGES);
    // Signed out or no longer a member: what was kept of this page goes.
    else if (response.type === "opaqueredirect" || [401, 403, 404].includes(response.status)) await pages.delete(key);
    return response;
  });
  event.waitUntil(fresh.catch(() => undefined));
  const kept = await pages.match(key);
  if (!kept) return fresh.catch(otherwise);
  const waited = new Promise((resolve) => setTimeout(resolve, PATIENCE_MS));
  const first = await Promise.race([fresh.catch(() => undefined), waited]);
  // A server that stumbles (database away) must not take the bench away.
  return first && first.status < 500 ? first : kept;
}

/** Built files never change under their name; those of a development server do and are asked for anew. */
async function staticFile(event) {
  const files = await caches.open(STATIC);
  const kept = await files.match(event.request);
  if (kept && (kept.headers.get("cache-control") ?? "").includes("immutable")) return kept;
  try {
    const response = await fetch(event.request);
    if (response.ok) event.waitUntil(put(files, event.request, response.clone(), MOST_STATIC));
    return response;
  } catch (error) {
    if (kept) return kept;
    throw error;
  }
}

async function keepVisit(page, assets) {
  const url = new URL(page, self.location.origin);
  if (!isBench(url)) return;
  const [pages, files] = [await caches.open(PAGES), await caches.open(STATIC)];
  if (!(await pages.match(url.pathname))) {
    const response = await fetch(url.pathname, { credentials: "same-origin" });
    if (response.ok && !response.redirected) await put(pages, url.pathname, response, MOST_PAGES);
  }
  const wanted = assets.map((asset) => new URL(asset, self.location.origin)).filter((one) => one.origin === self.location.origin && isStatic(one));
  await Promise.all(
    wanted.map(async (one) => {
      if (await files.match(one.href)) return;
      const response = await fetch(one.href).catch(() => undefined);
      if (response?.ok) await put(files, one.href, response, MOST_STATIC);
    }),
  );
}

/** Puts it last and lets the oldest go. The new copy takes the old one's place whole and in one step: the network may drop midway. */
async function put(cache, key, response, most) {
  const { status, statusText, headers } = response;
  const whole = new Response(await response.arrayBuffer(), { status, statusText, headers });
  await cache.put(key, whole);
  const keys = await cache.keys();
  await Promise.all(keys.slice(0, Math.max(0, keys.length - most)).map((old) => cache.delete(old)));
}

const noNetwork = () =>
  new Response(JSON.stringify({ title: "No network", status: 503, detail: "There is no network just now." }), {
    status: 503,
    headers: { "content-type": "application/problem+json" },
  });

const notHere = () =>
  new Response(
    `<!doctype html><html lang="en-GB"><meta charset="utf-8"><meta name="viewport" content="width=device-width">
<title>No network · Boardwake</title>
<body style="margin:0;padding:2rem;background:#efe9dc;color:#1d211e;font:18px/1.5 system-ui,sans-serif">
<h1>No network</h1>
<p>This unit has not been opened at the bench on this device before, so its checks are not here.</p>
<p>Open it once with a network; after that it works without. What you recorded earlier is still held on this device.</p>
<p><a href="">Try again</a></p>`,
    { status: 503, headers: { "content-type": "text/html; charset=utf-8" } },
  );
