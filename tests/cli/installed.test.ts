import { execFileSync } from "node:child_process";
import { fileURLToPath } from "node:url";
import { expect, it } from "vitest";

it("npx layerhead runs what npm ci built", () => {
  const folder = fileURLToPath(new URL("../../", import.meta.url));
  const said = execFileSync("npx", ["layerhead", "--help"], { cwd: folder, encoding: "utf8", shell: true });
  expect(said).toMatch(/^layerhead: pressure in layered water/);
});
