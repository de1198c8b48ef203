import { readFileSync } from "node:fs";
import { afterAll, beforeAll, describe, expect, it } from "vitest";
import { clickAtDepth, loadSample, type Session, startSession } from "../support/page-session.ts";

let session: Session;
beforeAll(async () => {
  session = await startSession();
});
afterAll(() => session?.close());

const csv = (name: string, text: string) => ({ name, mimeType: "text/csv", buffer: Buffer.from(text) });
const GOOD = "depth (m),temperature (degC),salinity\n0.5,17,4\n2,16,9\n4,14,23\n";

describe("files", () => {
  it("reads a chosen file and shows how it was read", async () => {
    const { page, misdeeds } = await session.open();
    await page.setInputFiles("input[type=file]", [csv("pier.csv", GOOD)]);
    await page.locator(".charts .curve").first().waitFor();
    expect(await page.locator(".cast .name").textContent()).toBe("pier");
    await page.getByText("How the file was read").click();
    await page.getByRole("region", { name: "How pier.csv was read" }).waitFor();
    expect(await page.getByLabel("temperature (degC) is", { exact: true }).inputValue()).toBe("temperature");
    expect(misdeeds).toEqual([]);
  });

  it("lists what is wrong with a file and reads the others", async () => {
    const { page, misdeeds } = await session.open();
    await page.setInputFiles("input[type=file]", [
      csv("photo.csv", "\u0089PNG\u0000\u0000\u0000"),
      csv("pier.csv", GOOD),
    ]);
    await page.locator(".charts .curve").first().waitFor();
    const troubles = page.locator(".troubles");
    expect(await troubles.locator("summary").textContent()).toBe("photo.csv was not read");
    expect(await troubles.locator("li.error").count()).toBe(1);
    expect(await page.locator(".cast").count()).toBe(1);
    await troubles.getByRole("button", { name: "Dismiss" }).click();
    await expect.poll(() => troubles.count()).toBe(0);
    expect(misdeeds).toEqual([]);
  });

  it("takes files dropped on the page", async () => {
    const { page } = await session.open();
    const data = await page.evaluateHandle((text) => {
      const transfer = new DataTransfer();
      transfer.items.add(new File([text], "dropped.csv"));
      return transfer;
    }, GOOD);
    await page.dispatchEvent("main", "dragover", { dataTransfer: data });
    await page.dispatchEvent("main", "drop", { dataTransfer: data });
    await expect.poll(() => page.locator(".cast .name").allTextContents()).toEqual(["dropped"]);
  });

  it("shows text from a file as text, wherever it is shown", async () => {
    const { page, misdeeds } = await session.open();
    const name = "<img src=x onerror=alert(1)>";
    const rows = [0.5, 2, 4].map((depth) => `${name},${depth},${15 - depth},${10 + depth}`).join("\n");
    await page.setInputFiles("input[type=file]", [
      csv(`${name}.csv`, `station,depth (m),temperature (degC),${name}\n${rows}\n`),
      csv("list.csv", `station,latitude,longitude\n${name},51,1\n`),
    ]);
    await page.locator(".charts .curve").first().waitFor();
    expect(await page.locator(".cast .name").textContent()).toBe(name);
    await page.getByRole("button", { name: "How the file was read" }).click();
    expect(await page.locator(".as-found").textContent()).toContain(name);
    expect(await page.locator(".stations").textContent()).toContain(name);
    expect(await page.locator("img").count()).toBe(0);
    expect(misdeeds).toEqual([]);
  });

  it("exports no cell that a spreadsheet would compute", async () => {
    const { page } = await session.open();
    const rows = [0.5, 2, 4].map((depth) => `=cmd(),${depth},${15 - depth}`).join("\n");
    await page.setInputFiles("input[type=file]", [csv("a.csv", `station,depth (m),temperature (degC)\n${rows}\n`)]);
    await page.locator(".charts .curve").first().waitFor();
    const waiting = page.waitForEvent("download");
    await page.getByRole("button", { name: "Export" }).click();
    await page.getByRole("button", { name: "Profile of this cast, CSV" }).click();
    const text = readFileSync(await (await waiting).path(), "utf8");
    expect(text).toContain("=cmd()");
    expect(text).not.toMatch(/(^|,)"?=/m);
  });

  it("exports a profile as CSV with its metadata beside it", async () => {
    const { page } = await session.open();
    await loadSample(page);
    await clickAtDepth(page, 0.5);
    const downloads: { readonly name: string; readonly text: Promise<string> }[] = [];
    page.on("download", (download) => {
      const text = download.path().then((path) => readFileSync(path, "utf8"));
      downloads.push({ name: download.suggestedFilename(), text });
    });
    await page.getByRole("button", { name: "Export" }).click();
    await page.getByRole("button", { name: "Profile of this cast, CSV" }).click();
    await expect.poll(() => downloads.length).toBe(2);
    expect(downloads.map(({ name }) => name)).toEqual(["mouth-profile.csv", "mouth-profile.csv-metadata.json"]);
    const header = (await downloads[0]!.text).split("\n")[0]!;
    expect(header).toMatch(/^cast,depth_m,elevation_m,sea_pressure_dbar,gauge_pressure_kPa,absolute_pressure_kPa,/);
    expect(header).toMatch(/,flag,origin$/);
    const metadata = JSON.parse(await downloads[1]!.text) as {
      url: string;
      notes: { sources: { sha256: string }[] }[];
    };
    expect(metadata.url).toBe("mouth-profile.csv");
    expect(metadata.notes[0]!.sources[0]!.sha256).toMatch(/^[0-9a-f]{64}$/);
    await page.getByRole("button", { name: "Export" }).click();
    await page.getByRole("button", { name: "Everything, JSON" }).click();
    await expect.poll(() => downloads.length).toBe(3);
    expect(Object.keys(JSON.parse(await downloads[2]!.text))).toEqual(["version", "basis", "preparation", "casts"]);
  });
});
