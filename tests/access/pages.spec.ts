import { expect, test } from "@playwright/test";
import { closeDatabase } from "@/db/client";
import { pages, type PageRow } from "./page-rows";
import { MAY } from "./permission-table";
import { ASKERS, makeClients, makePlace, type Asker } from "./place";
import { pageFiles } from "./served-files";

test.afterAll(closeDatabase);

type Expected = { status: number; location?: string };

function expected(row: PageRow, asker: Asker, path: string, onward: string | undefined): Expected {
  if (row.permission !== "public" && asker === "nobody") {
    return { status: 307, location: `/sign-in?next=${encodeURIComponent(path)}` };
  }
  const needed = row.permission === "public" || row.permission === "own" ? undefined : row.permission;
  const isMember = asker !== "nobody" && asker !== "stranger";
  if (needed && !(isMember && MAY[needed].includes(asker))) return { status: 404 };
  if (onward && asker !== "nobody") return { status: 307, location: onward };
  return { status: 200 };
}

test("every page of the program has a row here, and every row a page", () => {
  expect(pageFiles()).toEqual(Object.keys(pages).sort());
});

for (const [file, row] of Object.entries(pages)) {
  test(`${file} is shown to those who may see it; others are told that it is not there`, async ({ playwright }) => {
    const place = await makePlace();
    const clients = await makeClients(playwright, place);
    const path = row.path(place);
    for (const asker of ASKERS) {
      const answer = await clients[asker].get(path);
      const { status, location } = expected(row, asker, path, row.onward?.(place));
      expect(answer.status(), `${asker} asks for ${path}`).toBe(status);
      if (location) expect(new URL(answer.headers()["location"] ?? "", "http://x").href).toBe(`http://x${location}`);
    }
    await Promise.all(ASKERS.map((asker) => clients[asker].dispose()));
  });
}
