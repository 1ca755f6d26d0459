import { eq } from "drizzle-orm";
import { expect, test, type APIRequestContext } from "@playwright/test";
import { closeDatabase, database } from "@/db/client";
import { attachments } from "@/db/schema/evidence";
import { contentsOf } from "./whole-database";
import { MAY } from "./permission-table";
import { ASKERS, makeClients, makePlace, type Asker, type Place } from "./place";
import { routes, type RouteRow } from "./route-rows";
import { routeMethods } from "./served-files";

test.afterAll(closeDatabase);

function refusal(row: RouteRow, asker: Asker): number | undefined {
  if (row.permission === "public") return undefined;
  if (asker === "nobody") return 401;
  if (asker === "stranger") return 404;
  return MAY[row.permission].includes(asker) ? undefined : 403;
}

async function send(client: APIRequestContext, method: string, row: RouteRow, place: Place) {
  const { path, data, headers } = row.ask(place);
  return client.fetch(path, { method, ...(data ? { data } : {}), ...(headers ? { headers } : {}) });
}

test("every method of every route handler has a row here, and every row a handler", () => {
  expect(routeMethods().sort()).toEqual(Object.keys(routes).sort());
});

for (const [name, row] of Object.entries(routes)) {
  const [method = ""] = name.split(" ");

  test(`${name} answers those who may, and tells the others why not`, async ({ playwright }) => {
    const place = await makePlace();
    const clients = await makeClients(playwright, place);
    const before = await contentsOf(place);
    for (const asker of ASKERS) {
      const status = refusal(row, asker);
      if (status === undefined) continue;
      const answer = await send(clients[asker], method, row, place);
      expect(answer.status(), asker).toBe(status);
      expect(answer.headers()["content-type"], asker).toBe("application/problem+json");
      expect(await answer.json(), asker).toMatchObject({ status, detail: expect.stringMatching(/^[A-Z].+\.$/) });
    }
    expect(await contentsOf(place), "what the refused left behind").toEqual(before);
    for (const asker of ASKERS.filter((each) => refusal(row, each) === undefined)) {
      expect((await send(clients[asker], method, row, place)).status(), asker).toBe(row.status);
    }
    await Promise.all(ASKERS.map((asker) => clients[asker].dispose()));
  });
}

test("a project one may not see answers like one that does not exist", async ({ playwright }) => {
  const place = await makePlace();
  const clients = await makeClients(playwright, place);
  const address = (slug: string) => `/api/projects/${slug}/units/TIM-01/traveler`;
  const [hidden, absent] = [
    await clients.stranger.get(address(place.slug)),
    await clients.stranger.get(address("no-such-project")),
  ];
  expect(hidden.status()).toBe(absent.status());
  const withoutInstance = async (answer: typeof hidden) => ({ ...(await answer.json()), instance: "" });
  expect(await withoutInstance(hidden)).toEqual(await withoutInstance(absent));
});

test("a change that another site's page sends is refused, whoever is signed in", async ({ playwright }) => {
  const place = await makePlace();
  const clients = await makeClients(playwright, place);
  const before = await contentsOf(place);
  for (const [name, row] of Object.entries(routes).filter(
    ([key, each]) => key.startsWith("POST") && each.permission !== "public",
  )) {
    const elsewhere: Record<string, string>[] = [
      { "sec-fetch-site": "cross-site" },
      { origin: "https://elsewhere.example" },
    ];
    for (const headers of elsewhere) {
      const { path, data } = row.ask(place);
      const answer = await clients.maintainer.post(path, { data, headers });
      expect(answer.status(), `${name} with ${JSON.stringify(headers)}`).toBe(403);
    }
  }
  expect(await contentsOf(place)).toEqual(before);
});

test("a file of one project is not to be had through another project of the same person", async ({ playwright }) => {
  const theirs = await makePlace();
  const mine = await makePlace();
  const clients = await makeClients(playwright, mine);
  const answer = await clients.maintainer.get(`/api/projects/${mine.slug}/files/${theirs.file}`);
  expect(answer.status()).toBe(404);
  const [row] = await database().select().from(attachments).where(eq(attachments.id, theirs.file));
  expect(await answer.text()).not.toContain(row?.objectKey);
});
