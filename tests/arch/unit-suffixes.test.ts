import ts from "typescript";
import { expect, it } from "vitest";
import { roomOf, sourceFiles } from "./source-files.ts";

/** Unit and datum stand in the name, because a name is still there after arithmetic, in a debugger and in a file. */
const SUFFIX =
  /(M|Km|Pa|KPa|Dbar|C|K|GKg|KgM3|Ms2|PerS2|Deg|Rad|S|Ms|MsCm|Frac|Count|Index|Px|Factor|Ratio|KPaPerM|JM3)$/;

/** Dimensionless by definition, counts by custom, or numbers whose scale is said by a field beside them. */
const EXEMPT = new Set([
  "n",
  "i",
  "k",
  "practicalSalinity",
  "salinity",
  "unmeasuredPracticalSalinity",
  "line",
  "flag",
  "along",
  "values",
]);

/** The rooms where a number is a physical quantity. gsw-ts-port uses the standard's own symbols instead. */
const CHECKED_ROOMS = ["water", "cast", "quality", "column", "design", "survey"];

/** Parsing deals in texts, places in them and numbers that do not have a unit yet. */
const UNCHECKED_FOLDERS = /^cast\/(read|formats)\//;

const isNumeric = (type: ts.TypeNode | undefined, file: ts.SourceFile): boolean =>
  type !== undefined && /^(number|Float64Array)( \| null)?$/.test(type.getText(file));

it("names every number in a field or parameter of the physics with its unit and datum", () => {
  const offending: string[] = [];
  for (const { path, text } of sourceFiles) {
    if (!CHECKED_ROOMS.includes(roomOf(path)) || UNCHECKED_FOLDERS.test(path)) continue;
    const file = ts.createSourceFile(path, text, ts.ScriptTarget.ES2022, true);
    const visit = (node: ts.Node): void => {
      if ((ts.isParameter(node) || ts.isPropertySignature(node)) && isNumeric(node.type, file)) {
        const name = node.name.getText(file).replaceAll('"', "");
        if (!SUFFIX.test(name) && !EXEMPT.has(name)) {
          const { line } = file.getLineAndCharacterOfPosition(node.getStart());
          offending.push(`${path}:${line + 1}: ${name}`);
        }
      }
      ts.forEachChild(node, visit);
    };
    visit(file);
  }
  expect(offending).toEqual([]);
});
