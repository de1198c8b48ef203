import { describe, expect, test } from "vitest";
import { onlyCast, readText } from "./reading.ts";

const flagged = (header: string, ...flags: readonly string[]): readonly number[] | null => {
  const rows = flags.map((flag, i) => `${i + 1},10,${flag},30`);
  const { statedFlag } = onlyCast(readText(`Depth (m),Temp (C),${header},Sal\n${rows.join("\n")}\n`)).samples;
  return statedFlag && [...statedFlag];
};

// Meanings: QARTOD manual for in-situ temperature and salinity; WHP-90 manual (from memory).
describe("the flags of a file in the meaning of QARTOD", () => {
  test.each<[string, readonly string[], readonly number[] | null]>([
    ["1 to 4 and 9", ["1", "3", "4", "9"], [1, 3, 4, 9]],
    ["0 among others vouches for nothing", ["0", "1", "4"], [2, 1, 4]],
    ["mostly 2: good in the figures of the hydrographic programme", ["2", "2", "3", "6"], [1, 1, 3, 1]],
    ["words, in any case", ["Good", "suspect", "BAD"], [1, 3, 4]],
    ["a blank is not evaluated", ["1", "", "4"], [1, 2, 4]],
    ["0 and 1 alone do not tell which is good", ["0", "1", "0"], null],
    ["letters of their own do not tell", ["A7", "c", "A7"], null],
    ["words of a program are no flags", ["constructor", "toString"], null],
    ["nothing at all", ["", ""], null],
  ])("%s", (_, flags, meaning) => {
    expect(flagged("Temp_qc", ...flags)).toEqual(meaning);
  });

  test("in an exchange file 2 is good, whatever else stands there", () => {
    expect(flagged("CTDTMP_FLAG_W", "2", "1", "5", "7")).toEqual([1, 2, 9, 1]);
  });

  test("of several flags about a sample the worst counts", () => {
    const text = "Depth (m),Temp (C),Temp flag,Sal,Sal flag\n1,10,1,30,3\n2,9,4,31,1\n3,8,1,,9\n";
    expect([...onlyCast(readText(text)).samples.statedFlag!]).toEqual([3, 4, 9]);
  });

  test("a flag about a column that is not used does not count", () => {
    const text = "Depth (m),Temp (C),Oxygen,Oxygen flag\n1,10,8,1\n2,9,8,4\n";
    expect(onlyCast(readText(text)).samples.statedFlag).toBeNull();
  });
});
