import { afterAll, beforeAll, describe, expect, it } from "vitest";
import { clickAtDepth, loadSample, type Session, startSession } from "../support/page-session.ts";

let session: Session;
beforeAll(async () => {
  session = await startSession();
});
afterAll(() => session?.close());

const firstRow = ".level-table tbody tr:first-child";

describe("basis, units and history", () => {
  it("recomputes at once when the basis changes, and undoes it", async () => {
    const { page, misdeeds } = await session.open();
    await loadSample(page);
    await clickAtDepth(page, 0.5);
    const before = await page.locator(firstRow).textContent();
    await page.getByLabel("Water model").selectOption("constant");
    await expect.poll(() => page.locator(firstRow).textContent()).toContain("1000.00");
    await page.getByRole("button", { name: "Undo" }).click();
    await expect.poll(() => page.locator(firstRow).textContent()).toBe(before);
    await page.getByRole("button", { name: "Redo" }).click();
    await expect.poll(() => page.locator(firstRow).textContent()).toContain("1000.00");
    expect(misdeeds).toEqual([]);
  });

  it("refuses what is out of range with the range, and keeps the last good value", async () => {
    const { page } = await session.open();
    await loadSample(page);
    const entry = page.getByLabel("Air pressure");
    await entry.fill("900");
    await entry.press("Enter");
    await expect
      .poll(() => page.getByRole("alert").textContent())
      .toBe("Air pressure must be a number from 30 to 120 kPa; 101.325 stays");
    await entry.press("Escape");
    expect(await entry.inputValue()).toBe("101.325");
    expect(await page.getByRole("alert").count()).toBe(0);
  });

  it("keeps an entry when the next one is filled at once", async () => {
    const { page } = await session.open();
    await loadSample(page);
    for (const [label, value] of [
      ["Bed depth", "19"],
      ["Surface elevation", "1.5"],
      ["Air pressure", "99"],
    ] as const) {
      await page.getByLabel(label).fill(value);
      await page.keyboard.press("Enter");
    }
    await page.getByLabel("Latitude").focus();
    expect(await page.getByLabel("Bed depth").inputValue()).toBe("19");
    expect(await page.getByLabel("Surface elevation").inputValue()).toBe("1.5");
    await expect.poll(() => page.getByText("Bed gap").textContent()).toMatch(/^Bed gap 0\.\d\d/);
  });

  it("gives elevations once a datum is given", async () => {
    const { page } = await session.open();
    await loadSample(page);
    await clickAtDepth(page, 0.5);
    const entry = page.getByLabel("Surface elevation");
    await entry.fill("1.42");
    await entry.press("Enter");
    await expect.poll(() => page.locator(".level-table thead").textContent()).toContain("Elevation m");
    const depth = Number(await page.getByLabel("Depth of Level 1").inputValue());
    expect(await page.locator(firstRow).textContent()).toContain(`−${(depth - 1.42).toFixed(2)}`);
  });

  it("shows US units everywhere and the same water", async () => {
    const { page } = await session.open();
    await loadSample(page);
    const entry = page.getByLabel("Add a level at depth");
    await entry.fill("10");
    await entry.press("Enter");
    await page.locator(firstRow).waitFor();
    await page.getByText("US", { exact: true }).click();
    // 10 m by the definition of the foot, 0.3048 m.
    await expect.poll(() => page.getByLabel("Depth of Level 1").inputValue()).toBe("32.81");
    const head = await page.locator(".level-table thead").textContent();
    for (const unit of ["Depth ft", "Density lb/ft³", "Gauge psi", "Departure psi"]) expect(head).toContain(unit);
    expect(await page.locator("[data-panel=density] .unit").textContent()).toBe("lb/ft³");
    // One standard atmosphere, 101.325 kPa.
    expect(await page.getByLabel("Air pressure").inputValue()).toBe("14.696");
  });

  it("has the work back after a reload, with its undo", async () => {
    const { page, misdeeds } = await session.open();
    await loadSample(page);
    await clickAtDepth(page, 0.5);
    await page.locator(firstRow).waitFor();
    await page.getByText("US", { exact: true }).click();
    const before = await page.locator(firstRow).textContent();
    await page.reload();
    await page.locator(firstRow).waitFor();
    expect(await page.locator(firstRow).textContent()).toBe(before);
    await page.getByRole("button", { name: "Undo" }).click();
    await expect.poll(() => page.locator(firstRow).count()).toBe(0);
    expect(misdeeds).toEqual([]);
  });
});
