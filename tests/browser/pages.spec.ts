import AxeBuilder from "@axe-core/playwright";
import type { Page } from "@playwright/test";
import { eq } from "drizzle-orm";
import { database } from "../../src/db/client";
import { benches } from "../../src/db/schema/benches";
import { certificates } from "../../src/db/schema/certificates";
import { customers } from "../../src/db/schema/customers";
import { sets } from "../../src/db/schema/sets";
import { personIdOf } from "./support/sign-in";
import { expect, test } from "./support/test";

const phone = { width: 390, height: 844 };

async function soundPage(page: Page, path: string) {
  await page.goto(path);
  await expect(page.locator("h1").first()).toBeVisible();
  const { violations } = await new AxeBuilder({ page })
    .withTags(["wcag2a", "wcag2aa", "wcag21aa", "wcag22aa"])
    .analyze();
  const serious = violations.filter(({ impact }) => impact === "serious" || impact === "critical");
  expect.soft(serious.map(({ id, nodes }) => `${path}: ${id} ${nodes[0]?.html.slice(0, 160)}`)).toEqual([]);
  await page.setViewportSize(phone);
  const wider = () => page.evaluate(() => document.documentElement.scrollWidth - window.innerWidth);
  // Charts follow a new width a moment later.
  await expect
    .soft(async () =>
      expect(await wider(), `${path} on a phone is wider than the phone`).toBeLessThanOrEqual(0),
    )
    .toPass({ timeout: 5_000 });
  await page.setViewportSize({ width: 1440, height: 900 });
}

async function someOf() {
  const [certificate] = await database()
    .select({ certificateId: certificates.id, setId: certificates.setId })
    .from(certificates)
    .innerJoin(sets, eq(sets.id, certificates.setId))
    .innerJoin(customers, eq(customers.id, sets.customerId))
    .where(eq(customers.name, "Orrin Engine Works"))
    .limit(1);
  const [bench] = await database().select({ benchId: benches.id }).from(benches).limit(1);
  const [customer] = await database().select({ customerId: customers.id }).from(customers).limit(1);
  return { ...certificate!, ...bench!, ...customer! };
}

test("every page of the lab can be read by everybody and fits a phone", async ({ as }) => {
  const { certificateId, setId, benchId, customerId } = await someOf();
  const manager = await as(await personIdOf("mara.quill@evenrail.example"));
  for (const path of [
    "/",
    "/sets",
    "/sets/new",
    `/sets/${setId}`,
    "/certificates",
    `/certificates/${certificateId}`,
    "/customers",
    `/customers/${customerId}`,
    "/models",
    "/models/new",
    "/models/import",
    "/calibration",
    `/calibration/${benchId}`,
    `/calibration/${benchId}/record`,
    "/calibration/new",
    "/people",
    "/people/new",
    "/activity",
    "/settings",
    "/settings/classes",
    "/settings/fluids",
    "/profile",
  ])
    await soundPage(manager, path);
  const technician = await as(await personIdOf("edda.voss@evenrail.example"));
  await soundPage(technician, "/bench");
});

test("a customer's pages can be read by everybody and fit a phone, and another customer's do not exist", async ({
  as,
}) => {
  const { certificateId, setId } = await someOf();
  const customer = await as(await personIdOf("orrin.hale@evenrail.example"));
  for (const path of [
    "/my",
    "/my/certificates",
    `/my/sets/${setId}`,
    `/my/certificates/${certificateId}`,
    "/my/profile",
  ])
    await soundPage(customer, path);
  const [foreign] = await database()
    .select({ setId: sets.id })
    .from(sets)
    .innerJoin(customers, eq(customers.id, sets.customerId))
    .where(eq(customers.name, "Fennick Motorsport"))
    .limit(1);
  const answer = await customer.goto(`/my/sets/${foreign!.setId}`);
  expect(answer?.status()).toBe(404);
  expect((await customer.request.get("/api/data/customers?search=Fennick")).status()).toBe(200);
  expect(await (await customer.request.get("/api/data/customers?search=Fennick")).json()).toEqual([]);
  const turnedAway = await customer.request.get("/people", { maxRedirects: 0 });
  expect(turnedAway.status()).not.toBe(200);
  expect(await turnedAway.text()).not.toContain("@evenrail.example");
});

test("who is not signed in is led to the sign-in and back", async ({ page }) => {
  await page.goto("/certificates");
  await expect(page).toHaveURL(/\/sign-in\?next=%2Fcertificates$/);
  await page.getByLabel("E-mail").fill("mara.quill@evenrail.example");
  await page.getByLabel("Password").fill("wrong once");
  await page.getByRole("button", { name: "Sign in" }).click();
  await expect(page.getByRole("alert").first()).toContainText("do not belong together");
  await expect(page.getByLabel("E-mail")).toHaveValue("mara.quill@evenrail.example");
  await page.getByLabel("Password").fill("seven plum kettles");
  await page.getByRole("button", { name: "Sign in" }).click();
  await expect(page.getByRole("heading", { name: "Certificates" })).toBeVisible();
  await page.getByRole("button", { name: "Sign out" }).click();
  await expect(page).toHaveURL(/\/sign-in$/);
});

test("bad input at check-in is named beside its field, keeps what was typed and changes nothing", async ({
  as,
}) => {
  const counter = await as(await personIdOf("ines.fallow@evenrail.example"));
  await counter.goto("/sets/new");
  await counter.getByRole("combobox", { name: "Customer" }).fill("Ω".repeat(400));
  await counter.getByRole("option", { name: /New customer/ }).click();
  await counter.getByRole("combobox", { name: "Injector model" }).fill("Kestrel KX-440");
  await counter
    .getByRole("option", { name: /Kestrel KX-440/ })
    .first()
    .click();
  await counter.getByLabel("Serial of injector 1", { exact: true }).fill("S-1");
  await counter.getByLabel("Serial of injector 2", { exact: true }).fill("s-1");
  await counter.getByRole("button", { name: /Check in 4 injectors/ }).click();
  await expect(counter.getByRole("alert").first()).toContainText("need attention");
  await expect(counter.getByText("same serial as injector 1")).toBeVisible();
  await expect(counter.getByText("Tolerance class", { exact: false }).first()).toBeVisible();
  await expect(counter.getByLabel("Serial of injector 1", { exact: true })).toHaveValue("S-1");
  await expect(counter).toHaveURL(/\/sets\/new$/);
});
