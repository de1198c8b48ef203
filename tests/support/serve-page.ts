/* The built page on a free port, as users get it. */
import { mkdtempSync, rmSync } from "node:fs";
import { tmpdir } from "node:os";
import { join } from "node:path";
import { fileURLToPath } from "node:url";
import { build, preview } from "vite";

const root = fileURLToPath(new URL("../..", import.meta.url));

export interface ServedPage {
  readonly url: string;
  readonly close: () => Promise<void>;
}

/** Builds the page into a folder of its own and serves it until `close` is called. */
export async function servePage(): Promise<ServedPage> {
  const outDir = mkdtempSync(join(tmpdir(), "layerhead-page-"));
  await build({ root, mode: "production", logLevel: "error", build: { outDir, emptyOutDir: true } });
  const server = await preview({ root, logLevel: "error", build: { outDir }, preview: { port: 0, host: "127.0.0.1" } });
  return {
    url: server.resolvedUrls!.local[0]!,
    close: async () => {
      await server.close();
      rmSync(outDir, { recursive: true, force: true });
    },
  };
}
