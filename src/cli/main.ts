import { mkdir, readFile, writeFile } from "node:fs/promises";
import { dirname } from "node:path";
import { EXIT, type Host } from "./host.ts";
import { run } from "./run.ts";

const host: Host = {
  out: (text) => void process.stdout.write(text),
  err: (text) => void process.stderr.write(text),
  readFile,
  showStatus: process.stderr.isTTY ? (line) => void process.stderr.write(`\r\x1b[K${line}`) : null,
  readStandardInput: async () => {
    const chunks: Buffer[] = [];
    for await (const chunk of process.stdin) chunks.push(chunk as Buffer);
    return Buffer.concat(chunks);
  },
  writeFile: async (path, text) => {
    await mkdir(dirname(path), { recursive: true });
    await writeFile(path, text);
  },
};

// A reader that has seen enough (head, less) closes the pipe; that is no fault.
process.stdout.on("error", (error: NodeJS.ErrnoException) => {
  process.exitCode = error.code === "EPIPE" ? EXIT.done : EXIT.fault;
});

try {
  process.exitCode = await run(host, process.argv.slice(2));
} catch (error) {
  host.err(`layerhead: fault in the program: ${error instanceof Error ? error.message : String(error)}\n`);
  process.exitCode = EXIT.fault;
}
