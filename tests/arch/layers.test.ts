import { describe, expect, it } from "vitest";
import { importedPath, roomOf, sourceFiles } from "./source-files.ts";

/**
 * Who may import whom. Data walks through the rooms in this order; an import against it would let a screen change a
 * pressure, so move what both need into the lower room instead.
 */
const MAY_IMPORT: Readonly<Record<string, readonly string[]>> = {
  base: [],
  units: ["base"],
  "gsw-ts-port": [],
  water: ["base", "gsw-ts-port"],
  cast: ["base", "units", "water", "gsw-ts-port"],
  quality: ["base", "cast", "water"],
  column: ["base", "cast", "water", "gsw-ts-port"],
  design: ["base", "column", "water"],
  survey: ["base", "units", "gsw-ts-port", "water", "cast", "quality", "column", "design"],
  "charts/layout": ["base", "units", "survey"],
  "charts/draw": ["base", "charts/layout"],
  export: ["base", "survey", "units", "charts/layout"],
  worker: ["base", "survey", "cast"],
  app: ["base", "units", "cast", "survey", "charts/layout", "charts/draw", "export", "worker"],
  cli: ["base", "survey", "cast", "export"],
  "index.ts": ["base", "units", "gsw-ts-port", "water", "cast", "column", "survey", "export"],
};

/** Rooms that must run anywhere: no page, no Node, no clock, no chance. */
const PURE_ROOMS = ["base", "units", "gsw-ts-port", "water", "cast", "quality", "column", "design", "survey"];

/** Packages a room may use; what is not named here is the business of one room only. */
const PACKAGES: Readonly<Record<string, RegExp>> = {
  cast: /^(papaparse|simple-statistics|fflate|h5wasm|netcdfjs|read-excel-file\/universal)$/,
  quality: /^simple-statistics$/,
  "charts/layout": /^d3-(array|scale|shape)$/,
  "charts/draw": /^d3-(selection|scale|shape|array)$/,
  worker: /^comlink$/,
  app: /^(preact|preact\/hooks|@preact\/signals|comlink|d3-array)$/,
  cli: /^(node:.*|papaparse)$/,
};

const imports = sourceFiles.flatMap((file) =>
  file.specifiers.map((specifier) => ({ file, specifier, target: importedPath(file, specifier) })),
);

describe("the house", () => {
  it("has files to check, in rooms that are known", () => {
    expect(sourceFiles.length).toBeGreaterThan(50);
    const unknown = sourceFiles.map((file) => roomOf(file.path)).filter((room) => !(room in MAY_IMPORT));
    expect(unknown).toEqual([]);
  });

  it("imports only downward, from the rooms each room may know", () => {
    const offending = imports
      .filter(({ target }) => target !== null && /\.(tsx?|js)$/.test(target))
      .filter(({ file, target }) => {
        const from = roomOf(file.path);
        const to = roomOf(target!);
        return from !== to && !MAY_IMPORT[from]!.includes(to);
      })
      .map(({ file, target }) => `${file.path} -> ${target}`);
    expect(offending).toEqual([]);
  });

  it("goes into another room through its index.ts", () => {
    const offending = imports
      .filter(({ file, target }) => target !== null && /\.tsx?$/.test(target) && roomOf(file.path) !== roomOf(target))
      .filter(({ target }) => !target!.endsWith("/index.ts"))
      .map(({ file, target }) => `${file.path} -> ${target}`);
    expect(offending).toEqual([]);
  });

  it("has no cycles", () => {
    const next = new Map(
      sourceFiles.map((file) => [file.path, file.specifiers.map((specifier) => importedPath(file, specifier))]),
    );
    const finished = new Set<string>();
    const cycles: string[] = [];
    const walk = (path: string, trail: readonly string[]): void => {
      if (trail.includes(path)) cycles.push([...trail.slice(trail.indexOf(path)), path].join(" -> "));
      else if (!finished.has(path)) {
        for (const target of next.get(path) ?? [])
          if (target !== null && next.has(target)) walk(target, [...trail, path]);
        finished.add(path);
      }
    };
    for (const file of sourceFiles) walk(file.path, []);
    expect(cycles).toEqual([]);
  });

  it("uses a package only where its job is done", () => {
    const offending = imports
      .filter(({ file, specifier, target }) => target === null && !PACKAGES[roomOf(file.path)]?.test(specifier))
      .map(({ file, specifier }) => `${file.path} -> ${specifier}`);
    expect(offending).toEqual([]);
  });

  it("keeps page, Node, clock and chance out of the physics", () => {
    const forbidden =
      /\b(document|window|navigator|localStorage|process|globalThis|console|Date\.now|new Date\(\)|Math\.random|performance)\b/;
    const offending = sourceFiles
      .filter((file) => PURE_ROOMS.includes(roomOf(file.path)))
      .flatMap((file) =>
        withoutComments(file.text)
          .split("\n")
          .map((line, i) => ({ at: `${file.path}:${i + 1}`, line })),
      )
      .filter(({ line }) => forbidden.test(line.replace(/"[^"]*"|`[^`]*`/g, "")))
      .map(({ at, line }) => `${at}: ${line.trim()}`);
    expect(offending).toEqual([]);
  });
});

/** Keeps the line numbers. */
const withoutComments = (text: string): string =>
  text.replace(/\/\*[\s\S]*?\*\//g, (comment) => comment.replace(/[^\n]/g, "")).replace(/\/\/.*$/gm, "");
