import { createHash, randomUUID } from "node:crypto";
import { readFile } from "node:fs/promises";
import type { Page } from "@playwright/test";
import { type Lab, makeLab } from "../../seed/factories/lab";
import { release } from "../../seed/factories/steps";
import { getCertificate } from "../../src/data/certificates";
import { setInReview } from "../support/set-in-review";
import { expect, test } from "./support/test";

let lab: Lab;

test.beforeAll(async () => {
  lab = await makeLab();
});

async function download(page: Page, name: RegExp) {
  const started = page.waitForEvent("download");
  await page.getByRole("link", { name }).click();
  const file = await started;
  return { name: file.suggestedFilename(), bytes: await readFile(await file.path()) };
}

test("a customer follows a set, and gets its figures, certificate and data sheets when it is certified", async ({
  as,
}) => {
  const { setId, number } = await setInReview(lab, { internalNote: "canary 77b: pays late" });
  const customer = await as(lab.customerPerson.personId);
  await customer.goto("/my");
  await customer.getByRole("link", { name: new RegExp(number) }).click();
  await expect(customer.getByText("The figures come with the certificate")).toBeVisible();
  await expect(customer.getByText("in review").first()).toBeVisible();
  expect(await customer.content()).not.toContain("canary 77b");

  const { certificateId } = await release(lab.manager.context, setId);
  const { pdfSha256, number: certificate } = await getCertificate(lab.manager.context, { certificateId });
  await customer.reload();
  await expect(customer.getByRole("heading", { name: `Certificate ${certificate}` })).toBeVisible();
  await expect(customer.getByRole("table", { name: /Flow per pulse/ }).first()).toBeVisible();
  expect(await customer.content()).not.toContain("canary 77b");

  const pdf = await download(customer, /^Certificate, PDF/);
  expect(createHash("sha256").update(pdf.bytes).digest("hex")).toBe(pdfSha256);
  expect(pdf.name).toBe(`certificate ${certificate.replace("/", "-")}.pdf`);
  const csv = await download(customer, /^Data sheet, CSV/);
  const json = await download(customer, /^Data sheet, JSON/);
  const [head, first] = csv.bytes.toString("utf8").split("\r\n");
  const column = head!.split(",").indexOf("dead_time_ms");
  const sheet = JSON.parse(json.bytes.toString("utf8"));
  expect(Number(first!.split(",")[column])).toBe(sheet.injectors[0].dead_time_ms);
});

test("what belongs to another customer answers like what never was", async ({ as }) => {
  const { setId, number } = await setInReview(lab, { customerId: lab.otherCustomer });
  const { certificateId } = await release(lab.manager.context, setId);
  const customer = await as(lab.customerPerson.personId);
  const own = (set: string, certificate: string) => [
    `/my/sets/${set}`,
    `/my/certificates/${certificate}`,
    `/api/files/certificates/${certificate}/pdf`,
    `/api/files/certificates/${certificate}/csv`,
    `/api/files/certificates/${certificate}/json`,
  ];
  const statusOf = async (address: string) =>
    (await customer.request.get(address, { maxRedirects: 0 })).status();
  for (const address of [...own(setId, certificateId), ...own(randomUUID(), randomUUID())])
    expect(await statusOf(address), address).toBe(404);
  for (const address of [`/sets/${setId}`, `/certificates/${certificateId}`]) {
    const turnedAway = await customer.request.get(address, { maxRedirects: 0 });
    expect(turnedAway.status(), address).not.toBe(200);
    expect(await turnedAway.text(), address).not.toContain(number);
  }
  const list = await customer.request.get("/api/data/sets?view=all&startRow=0&endRow=100");
  expect(await list.text()).not.toContain(setId);
});
