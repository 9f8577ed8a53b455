import { test as base, expect, type Page } from "@playwright/test";
import { closeDatabase } from "../../../src/db/client";
import { pageOf } from "./sign-in";

type Fixtures = {
  /** A page of somebody who is signed in. Errors on its console fail the test. */
  as: (personId: string) => Promise<Page>;
};

export const test = base.extend<Fixtures, { databaseClosed: undefined }>({
  as: async ({ browser }, use) => {
    const pages: Page[] = [];
    const complaints: string[] = [];
    await use(async (personId) => {
      const page = await pageOf(browser, personId);
      pages.push(page);
      listen(page, complaints);
      return page;
    });
    for (const page of pages) await page.context().close();
    expect(complaints, "errors on the console").toEqual([]);
  },
  databaseClosed: [
    // biome-ignore lint/correctness/noEmptyPattern: Playwright reads the pattern.
    async ({}, use) => {
      await use(undefined);
      await closeDatabase();
    },
    { scope: "worker", auto: true },
  ],
});

export { expect };

/** The console repeats an answer such as 404 that a test may want; what a page itself says is never wanted. */
function listen(page: Page, complaints: string[]): void {
  page.on("pageerror", (error) => complaints.push(`${page.url()}: ${error.message}`));
  page.on("console", (message) => {
    const answered = /Failed to load resource: the server responded with a status of/.test(message.text());
    if (message.type() === "error" && !answered) complaints.push(`${page.url()}: ${message.text()}`);
  });
}
