import { spawnSync } from "node:child_process";
import { mkdtempSync, rmSync } from "node:fs";
import { tmpdir } from "node:os";
import { join } from "node:path";
import { fileURLToPath } from "node:url";
import { build } from "vite";
import { describe, expect, test } from "vitest";
import { corpusIn, fuzzText, inputOf } from "./text-fuzz.ts";

const files = fileURLToPath(new URL("../corpus/files/", import.meta.url));
const corpus = corpusIn(files);

describe("damaged text files", () => {
  test("two thousand of them: no throw, no silence, none over two seconds, no broken cast", () => {
    expect(fuzzText(corpus, 1, 2000)).toEqual([]);
  });

  test("a seed makes the same bytes again", () => {
    expect(inputOf(7, corpus)).toEqual(inputOf(7, corpus));
    expect(inputOf(7, corpus)).not.toEqual(inputOf(8, corpus));
  });

  test("the long run goes through its seeds in watched threads", async () => {
    const outDir = mkdtempSync(join(tmpdir(), "text-fuzz-"));
    try {
      const ssr = fileURLToPath(new URL("./run-fuzz.ts", import.meta.url));
      await build({
        configFile: false,
        logLevel: "silent",
        ssr: { noExternal: true },
        build: { ssr, outDir, target: "node20" },
      });
      const run = spawnSync(process.execPath, [join(outDir, "run-fuzz.js"), "text", "1", "50", files], {
        encoding: "utf8",
      });
      expect(run.stderr).toBe("");
      expect(run.stdout).toMatch(/^50 inputs, 0 failures, \d+ a second\n$/);
      expect(run.status).toBe(0);
    } finally {
      rmSync(outDir, { recursive: true });
    }
  });
});
