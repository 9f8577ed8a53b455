import type { Page } from "@playwright/test";
import { eq, sql } from "drizzle-orm";
import { keyed } from "../../seed/factories/acting";
import { type Lab, makeLab } from "../../seed/factories/lab";
import { correctCleaningRun } from "../../src/data/cleaning-runs";
import { getSetResults } from "../../src/data/cycles";
import { database } from "../../src/db/client";
import { sessions } from "../../src/db/schema/people";
import { setInReview } from "../support/set-in-review";
import { personIdOf } from "./support/sign-in";
import { expect, test } from "./support/test";

let lab: Lab;

test.beforeAll(async () => {
  lab = await makeLab();
});

async function openSet(page: Page, setId: string) {
  await page.goto(`/sets/${setId}`);
  await expect(page.getByRole("button", { name: "Send back" })).toBeVisible();
}

/** As if the password had been entered before lunch. */
async function enteredLongAgo(personId: string) {
  await database()
    .update(sessions)
    .set({ authenticatedAt: sql`now() - interval '16 minutes'` })
    .where(eq(sessions.userId, personId));
}

test("a set goes back to the bench with a reason, which its technician reads", async ({ as }) => {
  const { setId } = await setInReview(lab);
  const manager = await as(lab.manager.personId);
  await openSet(manager, setId);
  await manager.getByRole("button", { name: "Send back" }).click();
  const dialog = manager.getByRole("dialog");
  await dialog.getByRole("button", { name: "Send back" }).click();
  await expect(dialog.getByText("Reason is missing", { exact: false })).toBeVisible();
  await dialog.getByLabel("Reason").fill("The third injector drips: check its seat again.");
  await dialog.getByRole("button", { name: "Send back" }).click();
  await expect(dialog).toBeHidden();
  await expect(manager.getByText("The third injector drips", { exact: false }).first()).toBeVisible();
  await expect(manager.getByRole("button", { name: "Release certificate" })).toBeHidden();

  const technician = await as(lab.technician.personId);
  await technician.goto(`/sets/${setId}`);
  await expect(technician.getByText("The third injector drips", { exact: false }).first()).toBeVisible();
  await expect(technician.getByRole("button", { name: "Correct the cycle as left" })).toBeVisible();
  await technician.getByRole("button", { name: "Send to review" }).click();
  await technician.getByRole("dialog").getByRole("button", { name: "Send to review" }).click();
  await expect(technician.getByRole("dialog")).toBeHidden();
  await openSet(manager, setId);
});

test("a release asks for the password again, and goes on where it was once it is right", async ({ as }) => {
  const { setId } = await setInReview(lab);
  const personId = await personIdOf("mara.quill@evenrail.example");
  const manager = await as(personId);
  await openSet(manager, setId);
  await enteredLongAgo(personId);
  await manager.getByRole("button", { name: "Release certificate" }).click();
  await manager.getByLabel("Remarks").fill("Seals renewed on all four.");
  await manager.getByRole("button", { name: "Sign and release" }).click();
  const gate = manager.getByRole("dialog", { name: "Please enter your password again" });
  await gate.getByLabel("Password").fill("not this one");
  await gate.getByRole("button", { name: "Confirm" }).click();
  await expect(gate.getByText(/password/i).last()).toBeVisible();
  await gate.getByLabel("Password").fill("seven plum kettles");
  await gate.getByRole("button", { name: "Confirm" }).click();
  await expect(manager.getByRole("heading", { name: /^Certificate C\d{2}-\d{4}\/1/ })).toBeVisible();
});

test("what was corrected under the open page is named, and what was typed stays", async ({ as }) => {
  const { setId } = await setInReview(lab);
  const manager = await as(lab.manager.personId);
  await openSet(manager, setId);
  const { cleaningRuns } = await getSetResults(lab.technician.context, { setId });
  const { cleaningRunId, bath, minutes, temperatureC } = cleaningRuns[0]!;
  const correction = { bath, minutes, temperatureC, detergentBatch: "D-120", partsRenewed: [], note: "" };
  await correctCleaningRun(
    lab.technician.context,
    keyed({ ...correction, cleaningRunId, reason: "The batch was misread." }),
  );
  await manager.getByRole("button", { name: "Release certificate" }).click();
  await manager.getByLabel("Remarks").fill("Seals renewed on all four.");
  await manager.getByRole("button", { name: "Sign and release" }).click();
  const dialog = manager.getByRole("dialog");
  await expect(dialog.getByText("A cleaning run was recorded or corrected.")).toBeVisible();
  await expect(dialog.getByLabel("Remarks")).toHaveValue("Seals renewed on all four.");
});

test("a certificate is reissued and revoked, and each file says what it is before it is handed out", async ({
  as,
}) => {
  const { setId } = await setInReview(lab);
  const manager = await as(lab.manager.personId);
  await openSet(manager, setId);
  await manager.getByRole("button", { name: "Release certificate" }).click();
  await manager.getByRole("button", { name: "Sign and release" }).click();
  const heading = manager.getByRole("heading", { name: /^Certificate C/ });
  await expect(heading).toBeVisible();
  const first = new URL(manager.url()).pathname;

  await manager.getByRole("button", { name: "Reissue" }).click();
  await manager.getByLabel("Reason for the new revision").fill("The customer's address has changed.");
  await manager.getByRole("button", { name: "Sign and reissue" }).click();
  await expect(manager.getByRole("heading", { name: /^Certificate C\d{2}-\d{4}\/2/ })).toBeVisible();
  const second = new URL(manager.url()).pathname;

  const fileOf = (page: string) => `/api/files${page}/pdf`;
  const superseded = await manager.request.get(fileOf(first), { maxRedirects: 0 });
  expect(superseded.status()).toBe(303);
  expect(new URL(superseded.headers().location!).pathname).toBe(first);
  const kept = await manager.request.get(`${fileOf(first)}?state=superseded`);
  expect(kept.headers()["content-disposition"]).toContain("superseded");
  await manager.goto(first);
  await expect(manager.getByText(/\/1 is superseded/)).toBeVisible();
  await expect(manager.getByRole("button", { name: "Reissue" })).toBeHidden();

  await manager.goto(second);
  await manager.getByRole("button", { name: "Revoke" }).click();
  await manager.getByLabel("Reason").fill("The wrong class was judged.");
  await manager.getByRole("button", { name: /^Revoke C/ }).click();
  await expect(manager.getByText(/\/2 is revoked/)).toBeVisible();
  await expect(manager.getByText("The wrong class was judged.", { exact: false }).first()).toBeVisible();
  expect((await manager.request.get(fileOf(second), { maxRedirects: 0 })).status()).toBe(303);
  await expect(manager.getByRole("button", { name: "Revoke" })).toBeHidden();

  await manager.getByRole("button", { name: "Reissue" }).click();
  await manager.getByLabel("Reason for the new revision").fill("Judged by the right class.");
  await manager.getByRole("button", { name: "Sign and reissue" }).click();
  await expect(manager.getByRole("heading", { name: /^Certificate C\d{2}-\d{4}\/3/ })).toBeVisible();
});
