import { test as base, type BrowserContext, type Page } from "@playwright/test";
import { closeDatabase } from "@/db/client";
import { signInAs } from "../support/session";

type Person = { userId: string };
type Fixtures = {
  /** A page in a browser of its own in which this person is signed in. */
  pageOf: (person: Person) => Promise<Page>;
};

export const test = base.extend<Fixtures, { closing: void }>({
  pageOf: async ({ browser }, use) => {
    const contexts: BrowserContext[] = [];
    await use(async (person) => {
      const context = await browser.newContext();
      contexts.push(context);
      await signInAs(context, person);
      return context.newPage();
    });
    await Promise.all(contexts.map((context) => context.close()));
  },
  closing: [
    async ({}, use) => {
      await use();
      await closeDatabase();
    },
    { scope: "worker", auto: true },
  ],
});

export { expect } from "@playwright/test";
