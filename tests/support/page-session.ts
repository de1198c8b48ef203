/* A browser on the built page, with everything it should not do written down. */
import axe from "axe-core";
import { type Browser, type BrowserContextOptions, chromium, type Page } from "playwright-core";
import { findChromium } from "./find-chromium.mjs";
import { type ServedPage, servePage } from "./serve-page.ts";

const ARGS = [
  "--no-sandbox",
  "--disable-gpu",
  "--disable-quic",
  "--no-first-run",
  "--disable-background-networking",
  "--disable-component-update",
  "--disable-sync",
];

interface OpenPage {
  readonly page: Page;
  /** Console output, uncaught errors and requests that leave the page's origin. */
  readonly misdeeds: readonly string[];
}

export interface Session {
  readonly url: string;
  readonly open: (options?: BrowserContextOptions) => Promise<OpenPage>;
  readonly close: () => Promise<void>;
}

export async function startSession(): Promise<Session> {
  const found = findChromium();
  if (found.path === null) throw new Error(found.reason);
  const served: ServedPage = await servePage();
  const browser: Browser = await chromium.launch({ executablePath: found.path, args: ARGS });
  return {
    url: served.url,
    open: async (options = {}) => {
      const context = await browser.newContext({ viewport: { width: 1440, height: 900 }, ...options });
      const page = await context.newPage();
      const misdeeds: string[] = [];
      page.on("console", (message) => misdeeds.push(`console ${message.type()}: ${message.text()}`));
      page.on("pageerror", (error) => misdeeds.push(`uncaught: ${error.message}`));
      page.on("request", (request) => {
        const { origin, protocol } = new URL(request.url());
        if (origin !== new URL(served.url).origin && protocol !== "blob:" && protocol !== "data:")
          misdeeds.push(`request to ${origin}`);
      });
      await page.goto(served.url);
      await page.getByRole("heading", { name: "Layerhead" }).waitFor();
      return { page, misdeeds };
    },
    close: async () => {
      await browser.close();
      await served.close();
    },
  };
}

export type SampleButton = "Load the sample survey" | "Load the sample reservoir";

/** Loads a sample and waits until its curves are drawn. */
export async function loadSample(page: Page, button: SampleButton = "Load the sample survey"): Promise<void> {
  await page.getByRole("button", { name: button }).click();
  await page.locator(".charts .curve").first().waitFor();
}

/** Clicks in the charts at a share of the height of the depth axis. */
export async function clickAtDepth(page: Page, share: number): Promise<void> {
  const box = (await page.locator(".charts").boundingBox())!;
  await page.mouse.click(box.x + box.width / 2, box.y + box.height * share);
}

/** What axe finds wrong, one line a rule. */
export async function accessibilityFaults(page: Page): Promise<readonly string[]> {
  await page.evaluate(axe.source);
  const results = await page.evaluate(() => (globalThis as unknown as { axe: typeof axe }).axe.run());
  return results.violations.map(
    ({ id, help, nodes }) => `${id}: ${help} (${nodes.map((node) => node.html.slice(0, 120)).join(" | ")})`,
  );
}
