import type { Browser, BrowserContext, Page } from "@playwright/test";
import { eq } from "drizzle-orm";
import { startSession } from "../../../src/auth/session";
import { database } from "../../../src/db/client";
import { people } from "../../../src/db/schema/people";
import { settings } from "../../../src/settings";

/** A page of somebody who is signed in, in a browser of their own. */
export async function pageOf(browser: Browser, personId: string): Promise<Page> {
  const context = await browser.newContext();
  await signIn(context, personId);
  return context.newPage();
}

/** By a row in the database: what the sign-in page does has a test of its own. */
export async function signIn(context: BrowserContext, personId: string): Promise<void> {
  const { name, value } = await startSession(personId, "browser test");
  // Set for https, since the protocol takes no secure cookie for http; Chromium sends it on loopback all the same.
  const url = settings().APP_ORIGIN.replace("http:", "https:");
  await context.addCookies([{ name, value, url, secure: true, httpOnly: true, sameSite: "Lax" }]);
}

export async function personIdOf(email: string): Promise<string> {
  const [person] = await database().select({ id: people.id }).from(people).where(eq(people.email, email));
  if (!person) throw new Error(`Nobody has the e-mail ${email}`);
  return person.id;
}
