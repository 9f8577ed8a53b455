import type { Page } from "@playwright/test";
import sharp from "sharp";
import { type IndependentInjector, independentFigures } from "../support/independent-figures";
import { benchInForce } from "./support/bench-in-force";
import {
  paste,
  recordAsRead,
  recordCycle,
  typeChecks,
  typeConditions,
  typeReadings,
} from "./support/bench-page";
import { asPasted, heldOpenSeconds, readingsOf, type Truth, widths } from "./support/bench-readings";
import { expectPrinted, pairBeside, rowsOf, textOf } from "./support/certificate-text";
import { personIdOf } from "./support/sign-in";
import { expect, test } from "./support/test";

const count = 8;
const serials = Array.from({ length: count }, (_, index) => `J${process.pid}-${index + 1}`);
const [temperatureC, pressureKpa] = [21, 300];

/** Invented: dirty as found, even as left. */
const asFoundTruth = serials.map((_, index): Truth => {
  return {
    staticMlPerMin: 436 - 2.6 * ((index * 5) % 7),
    deadTimeMs: 0.93 + 0.003 * index,
    ohmsAt20C: 12 + 0.03 * index,
  };
});
const asLeftTruth = serials.map((_, index): Truth => {
  return {
    staticMlPerMin: 440 + 0.4 * ((index * 3) % 5),
    deadTimeMs: 0.92 + 0.001 * (index % 4),
    ohmsAt20C: 12 + 0.03 * index,
  };
});

test("four people take a set from the counter to the customer, and every figure on the certificate is right", async ({
  as,
}, testInfo) => {
  const setPath = await test.step("the counter checks eight injectors in", async () =>
    checkIn(await as(await personIdOf("ines.fallow@evenrail.example"))));

  const bench = await benchInForce("B1");
  const found = readingsOf(asFoundTruth, bench.channels, bench);
  const left = readingsOf(asLeftTruth, bench.channels, bench);

  const technician = await as(await personIdOf("tomas.brandt@evenrail.example"));
  await technician.context().grantPermissions(["clipboard-read", "clipboard-write"]);
  await test.step("the technician measures as found, typing", async () => {
    await technician.goto(setPath);
    await technician.getByRole("button", { name: "Measure as found" }).click();
    await typeConditions(technician, { bench: "B1", temperatureC: "21", pressureKpa: "300" });
    await typeReadings(technician, found);
    await typeChecks(technician, found);
    await photographSpray(technician, "as found");
    await recordAsRead(technician);
    await recordCycle(technician);
  });
  await test.step("cleans", async () => {
    await technician.getByRole("link", { name: "Record a cleaning run" }).click();
    await technician.getByLabel("Bath", { exact: true }).fill("Ultrasonic bath 2");
    await technician.getByLabel("Detergent batch").fill("D-140");
    await technician.getByLabel("Minutes").fill("30");
    await technician.getByLabel("Bath temperature").fill("50");
    await technician.getByLabel("Back-flushed").check();
    await technician.getByRole("button", { name: /Record the cleaning/ }).click();
    await expect(technician).toHaveURL(new RegExp(`${setPath}$`));
  });
  await test.step("measures as left, pasting, and sends to review", async () => {
    await technician.getByRole("button", { name: "Measure as left" }).click();
    await typeConditions(technician, { bench: "B1", temperatureC: "21", pressureKpa: "300" });
    await paste(technician, 0, "w1", asPasted(left));
    await typeChecks(technician, left);
    await photographSpray(technician, "as left");
    await recordAsRead(technician);
    await recordCycle(technician);
    await technician.getByRole("button", { name: "Send to review" }).click();
    await technician.getByRole("dialog").getByRole("button", { name: "Send to review" }).click();
    await expect(technician.getByRole("dialog")).toBeHidden();
  });

  await test.step("the manager releases", async () => {
    const manager = await as(await personIdOf("mara.quill@evenrail.example"));
    await manager.goto(setPath);
    await manager.getByRole("button", { name: "Release certificate" }).click();
    await manager.getByRole("dialog").getByRole("button", { name: "Sign and release" }).click();
    await expect(manager.getByRole("heading", { name: /^Certificate C/ })).toBeVisible();
  });

  const pdf = await test.step("the customer downloads", async () => {
    const customer = await as(await personIdOf("orrin.hale@evenrail.example"));
    await customer.goto("/my");
    await customer.goto(`/my${setPath}`);
    const download = customer.waitForEvent("download");
    await customer.getByRole("link", { name: /^Certificate, PDF/ }).click();
    const path = testInfo.outputPath("certificate.pdf");
    await (await download).saveAs(path);
    return path;
  });

  await test.step("every figure agrees with a second calculation", () => {
    const run = {
      temperatureC,
      pressureKpa,
      division: bench.divisionMl,
      repeatability: 0.03,
      instruments: bench.instruments,
      reference: { pressureKpa: 300, densityGPerMl: 0.683815 },
      widths,
      heldOpenSeconds,
    };
    const text = textOf(pdf);
    compareSet(
      text,
      independentFigures({ ...run, injectors: found }),
      independentFigures({ ...run, injectors: left }),
    );
  });
});

