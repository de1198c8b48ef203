import { fileURLToPath } from "node:url";
import { describe, expect, test } from "vitest";
import { binariesIn, damagedBinary, fuzzFormats } from "./format-fuzz.ts";

const corpus = binariesIn(fileURLToPath(new URL("../formats/", import.meta.url)));

describe("damaged workbooks and netCDF files", () => {
  test("a thousand of them: no throw, no silence, none over two seconds, memory bounded", async () => {
    expect(corpus.length).toBe(5);
    expect(await fuzzFormats(corpus, 1, 1000)).toEqual([]);
  });

  test("a seed makes the same bytes again", () => {
    expect(damagedBinary(7, corpus)).toEqual(damagedBinary(7, corpus));
  });
});
