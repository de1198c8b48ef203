import { mkdtempSync, readFileSync, rmSync, writeFileSync } from "node:fs";
import { tmpdir } from "node:os";
import { join } from "node:path";
import type { Page } from "playwright-core";
import { afterAll, beforeAll, describe, expect, it } from "vitest";
import { accessibilityFaults, type Session, startSession } from "../support/page-session.ts";

let session: Session;
beforeAll(async () => {
  session = await startSession();
});
afterAll(() => session?.close());

const csv = (name: string, text: string) => ({ name, mimeType: "text/csv", buffer: Buffer.from(text) });
const add = (page: Page, ...files: { name: string; mimeType: string; buffer: Buffer }[]) =>
  page.setInputFiles("input[type=file]", files);

const format = (name: string) => ({
  name,
  mimeType: "application/octet-stream",
  buffer: readFileSync(new URL(`../formats/${name}`, import.meta.url)),
});

const GOOD = "depth (m),temperature (degC),salinity\n0.5,17,4\n2,16,9\n4,14,23\n";
/** No name tells which column is depth. */
const UNNAMED = "D,temperature (degC),salinity\n0.5,17,4\n2,16,9\n4,14,23\n";

const panel = (page: Page, fileName: string) => page.getByRole("region", { name: `How ${fileName} was read` });
const bottomDepth = (page: Page) => page.locator(".cast .about").first().textContent();

