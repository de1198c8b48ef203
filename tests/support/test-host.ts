import type { Host } from "../../src/cli/host.ts";

/** A machine for the command that keeps what is written, with the given files on it. */
export function testHost(files: Readonly<Record<string, string | Uint8Array>> = {}, standardInput = "") {
  const written = new Map<string, string>();
  const said = { out: "", err: "", shown: [] as string[] };
  const bytes = (content: string | Uint8Array) =>
    typeof content === "string" ? new TextEncoder().encode(content) : content;
  const host: Host = {
    out: (text) => {
      said.out += text;
    },
    err: (text) => {
      said.err += text;
    },
    readFile: async (path) => {
      const content = files[path];
      if (content === undefined) throw Object.assign(new Error("not found"), { code: "ENOENT" });
      if (content === FOLDER) throw Object.assign(new Error("folder"), { code: "EISDIR" });
      return bytes(content);
    },
    readStandardInput: async () => bytes(standardInput),
    showStatus: (line) => {
      said.shown.push(line);
    },
    writeFile: async (path, text) => {
      written.set(path.split("\\").join("/"), text);
    },
  };
  return { host, said, written };
}

/** Stands for a folder among the files of a test host. */
export const FOLDER = new Uint8Array();
