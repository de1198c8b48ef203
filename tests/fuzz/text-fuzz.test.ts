import { fileURLToPath } from "node:url";
import { describe, expect, test } from "vitest";
import { corpusIn, fuzzText, inputOf } from "./text-fuzz.ts";

const corpus = corpusIn(fileURLToPath(new URL("../corpus/files/", import.meta.url)));

describe("damaged text files", () => {
  test("two thousand of them: no throw, no silence, none over two seconds, no broken cast", () => {
    expect(fuzzText(corpus, 1, 2000)).toEqual([]);
  });

  test("a seed makes the same bytes again", () => {
    expect(inputOf(7, corpus)).toEqual(inputOf(7, corpus));
    expect(inputOf(7, corpus)).not.toEqual(inputOf(8, corpus));
  });
});