describe("reading", () => {
  it("asks what is open, computes nothing until it is answered, and remembers the answer", async () => {
    const { page, misdeeds } = await session.open();
    await add(page, csv("a.csv", UNNAMED));
    await panel(page, "a.csv").waitFor();
    expect(await page.locator(".casts .waiting").textContent()).toBe("a.csv needs your answer");
    expect(await page.locator(".cast").count()).toBe(0);
    expect(await accessibilityFaults(page)).toEqual([]);
    await page.getByRole("button", { name: '"D" is depth in ft' }).click();
    await page.locator(".charts .curve").first().waitFor();
    // 4 ft by the definition of the foot, 0.3048 m.
    expect(await bottomDepth(page)).toBe("1.22\u00a0m");
    expect(await page.locator(".waiting").count()).toBe(0);

    await add(page, csv("b.csv", `${UNNAMED}6,13,24\n`));
    await expect.poll(() => page.locator(".cast").count()).toBe(2);
    await page.getByRole("button", { name: /^b/ }).click();
    await page.getByRole("button", { name: "How the file was read" }).click();
    await expect.poll(() => panel(page, "b.csv").textContent()).toContain("answers you gave for an earlier file");
    await page.getByRole("button", { name: "Forget them" }).click();
    await expect.poll(() => page.locator(".casts .waiting").textContent()).toBe("b.csv needs your answer");
    await page.getByRole("button", { name: "Undo" }).click();
    await expect.poll(() => page.locator(".cast").count()).toBe(2);
    expect(misdeeds).toEqual([]);
  });

  it("takes one answer for all files that wait with the same headers, and undoes it in one step", async () => {
    const { page, misdeeds } = await session.open();
    await add(
      page,
      csv("a.csv", UNNAMED),
      csv("b.csv", `${UNNAMED}6,13,24\n`),
      csv("c.csv", UNNAMED.replace("D,", "Z,")),
    );
    await expect.poll(() => page.locator(".casts .waiting").count()).toBe(3);
    await page.getByRole("button", { name: '"D" is depth in m' }).click();
    await expect.poll(() => page.locator(".cast .name").allTextContents()).toEqual(["a", "b"]);
    expect(await page.locator(".casts .waiting").textContent()).toBe("c.csv needs your answer");
    await page.getByRole("button", { name: "Undo" }).click();
    await expect.poll(() => page.locator(".casts .waiting").count()).toBe(3);
    expect(misdeeds).toEqual([]);
  });

  it("reads a file again as soon as a control is changed, and undoes it", async () => {
    const { page, misdeeds } = await session.open();
    await add(page, csv("a.csv", GOOD));
    await page.locator(".charts .curve").first().waitFor();
    await page.getByRole("button", { name: "How the file was read" }).click();
    await page.getByLabel("Unit of depth (m)").selectOption("ft");
    await expect.poll(() => bottomDepth(page)).toBe("1.22\u00a0m");
    await page.getByLabel("depth (m) is", { exact: true }).selectOption("unused");
    await expect.poll(() => page.locator(".cast").count()).toBe(0);
    await page.getByLabel("depth (m) is", { exact: true }).selectOption("depth");
    await expect.poll(() => page.locator(".cast").count()).toBe(1);
    for (let k = 0; k < 3; k++) await page.getByRole("button", { name: "Undo" }).click();
    await expect.poll(() => bottomDepth(page)).toBe("4.00\u00a0m");
    expect(misdeeds).toEqual([]);
  });

  it("reads a file again after a reload of the page", async () => {
    const { page } = await session.open();
    await add(page, csv("a.csv", GOOD));
    await page.locator(".charts .curve").first().waitFor();
    await page.waitForTimeout(300);
    await page.reload();
    await page.locator(".charts .curve").first().waitFor();
    await page.getByRole("button", { name: "How the file was read" }).click();
    await page.getByLabel("Unit of depth (m)").selectOption("ft");
    await expect.poll(() => bottomDepth(page)).toBe("1.22\u00a0m");
  });

  it("says so when the bytes of a file are gone, and takes the file again", async () => {
    const { page } = await session.open();
    await add(page, csv("a.csv", GOOD));
    await page.locator(".charts .curve").first().waitFor();
    await page.waitForTimeout(300);
    await page.evaluate(
      () =>
        new Promise((resolve) => {
          const opening = indexedDB.open("layerhead");
          opening.onsuccess = () => {
            const clearing = opening.result.transaction("files", "readwrite").objectStore("files").clear();
            clearing.onsuccess = () => {
              opening.result.close();
              resolve(null);
            };
          };
        }),
    );
    await page.reload();
    await page.locator(".charts .curve").first().waitFor();
    await page.getByRole("button", { name: "How the file was read" }).click();
    await page.getByLabel("Unit of depth (m)").selectOption("ft");
    await page.getByText("The bytes of a.csv are no longer at hand").waitFor();
    await add(page, csv("a.csv", GOOD));
    await expect.poll(() => page.getByText("no longer at hand").count()).toBe(0);
    expect(await page.locator(".cast").count()).toBe(1);
    await page.getByLabel("Unit of depth (m)").selectOption("ft");
    await expect.poll(() => bottomDepth(page)).toBe("1.22\u00a0m");
  });

  it("offers every sheet of a workbook", async () => {
    const { page, misdeeds } = await session.open();
    await add(page, format("two-sheets.xlsx"));
    await page.locator(".charts .curve").first().waitFor();
    await page.getByRole("button", { name: "How the file was read" }).click();
    const sheet = page.getByLabel("Sheet", { exact: true });
    const all = await sheet.locator("option").allTextContents();
    expect(all.length).toBeGreaterThan(1);
    const castsCount = await page.locator(".cast").count();
    await sheet.selectOption(all.find((name) => name !== "May")!);
    await expect.poll(() => page.locator(".casts .waiting").textContent()).toBe("two-sheets.xlsx gives no casts");
    expect(await page.locator(".reading .issues").textContent()).toContain("error");
    await sheet.selectOption("May");
    await expect.poll(() => page.locator(".cast").count()).toBe(castsCount);
    expect(misdeeds).toEqual([]);
  });

  it("reads netCDF of both kinds with libraries from its own origin", async () => {
    const { page, misdeeds } = await session.open();
    await add(page, format("single-profile-classic.nc"), format("profile-grid-netcdf4.nc"));
    await expect.poll(() => page.locator(".cast").count(), { timeout: 20_000 }).toBe(4);
    await page.locator(".charts .curve").first().waitFor();
    expect(misdeeds).toEqual([]);
  });

  it("stops reading one file and reads the others", async () => {
    const { page, misdeeds } = await session.open();
    const rows = Array.from({ length: 400_000 }, (_, i) => `${i / 1000},15.123,20.456`).join("\n");
    await add(page, csv("large.csv", `depth (m),temperature (degC),salinity\n${rows}\n`), csv("small.csv", GOOD));
    await page.getByRole("button", { name: "Stop reading large.csv" }).click();
    await expect.poll(() => page.locator(".cast .name").allTextContents()).toEqual(["small"]);
    expect(await page.locator(".job").count()).toBe(0);
    expect(misdeeds).toEqual([]);
  });

  it("joins a list of stations, shows how each was matched, and takes corrections", async () => {
    const { page, misdeeds } = await session.open();
    const rows = ["Pier", "Quay"].flatMap((station) => [1, 2, 4].map((z) => `${station},${z},${16 - z},${z * 5}`));
    await add(page, csv("casts.csv", `station,depth (m),temperature (degC),salinity\n${rows.join("\n")}\n`));
    await page.locator(".charts .curve").first().waitFor();
    await add(
      page,
      csv("list.csv", "Station,Latitude,Longitude,Distance (km),Depth (m)\nPIER,51,1,3.5,9\nDam,51.5,1,8,6\n"),
    );
    const stations = page.getByRole("region", { name: "Stations of the list" });
    await stations.waitFor();
    expect(await stations.locator("tbody tr").allTextContents()).toEqual([
      expect.stringMatching(/^Pier.*≈ alike/),
      expect.stringMatching(/^Quay.*\? no match/),
    ]);
    const about = () => page.locator(".cast .about").allTextContents();
    await expect.poll(about).toEqual(["3.5\u00a0km · 9.00\u00a0m", "4.00\u00a0m"]);
    expect(await page.locator(".troubles").count()).toBe(0);
    await page.getByLabel("Quay in the list").selectOption("Dam");
    await expect.poll(about).toEqual(["3.5\u00a0km · 9.00\u00a0m", "8.0\u00a0km · 6.00\u00a0m"]);
    await page.getByRole("button", { name: "Undo" }).click();
    await expect.poll(about).toEqual(["3.5\u00a0km · 9.00\u00a0m", "4.00\u00a0m"]);
    await page.getByRole("button", { name: "Do without the list" }).click();
    await expect.poll(about).toEqual(["4.00\u00a0m", "4.00\u00a0m"]);
    expect(misdeeds).toEqual([]);
  });

  it("keeps its main thread free while a large file is read", async () => {
    const { page } = await session.open();
    const rows = Array.from({ length: 150_000 }, (_, i) => `${i / 1000},${(15 + Math.sin(i / 900)).toFixed(3)},20.4`);
    await page.evaluate(() => {
      const tasks: number[] = [];
      new PerformanceObserver((list) => {
        for (const entry of list.getEntries()) tasks.push(entry.duration);
      }).observe({ type: "longtask" });
      Object.assign(globalThis, { tasks });
    });
    const folder = mkdtempSync(join(tmpdir(), "layerhead-large-"));
    const path = join(folder, "large.csv");
    writeFileSync(path, `depth (m),temperature (degC),salinity\n${rows.join("\n")}\n`);
    await page.setInputFiles("input[type=file]", path);
    await page.locator(".cast").waitFor({ timeout: 60_000 });
    // Reading itself; drawing the result is another matter. Twice the aim, for a machine that does other things as well.
    const longest = await page.evaluate(() => Math.max(0, ...(globalThis as unknown as { tasks: number[] }).tasks));
    expect(longest).toBeLessThan(100);
    rmSync(folder, { recursive: true });
  });
});
