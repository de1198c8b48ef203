import { chmodSync, readFileSync } from "node:fs";
import { defineConfig } from "vitest/config";

const { version } = JSON.parse(readFileSync(new URL("package.json", import.meta.url), "utf8")) as { version: string };

/** `vite build` makes the page; `vite build --mode node` makes the library and the command. */
export default defineConfig(({ mode }) => ({
  base: "./",
  define: { __LAYERHEAD_VERSION__: JSON.stringify(version) },
  oxc: { jsx: { runtime: "automatic", importSource: "preact" } },
  worker: { format: "es" },
  build: mode === "node" ? nodeBuild : { target: "es2022", outDir: "dist/page" },
  test: {
    projects: [
      {
        extends: true,
        test: {
          name: "node",
          include: ["tests/{unit,golden,property,arch,charts,cli,corpus,formats,fuzz}/**/*.test.ts"],
          testTimeout: 60_000,
        },
      },
      {
        extends: true,
        test: {
          name: "browser",
          include: ["tests/e2e/**/*.test.ts"],
          testTimeout: 120_000,
          hookTimeout: 120_000,
          fileParallelism: false,
        },
      },
    ],
  },
}));

const nodeBuild = {
  ssr: true as const,
  target: "node20",
  outDir: "dist",
  emptyOutDir: false,
  minify: false as const,
  rolldownOptions: {
    input: { "lib/index": "src/index.ts", "cli/main": "src/cli/main.ts" },
    output: {
      format: "es" as const,
      entryFileNames: "[name].js",
      chunkFileNames: "chunks/[name]-[hash].js",
      banner: (chunk: { name: string }) => (chunk.name === "cli/main" ? "#!/usr/bin/env node" : ""),
    },
    plugins: [{ name: "command-may-be-run", writeBundle: () => chmodSync("dist/cli/main.js", 0o755) }],
  },
};
