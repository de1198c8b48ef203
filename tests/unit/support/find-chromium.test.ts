import { chmodSync, mkdirSync, mkdtempSync, rmSync, writeFileSync } from "node:fs";
import { tmpdir } from "node:os";
import { delimiter, join } from "node:path";
import { afterAll, beforeAll, describe, expect, it } from "vitest";
import { findChromium } from "../../support/find-chromium.mjs";

let folder: string;
let program: string;

beforeAll(() => {
  folder = mkdtempSync(join(tmpdir(), "layerhead-find-"));
  mkdirSync(join(folder, "bin"));
  program = join(folder, "bin", process.platform === "win32" ? "chromium.exe" : "chromium");
  writeFileSync(program, "");
  chmodSync(program, 0o755);
});
afterAll(() => rmSync(folder, { recursive: true, force: true }));

describe("findChromium", () => {
  it("takes the browser that CHROME_PATH names before any other", () => {
    expect(findChromium({ CHROME_PATH: program, PATH: "" })).toEqual({ path: program });
  });

  it("says in one line when CHROME_PATH names nothing that runs", () => {
    const found = findChromium({ CHROME_PATH: join(folder, "gone"), PATH: join(folder, "bin") });
    expect(found.path).toBeNull();
    expect(found).toMatchObject({ reason: expect.stringMatching(/^CHROME_PATH names .*gone, which cannot be run/) });
  });

  it("looks along PATH", () => {
    const path = [join(folder, "empty"), join(folder, "bin")].join(delimiter);
    expect(findChromium({ PATH: path })).toEqual({ path: program });
  });
});
