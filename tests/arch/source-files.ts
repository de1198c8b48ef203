import { readdirSync, readFileSync } from "node:fs";
import { dirname, join, relative, resolve, sep } from "node:path";
import { fileURLToPath } from "node:url";
import ts from "typescript";

const SOURCE_ROOT = fileURLToPath(new URL("../../src", import.meta.url));

export interface SourceFile {
  /** Path below src, with forward slashes. */
  readonly path: string;
  readonly text: string;
  /** As written in its import and export declarations. */
  readonly specifiers: readonly string[];
}

/** Every TypeScript file of the product. */
export const sourceFiles: readonly SourceFile[] = readdirSync(SOURCE_ROOT, { recursive: true, encoding: "utf8" })
  .filter((path) => /\.tsx?$/.test(path) && !path.endsWith(".d.ts"))
  .map((path) => {
    const text = readFileSync(join(SOURCE_ROOT, path), "utf8");
    const specifiers = ts.preProcessFile(text).importedFiles.map((file) => file.fileName);
    return { path: path.split(sep).join("/"), text, specifiers };
  });

/** The rooms of the house: a folder below src, with the two rooms of charts apart; "index.ts" for the library's face. */
export function roomOf(path: string): string {
  const [first = "", second = ""] = path.split("/");
  return first === "charts" ? `charts/${second}` : first;
}

/** Path below src of an imported file; null for a package. */
export function importedPath(from: SourceFile, specifier: string): string | null {
  if (!specifier.startsWith(".")) return null;
  const path = relative(SOURCE_ROOT, resolve(SOURCE_ROOT, dirname(from.path), specifier.replace(/\?.*$/, "")));
  return path.split(sep).join("/");
}
