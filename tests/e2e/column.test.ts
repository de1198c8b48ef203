import { readFileSync } from "node:fs";
import type { Page } from "playwright-core";
import { afterAll, beforeAll, describe, expect, it } from "vitest";
import { readCastFile } from "../../src/cast/index.ts";
import { defaultBasis, type LevelId, solveCast } from "../../src/survey/index.ts";
import { formatQuantity } from "../../src/units/index.ts";
import { clickAtDepth, loadSample, type Session, startSession } from "../support/page-session.ts";

let session: Session;
beforeAll(async () => {
  session = await startSession();
});
afterAll(() => session?.close());

const SAMPLE = new URL("../../sample-data/corrow-estuary.csv", import.meta.url);

/** What the library says the gauge pressure is in the sample's first cast, as the page writes it. */
function gaugeInLibrary(depthM: number): string {
  const read = readCastFile("corrow-estuary.csv", new Uint8Array(readFileSync(SAMPLE)));
  if (!read.ok) throw new Error("the sample cannot be read");
  const level = { id: "x" as LevelId, name: "x", depthM };
  const { solution } = solveCast({ basis: defaultBasis, levels: [level] }, read.value.casts[0]!);
  return formatQuantity(solution!.levels.gaugePressureKPa[0]!, "kPa", "gaugePressure", "SI");
}

const cellUnder = async (page: Page, header: string): Promise<string | null> => {
  const headers = await page.locator(".level-table thead th").allTextContents();
  const column = headers.findIndex((text) => text.startsWith(header));
  return page.locator(".level-table tbody tr").first().locator("th, td").nth(column).textContent();
};

describe("the column place", () => {
  it("draws five panels with a curve for every cast of the sample", async () => {
    const { page, misdeeds } = await session.open();
    await loadSample(page);
    expect(await page.locator(".panel").count()).toBe(5);
    const castsCount = await page.locator(".cast").count();
    expect(castsCount).toBeGreaterThan(3);
    for (const panel of await page.locator(".panel").all())
      expect(await panel.locator(".curve.solid").count()).toBe(castsCount);
    expect(await page.locator(".panel .curve.in-hand.solid").count()).toBe(5);
    expect(misdeeds).toEqual([]);
  });

  it("moves the plumb line by keyboard and drops a level with Enter", async () => {
    const { page, misdeeds } = await session.open();
    await loadSample(page);
    const charts = page.getByRole("slider", { name: /Plumb line/ });
    await charts.focus();
    await page.keyboard.press("ArrowDown");
    await expect.poll(() => page.locator(".readout").textContent()).toContain("at 0.10\u00a0m");
    await page.keyboard.press("PageDown");
    const text = await page.locator(".readout").textContent();
    expect(text).not.toContain("at 0.10\u00a0m");
    expect(text).toMatch(/gauge \d+\.\d\d\u00a0kPa/);
    expect(await charts.getAttribute("aria-valuetext")).toMatch(/^1\.\d\d\u00a0m$/);
    await page.keyboard.press("Enter");
    await expect.poll(() => page.locator(".level-table tbody tr").count()).toBe(1);
    expect(misdeeds).toEqual([]);
  });

  it("drops a level at a click, with the library's gauge pressure for that depth", async () => {
    const { page } = await session.open();
    await loadSample(page);
    await clickAtDepth(page, 0.5);
    const depth = page.getByLabel("Depth of Level 1");
    await depth.waitFor();
    expect(await cellUnder(page, "Gauge")).toBe(gaugeInLibrary(Number(await depth.inputValue())));
    await depth.fill("7.25");
    await depth.press("Enter");
    await expect.poll(() => cellUnder(page, "Gauge")).toBe(gaugeInLibrary(7.25));
  });

  it("moves a level by dragging its flag", async () => {
    const { page } = await session.open();
    await loadSample(page);
    await clickAtDepth(page, 0.4);
    const depth = page.getByLabel("Depth of Level 1");
    await depth.waitFor();
    const before = Number(await depth.inputValue());
    const flag = (await page.locator(".level .handle").boundingBox())!;
    await page.mouse.move(flag.x + 12, flag.y + 12);
    await page.mouse.down();
    await page.mouse.move(flag.x + 12, flag.y + 92, { steps: 4 });
    await page.mouse.up();
    await expect.poll(async () => Number(await depth.inputValue())).toBeGreaterThan(before + 1);
    expect(await page.locator(".level-table tbody tr").count()).toBe(1);
  });

  it("says where a level stands on a held sample", async () => {
    const { page } = await session.open();
    await loadSample(page);
    const entry = page.getByLabel("Add a level at depth");
    await entry.fill("30");
    await entry.press("Enter");
    await expect.poll(() => page.locator(".level-table tbody tr").textContent()).toContain("held below last sample");
  });

  it("takes a cast in hand, hides one and removes one", async () => {
    const { page } = await session.open();
    await loadSample(page);
    const castsCount = await page.locator(".cast").count();
    await page.getByRole("button", { name: /^Ferry/ }).click();
    await expect.poll(() => page.locator(".level-table h2").textContent()).toBe("Levels in Ferry");
    await page.getByLabel("Show Quay in the charts").uncheck();
    await expect.poll(() => page.locator("[data-panel=density] .curve.solid").count()).toBe(castsCount - 1);
    await page.locator(".cast", { hasText: "Quay" }).hover();
    await page.getByRole("button", { name: "Remove Quay" }).click();
    await expect.poll(() => page.locator(".cast").count()).toBe(castsCount - 1);
    await page.getByRole("button", { name: "Undo" }).click();
    await expect.poll(() => page.locator(".cast").count()).toBe(castsCount);
  });
});