async function checkIn(counter: Page): Promise<string> {
  await counter.goto("/sets/new");
  await counter.getByRole("combobox", { name: "Customer" }).fill("Orrin");
  await counter.getByRole("option", { name: "Orrin Engine Works Orrin Hale" }).click();
  await counter.getByRole("combobox", { name: "Injector model" }).fill("KX-440");
  await counter.getByRole("option", { name: /^Kestrel KX-440\s*440/ }).click();
  await counter.getByLabel("How many").fill(String(count));
  await counter.getByLabel("How many").press("Enter");
  for (const [index, serial] of serials.entries())
    await counter.getByLabel(`Serial of injector ${index + 1}`, { exact: true }).fill(serial);
  await counter.getByLabel("Tolerance class").selectOption({ label: "Road race" });
  await counter.getByRole("button", { name: `Check in ${count} injectors` }).click();
  await expect(counter.getByRole("heading", { name: /is checked in/ })).toBeVisible();
  return new URL(counter.url()).pathname.replace(/\/checked-in$/, "");
}

async function photographSpray(page: Page, phase: string) {
  const buffer = await sharp({ create: { width: 400, height: 300, channels: 3, background: "#334455" } })
    .png()
    .toBuffer();
  await page.getByRole("radio", { name: phase }).check();
  await page.getByLabel("Shows").selectOption({ index: 1 });
  await page
    .locator("input[type=file][accept*='image/png']")
    .first()
    .setInputFiles({ name: "spray.png", mimeType: "image/png", buffer });
  await expect(page.getByText(`spray ${phase}`).first()).toBeVisible();
}

type Figures = ReturnType<typeof independentFigures>;

function compareSet(text: string, found: Figures, left: Figures) {
  const number = /\b\d{2}-\d{4}\b/.exec(text)![0];
  for (const [index, serial] of serials.entries()) {
    const injector = { tag: `${number}/${index + 1}`, serial };
    const flows = rowsOf(text, "Flow per pulse", injector);
    const lines = rowsOf(text, "Static flow and dead time", injector);
    const checks = rowsOf(text, "Winding, leakage and spray", injector);
    compareInjector(
      `${injector.tag} as found`,
      found.injectors[index]!,
      flows.found,
      lines.found,
      checks.found,
    );
    compareInjector(`${injector.tag} as left`, left.injectors[index]!, flows.left, lines.left, checks.left);
  }
  const spreads = pairBeside(text, "Spread, %");
  for (const [phase, figures] of [
    ["found", found],
    ["left", left],
  ] as const) {
    widths.forEach(({ ms }, column) => {
      expectPrinted(spreads[phase][column], figures.spreads[column]!, 2, `spread at ${ms} ms as ${phase}`);
    });
    expectPrinted(
      spreads[phase][widths.length],
      figures.staticSpread,
      2,
      `spread of static flow as ${phase}`,
    );
  }
}

function compareInjector(
  name: string,
  expected: IndependentInjector,
  flows: number[],
  line: number[],
  checks: number[],
) {
  widths.forEach(({ ms }, column) => {
    expectPrinted(flows[column], expected.flows[column]!, 2, `${name}, flow at ${ms} ms`);
  });
  expectPrinted(flows[widths.length], expected.staticFlow, 1, `${name}, static flow`);
  const [staticFlow, , , heldOpen, closure, deadTime, low, high, from, to] = line;
  expectPrinted(staticFlow, expected.staticFlow, 1, `${name}, static flow of the line`);
  expectPrinted(heldOpen, expected.heldOpen, 1, `${name}, held open`);
  expectPrinted(closure, expected.closurePercent, 2, `${name}, closure`);
  expectPrinted(deadTime, expected.deadTime, 3, `${name}, dead time`);
  expectPrinted(low, expected.interval[0], 3, `${name}, dead time from`);
  expectPrinted(high, expected.interval[1], 3, `${name}, dead time to`);
  expectPrinted(from, expected.range.from, 3, `${name}, linear from`);
  expectPrinted(to, expected.range.to, 3, `${name}, linear to`);
  expectPrinted(checks[0], expected.ohmsAt20C, 2, `${name}, resistance`);
}
