import fc from "fast-check";
import { describe, expect, test } from "vitest";
import { readCastFile } from "../../src/cast/index.ts";
import { convert, type UnitSymbol } from "../../src/units/index.ts";

// A cast as an instrument resolves it, written down in any of the ways people write, must read back to the same numbers.

interface Sample {
  readonly depthM: number;
  readonly inSituTempC: number;
  readonly practicalSalinity: number;
}

interface Dialect {
  readonly delimiter: string;
  readonly decimalMark: "." | ",";
  readonly lineEnd: string;
  readonly quoted: boolean;
  readonly unitStyle: "brackets" | "suffix" | "row" | "comma";
  readonly depthUnit: UnitSymbol;
  readonly tempUnit: UnitSymbol;
  readonly comment: string;
  readonly order: readonly number[];
  readonly encoding: "utf-8" | "utf-8-mark" | "utf-16le";
  readonly missing: string;
}

const step = fc.integer({ min: 5, max: 300 }).map((n) => n / 100);
const sample = fc.tuple(step, fc.integer({ min: -150, max: 3400 }), fc.integer({ min: 0, max: 41_000 }));
const cast = fc.array(sample, { minLength: 2, maxLength: 30 }).map((rows): readonly Sample[] => {
  let depthM = 0;
  return rows.map(([stepM, temp, salinity]) => {
    depthM += stepM;
    return { depthM, inSituTempC: temp / 100, practicalSalinity: salinity / 1000 };
  });
});

const marks = fc.constantFrom(
  { delimiter: ",", decimalMark: "." },
  { delimiter: ";", decimalMark: "." },
  { delimiter: "\t", decimalMark: "." },
  { delimiter: "|", decimalMark: "." },
  { delimiter: ";", decimalMark: "," },
  { delimiter: "\t", decimalMark: "," },
  { delimiter: "|", decimalMark: "," },
) as fc.Arbitrary<Pick<Dialect, "delimiter" | "decimalMark">>;

const rest: fc.Arbitrary<Omit<Dialect, "delimiter" | "decimalMark">> = fc.record({
  lineEnd: fc.constantFrom("\n", "\r\n", "\r"),
  quoted: fc.boolean(),
  unitStyle: fc.constantFrom("brackets", "suffix", "row", "comma"),
  depthUnit: fc.constantFrom("m", "ft", "cm", "fathom"),
  tempUnit: fc.constantFrom("degC", "degF", "K"),
  comment: fc.constantFrom("", "# Crew: A, B; probe 7\t|\n", "% one\n\n% two; three\n"),
  order: fc.shuffledSubarray([0, 1, 2], { minLength: 3 }),
  encoding: fc.constantFrom("utf-8", "utf-8-mark", "utf-16le"),
  missing: fc.constantFrom("", "NA", "NaN", "-", "-999"),
});

const dialect: fc.Arbitrary<Dialect> = fc.tuple(marks, rest).map(([mark, other]) => ({ ...mark, ...other }));

function headersIn(style: Dialect["unitStyle"], units: readonly string[]): readonly (readonly string[])[] {
  const names = ["Depth", "Temperature", "Salinity"];
  switch (style) {
    case "brackets":
      return [names.map((name, i) => `${name} (${units[i]})`)];
    case "suffix":
      return [names.map((name, i) => (units[i] === "PSU" ? name : `${name}_${units[i]}`))];
    case "comma":
      return [names.map((name, i) => `${name}, ${units[i]}`)];
    case "row":
      return [names, units];
  }
}

function written(samples: readonly Sample[], how: Dialect): string {
  const number = (value: number): string => String(value).replace(".", how.decimalMark);
  const cells = samples.map((s, i) => [
    number(convert(s.depthM, "m", how.depthUnit)),
    number(convert(s.inSituTempC, "degC", how.tempUnit)),
    i === 1 ? how.missing : number(s.practicalSalinity),
  ]);
  const rows = [...headersIn(how.unitStyle, [how.depthUnit, how.tempUnit, "PSU"]), ...cells];
  // A comma in a header needs quotes where commas delimit.
  const quote = (cell: string): string => (how.quoted || cell.includes(how.delimiter) ? `"${cell}"` : cell);
  const lines = rows.map((row) => how.order.map((i) => quote(row[i]!)).join(how.delimiter));
  return (how.comment + lines.join("\n")).replaceAll("\n", how.lineEnd);
}

function encode(text: string, encoding: Dialect["encoding"]): Uint8Array {
  if (encoding === "utf-16le") return new Uint8Array(Buffer.from(`\ufeff${text}`, "utf16le"));
  return new TextEncoder().encode(encoding === "utf-8-mark" ? `\ufeff${text}` : text);
}

describe("a cast written in any dialect", () => {
  test("reads back to the same numbers, in the same order", () => {
    fc.assert(
      fc.property(cast, dialect, (samples, how) => {
        const outcome = readCastFile("any.csv", encode(written(samples, how), how.encoding));
        expect(outcome.issues.filter((issue) => issue.severity === "error")).toEqual([]);
        if (!outcome.ok) throw new Error("not read");
        expect(outcome.value.casts.length).toBe(1);
        const back = outcome.value.casts[0]!.samples;
        expect(back.n).toBe(samples.length);
        samples.forEach((s, i) => {
          // Two conversions, each within a few units of the last place; K and degF add their zero and take it off again.
          expect(Math.abs(back.depthM![i]! - s.depthM)).toBeLessThan(1e-13 * (1 + s.depthM));
          expect(Math.abs(back.inSituTempC[i]! - s.inSituTempC)).toBeLessThan(5e-13);
          if (i === 1) expect(back.practicalSalinity![i]).toBeNaN();
          else expect(back.practicalSalinity![i]).toBe(s.practicalSalinity);
        });
      }),
      { seed: 20260517, numRuns: 500 },
    );
  });
});

test("no bytes at all make the reader throw", () => {
  fc.assert(
    fc.property(fc.uint8Array({ maxLength: 400 }), (bytes) => {
      const outcome = readCastFile("any.csv", bytes);
      expect(outcome.ok || outcome.issues.length > 0).toBe(true);
    }),
    { seed: 1, numRuns: 500 },
  );
});

test("no text under a good header makes the reader throw", () => {
  const cell = fc.oneof(
    fc.string({ maxLength: 8 }),
    fc.double().map(String),
    fc.constantFrom("", "NA", '"', ",", "\n", ";"),
  );
  fc.assert(
    fc.property(fc.array(fc.array(cell, { maxLength: 7 }), { maxLength: 20 }), (rows) => {
      const text = `Station,Date,Time,Depth (m),Temp (C),Sal\n${rows.map((row) => row.join(",")).join("\n")}`;
      const outcome = readCastFile("any.csv", new TextEncoder().encode(text));
      expect(outcome.ok || outcome.issues.length > 0).toBe(true);
    }),
    { seed: 2, numRuns: 500 },
  );
});
