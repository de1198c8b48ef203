/* `npm test`: checks the sources, then runs every test, in Node and in a real browser, and counts them in one line. */
import { spawnSync } from "node:child_process";
import { mkdtempSync, readFileSync, rmSync } from "node:fs";
import { tmpdir } from "node:os";
import { join } from "node:path";
import { findChromium } from "./support/find-chromium.mjs";

const run = (command, args, env = {}) =>
  spawnSync(command, args, { stdio: "inherit", shell: process.platform === "win32", env: { ...process.env, ...env } })
    .status === 0;

/** On Debian as root (a CI machine) the browser can be had without asking. */
function installChromium() {
  if (process.platform !== "linux" || process.getuid?.() !== 0) return false;
  console.log("No browser found; installing Debian's Chromium.");
  return (
    run("apt-get", ["update", "-qq"]) &&
    run("apt-get", ["install", "-y", "-qq", "chromium"], { DEBIAN_FRONTEND: "noninteractive" })
  );
}

let browser = findChromium();
if (browser.path === null && installChromium()) browser = findChromium();

const checked = run("npm", ["run", "--silent", "check"]);

const folder = mkdtempSync(join(tmpdir(), "layerhead-test-"));
const report = join(folder, "report.json");
const projects = browser.path === null ? ["--project", "node"] : [];
const green = run(
  "npx",
  ["vitest", "run", ...projects, "--reporter=dot", "--reporter=json", `--outputFile.json=${report}`],
  {
    CHROME_PATH: browser.path ?? "",
  },
);

let passed = 0;
let failed = 0;
try {
  const { numPassedTests, numFailedTests, testResults } = JSON.parse(readFileSync(report, "utf8"));
  // A file that fails before its first test counts as one.
  const broken = testResults.filter(
    ({ status, assertionResults }) => status === "failed" && assertionResults.length === 0,
  );
  passed = numPassedTests;
  failed = numFailedTests + broken.length;
} catch {
  console.log("The tests did not run to their end.");
  failed = 1;
}
rmSync(folder, { recursive: true });
if (!green && failed === 0) failed = 1;

if (!checked) {
  console.log("Types, lint or dead code: see above (npm run check).");
  failed++;
}
if (browser.path === null) {
  console.log(`The browser tests could not run: ${browser.reason}.`);
  failed++;
}
console.log(`${passed} passed, ${failed} failed`);
process.exitCode = failed === 0 ? 0 : 1;
