import { expect, type Locator, type Page } from "@playwright/test";
import type { RawInjector } from "../../support/independent-figures";

/** A cell of the readings by the place of its injector, from 0, and its column. */
export function cell(page: Page, place: number, column: string): Locator {
  return page.locator(`.ag-row:not(.ag-row-pinned)[row-index="${place}"] [col-id="${column}"]`);
}

type Conditions = { bench: string; temperatureC: string; pressureKpa: string };

export async function typeConditions(page: Page, { bench, temperatureC, pressureKpa }: Conditions) {
  await page.getByLabel("Bench", { exact: true }).selectOption({ label: bench });
  await page.getByLabel("Fluid in °C").fill(temperatureC);
  await page.getByLabel("Pressure in kPa").fill(pressureKpa);
  await page.getByLabel("Winding in °C").fill("23");
  await page.getByLabel("Leakage at in kPa").fill(pressureKpa);
  await page.getByLabel("Leakage for in s").fill("60");
}

/** Types row after row, Tab from cell to cell, without the mouse. */
export async function typeReadings(page: Page, injectors: RawInjector[]) {
  for (const [place, { amounts, heldOpenMl }] of injectors.entries()) {
    await cell(page, place, "w1").click();
    for (const amount of [...amounts, heldOpenMl]) {
      await page.keyboard.type(String(amount));
      await page.keyboard.press("Tab");
    }
  }
}

/** As if copied from a spreadsheet. */
export async function paste(page: Page, place: number, column: string, text: string) {
  await page.evaluate((copied) => navigator.clipboard.writeText(copied), text);
  await cell(page, place, column).click();
  await page.keyboard.press("Control+V");
}

export async function typeChecks(page: Page, injectors: RawInjector[]) {
  await paste(page, 0, "windingOhm", injectors.map(({ winding }) => winding.ohm).join("\n"));
  await paste(page, 0, "insulationMegohm", injectors.map(() => "500").join("\n"));
  await paste(page, 0, "leakageMm3PerMin", injectors.map(() => "0.4").join("\n"));
  await paste(page, 0, "sprayGrade", injectors.map(() => "good").join("\n"));
}

/** Looks at every doubtful reading and says that it stands as read. */
export async function recordAsRead(page: Page) {
  for (const box of await page.getByRole("checkbox", { name: "Recorded as read" }).all()) await box.check();
}

export async function recordCycle(page: Page) {
  await page.getByRole("button", { name: "Record cycle" }).click();
  await page.getByRole("dialog").getByRole("button", { name: "Record cycle" }).click();
  await expect(page).toHaveURL(/\/sets\/[0-9a-f-]{36}$/);
}
