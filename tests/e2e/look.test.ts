import { afterAll, beforeAll, describe, expect, it } from "vitest";
import { accessibilityFaults, clickAtDepth, loadSample, type Session, startSession } from "../support/page-session.ts";

let session: Session;
beforeAll(async () => {
  session = await startSession();
});
afterAll(() => session?.close());

const isInside = (inner: { y: number; height: number }, height: number): boolean => inner.y + inner.height <= height;

describe("the page in other shapes", () => {
  for (const colorScheme of ["light", "dark"] as const)
    it(`has no accessibility fault in ${colorScheme}`, async () => {
      const { page } = await session.open({ colorScheme });
      expect(await accessibilityFaults(page)).toEqual([]);
      await loadSample(page);
      await clickAtDepth(page, 0.3);
      await clickAtDepth(page, 0.99);
      await page.getByText("How the file was read").click();
      await page.locator(".as-found").waitFor();
      await page.getByText("in numbers").click();
      await page.getByLabel("Show Quay in the charts").uncheck();
      await page.getByLabel("Latitude", { exact: true }).fill("95");
      await page.keyboard.press("Enter");
      await page.setInputFiles("input[type=file]", [
        { name: "b.csv", mimeType: "text/csv", buffer: Buffer.from("a,b\n1,2\n") },
        {
          name: "list.csv",
          mimeType: "text/csv",
          buffer: Buffer.from("station,latitude,longitude\nFERRY,51,1\nDam,52,1\n"),
        },
      ]);
      await page.locator(".troubles").waitFor();
      await page.locator(".stations").waitFor();
      await page.keyboard.press("Escape");
      await page.getByRole("button", { name: "Flag samples" }).click();
      await page.getByRole("slider").focus();
      await page.keyboard.press("Shift+PageDown");
      await page.getByRole("button", { name: "Export" }).click();
      expect(await accessibilityFaults(page)).toEqual([]);
    });

  it("becomes a strip of casts, charts and a drawer on a tablet in portrait", async () => {
    const { page, misdeeds } = await session.open({ viewport: { width: 820, height: 1180 } });
    await loadSample(page);
    await clickAtDepth(page, 0.5);
    await page.locator(".level-table tbody tr").waitFor();
    expect(isInside((await page.locator(".casts").boundingBox())!, 140)).toBe(true);
    expect(isInside((await page.locator(".level-table").boundingBox())!, 1180)).toBe(true);
    expect(await page.evaluate(() => document.documentElement.scrollWidth)).toBe(820);
    expect(await page.locator("#basis").isVisible()).toBe(false);
    await page.getByRole("button", { name: "Basis" }).click();
    expect(await page.locator("#basis").isVisible()).toBe(true);
    expect(await accessibilityFaults(page)).toEqual([]);
    expect(misdeeds).toEqual([]);
  });

  it("leaves out the buoyancy panel where there is no room for five", async () => {
    const { page } = await session.open({ viewport: { width: 600, height: 900 } });
    await loadSample(page);
    const panels = await page
      .locator(".panel")
      .evaluateAll((all) => all.map((panel) => (panel as SVGElement).dataset.panel));
    expect(panels).toEqual(["temperature", "salinity", "density", "departure"]);
  });

  it("is dark where the user's system is", async () => {
    const { page } = await session.open({ colorScheme: "dark" });
    expect(await page.evaluate(() => getComputedStyle(document.body).backgroundColor)).toBe("rgb(18, 23, 26)");
  });

  it("stays usable with hundreds of casts", async () => {
    const { page } = await session.open();
    const rows = Array.from({ length: 300 * 12 }, (_, i) => {
      const cast = Math.floor(i / 12);
      const depth = i % 12;
      return `Cast ${cast},${depth},${(20 - depth * 0.8 + Math.sin(cast)).toFixed(2)}`;
    });
    const buffer = Buffer.from(`cast,depth (m),temperature (degC)\n${rows.join("\n")}\n`);
    await page.setInputFiles("input[type=file]", [{ name: "many.csv", mimeType: "text/csv", buffer }]);
    await expect
      .poll(() => page.locator("[data-panel=temperature] .curve.solid").count(), { timeout: 20_000 })
      .toBe(300);
    await clickAtDepth(page, 0.5);
    await expect.poll(() => page.locator(".level-table tbody tr").count()).toBe(1);
    expect(await page.locator(".plumb .dot.in-hand").count()).toBe(5);
  });
});
