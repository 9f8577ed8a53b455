import { beforeAll, expect, test } from "vitest";
import { keyed } from "../../seed/factories/acting";
import { type Lab, makeLab } from "../../seed/factories/lab";
import { findEntryLink } from "../../src/auth/entry-link";
import { signInWithPassword } from "../../src/auth/sign-in";
import { spendEntryLink } from "../../src/auth/spend-entry-link";
import { addPerson, renewEntryLink } from "../../src/data/people";
import { database } from "../../src/db/client";
import { settings } from "../../src/settings";
import { asOwner } from "../support/databases";
import { isSignedIn, nobody, password, tokenOf } from "../support/people";

let lab: Lab;
let count = 0;

beforeAll(async () => {
  lab = await makeLab();
});

async function invited() {
  count += 1;
  const email = `invited.${count}@lab.example`;
  const { personId, entryLink } = await addPerson(
    lab.manager.context,
    keyed({ name: "Bela Thorn", email, kind: "staff", roles: ["technician"], customerId: "" }),
  );
  return { personId, email, entryLink: entryLink!, token: tokenIn(entryLink!) };
}

function tokenIn(link: string): string {
  return link.slice(link.lastIndexOf("/") + 1);
}

function spend(token: string, chosen = password) {
  return spendEntryLink(nobody(), { token, password: chosen, peer: "10.1.0.1", browser: "a browser" });
}

test("a link leads to our own address, is stored as a hash, and is not spent by looking", async () => {
  const { entryLink, token, personId } = await invited();
  expect(entryLink.startsWith(`${settings().APP_ORIGIN}/welcome/`)).toBe(true);
  expect(Buffer.from(token, "base64url")).toHaveLength(32);
  const stored = await asOwner((sql) => sql`select * from entry_links`);
  expect(JSON.stringify(stored)).not.toContain(token);
  for (let look = 0; look < 10; look++)
    expect((await findEntryLink(database(), token))?.personId).toBe(personId);
  expect(await spend(token)).toMatchObject({ personId });
});

test("it opens once: of two at the same time one is told that it is gone", async () => {
  const { token, email } = await invited();
  const answers = await Promise.all([spend(token), spend(token)]);
  expect(answers.filter((answer) => "cookie" in answer)).toHaveLength(1);
  expect(answers.filter((answer) => "gone" in answer)).toHaveLength(1);
  expect(await spend(token)).toEqual({ gone: true });
  const signedIn = await signInWithPassword(nobody(), {
    email,
    password,
    peer: "10.1.0.2",
    browser: "a browser",
  });
  expect(signedIn).toHaveProperty("cookie");
});

test("a newer link ends the one before it, and both end after 72 hours", async () => {
  const { personId, token } = await invited();
  const renewed = await renewEntryLink(lab.manager.context, keyed({ personId }));
  expect(await spend(token)).toEqual({ gone: true });
  await asOwner(
    (sql) => sql`update entry_links set expires_at = expires_at - interval '72 hours' where used_at is null`,
  );
  expect(await spend(tokenIn(renewed.entryLink!))).toEqual({ gone: true });
});

test("a password that is refused spends nothing", async () => {
  const { token } = await invited();
  expect(await spend(token, "too short")).toMatchObject({ problem: expect.stringContaining("15") });
  expect(await spend(token)).toHaveProperty("cookie");
});

test("every sign-in from before ends with it", async () => {
  const { personId, token } = await invited();
  const before = await tokenOf(personId);
  await spend(token);
  expect(await isSignedIn(before)).toBe(false);
});
