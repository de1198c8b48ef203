import type { Page } from "playwright-core";
import { afterAll, beforeAll, describe, expect, it } from "vitest";
import { type Session, startSession } from "../support/page-session.ts";

let session: Session;
beforeAll(async () => {
  session = await startSession();
});
afterAll(() => session?.close());

/** Forty samples, every quarter of a metre, through smooth layers. */
const ROWS = Array.from({ length: 40 }, (_, i) => {
  const depth = 0.5 + i * 0.25;
  const share = 1 / (1 + Math.exp(5 - depth));
  return `${depth},${(18 - 6 * share).toFixed(3)},${(4 + 20 * share).toFixed(3)}`;
});

async function openCast(rows: readonly string[] = ROWS): Promise<{ page: Page; misdeeds: readonly string[] }> {
  const { page, misdeeds } = await session.open();
  const buffer = Buffer.from(`depth (m),temperature (degC),salinity\n${rows.join("\n")}\n`);
  await page.setInputFiles("input[type=file]", [{ name: "a.csv", mimeType: "text/csv", buffer }]);
  await page.locator(".charts .curve").first().waitFor();
  return { page, misdeeds };
}

const samplesUsed = (page: Page) => page.locator(".row", { hasText: "Samples used" }).locator("dd").textContent();

async function dragOver(page: Page, fromShare: number, toShare: number): Promise<void> {
  const box = (await page.locator(".charts").boundingBox())!;
  const x = box.x + box.width / 2;
  await page.mouse.move(x, box.y + box.height * fromShare);
  await page.mouse.down();
  await page.mouse.move(x, box.y + box.height * toShare, { steps: 4 });
  await page.mouse.up();
}

describe("flags", () => {
  it("takes out the samples that are dragged over, marks and lists them, and undoes it", async () => {
    const { page, misdeeds } = await openCast();
    expect(await samplesUsed(page)).toBe("40");
    await page.keyboard.press("f");
    await dragOver(page, 0.4, 0.6);
    const said = (await page.locator(".flag-bar [role=status]").textContent())!;
    const count = Number(/^(\d+) samples from/.exec(said)![1]);
    expect(count).toBeGreaterThan(3);
    await page.getByRole("button", { name: "Do not use" }).click();
    await expect.poll(() => samplesUsed(page)).toBe(String(40 - count));
    expect(await page.locator(".cast .about", { hasText: "left out" }).textContent()).toBe(`${count} left out`);
    // A cross a sample in every panel, but for those on the same pixel.
    const crosses = (await page.locator(".marks .left-out").getAttribute("d"))!.match(/M/g)!.length;
    expect(crosses).toBe(5 * count);
    await page.getByText(`0 flagged, ${count} left out`).click();
    expect(await page.locator("details[open] .issues").textContent()).toMatch(/left out lines \d+ to \d+ .*by hand/);
    expect(await page.locator(".level-table tbody tr").count()).toBe(0);
    await page.getByRole("button", { name: "Undo my flags" }).click();
    await expect.poll(() => samplesUsed(page)).toBe("40");
    await page.getByRole("button", { name: "Undo", exact: true }).click();
    await expect.poll(() => samplesUsed(page)).toBe(String(40 - count));
    expect(misdeeds).toEqual([]);
  });

  it("selects and flags by keyboard alone, and says why at the plumb line", async () => {
    const { page } = await openCast();
    await page.getByRole("slider").focus();
    await page.keyboard.press("PageDown");
    await page.keyboard.press("Shift+PageDown");
    await page.keyboard.press("Shift+PageDown");
    await page.locator(".flag-bar [role=status]").waitFor();
    await page.getByRole("button", { name: "Do not use" }).focus();
    await page.keyboard.press("Enter");
    await expect.poll(() => samplesUsed(page)).not.toBe("40");
    await page.getByRole("slider").focus();
    await page.keyboard.press("Home");
    for (let k = 0; k < 10; k++) await page.keyboard.press("ArrowDown");
    await expect.poll(() => page.locator(".readout .flagged").textContent()).toMatch(/× left out: .*by hand/);
  });

  it("shows a spike as what it is, and takes it back in at the user's word", async () => {
    const spiked = ROWS.map((row, i) => (i === 20 ? row.replace(/,[^,]*,/, ",44.000,") : row));
    const { page } = await openCast(spiked);
    await expect.poll(() => page.locator(".cast .about.warn").first().textContent()).toMatch(/^1 (flagged|left out)/);
    expect(await page.locator(".marks path").count()).toBe(1);
    await page.keyboard.press("f");
    await dragOver(page, 0.1, 0.95);
    await page.getByRole("button", { name: "Use", exact: true }).click();
    await expect.poll(() => samplesUsed(page)).toBe("40");
  });

  it("prepares the samples anew when the preparation changes", async () => {
    const { page, misdeeds } = await openCast();
    await page.getByLabel("Bins").selectOption("1");
    await expect.poll(() => samplesUsed(page)).toMatch(/^1[01]$/);
    await page.getByLabel("Way").selectOption("all");
    await page.getByLabel("Water kind").selectOption("estuary");
    await page.getByRole("button", { name: "Undo" }).click();
    await page.getByLabel("Bins").selectOption("none");
    await expect.poll(() => samplesUsed(page)).toBe("40");
    expect(misdeeds).toEqual([]);
  });
});
