/* Where a Chromium-like browser stands on this machine. Nothing is downloaded. */
import { accessSync, constants } from "node:fs";
import { delimiter, join } from "node:path";

const NAMES = ["chromium", "chromium-browser", "google-chrome", "google-chrome-stable", "microsoft-edge"];

const PLACES = [
  "/snap/bin/chromium",
  "/opt/google/chrome/chrome",
  "/opt/microsoft/msedge/msedge",
  "/Applications/Chromium.app/Contents/MacOS/Chromium",
  "/Applications/Google Chrome.app/Contents/MacOS/Google Chrome",
  "/Applications/Microsoft Edge.app/Contents/MacOS/Microsoft Edge",
  "C:\\Program Files\\Google\\Chrome\\Application\\chrome.exe",
  "C:\\Program Files (x86)\\Google\\Chrome\\Application\\chrome.exe",
  "C:\\Program Files (x86)\\Microsoft\\Edge\\Application\\msedge.exe",
];

const canRun = (path) => {
  try {
    accessSync(path, constants.X_OK);
    return true;
  } catch {
    return false;
  }
};

const installCommand = {
  linux: "sudo apt-get install chromium",
  darwin: "brew install --cask chromium",
  win32: "winget install Google.Chrome",
}[process.platform];

/**
 * CHROME_PATH first, then the usual names on PATH, then the usual places.
 * @param {Readonly<Record<string, string | undefined>>} env
 * @returns {{ readonly path: string } | { readonly path: null, readonly reason: string }}
 */
export function findChromium(env = process.env) {
  if (env.CHROME_PATH) {
    return canRun(env.CHROME_PATH)
      ? { path: env.CHROME_PATH }
      : { path: null, reason: `CHROME_PATH names ${env.CHROME_PATH}, which cannot be run; correct it or unset it` };
  }
  const ending = process.platform === "win32" ? ".exe" : "";
  const onPath = (env.PATH ?? "")
    .split(delimiter)
    .flatMap((folder) => NAMES.map((name) => join(folder, name + ending)));
  const path = [...onPath, ...PLACES].find(canRun);
  return path
    ? { path }
    : {
        path: null,
        reason: `no Chromium found; install one (${installCommand ?? "see chromium.org"}) or set CHROME_PATH`,
      };
}
