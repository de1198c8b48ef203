import fc from "fast-check";
import { describe, expect, test } from "vitest";
import { type Cast, readCastFile } from "../../src/cast/index.ts";
import { convert, type UnitSymbol } from "../../src/units/index.ts";

// A survey written down in any of the ways people write must read back to the same casts. The numbers are made in the
// unit of the file, so that a measured column must come back to the last bit: nothing but one conversion lies between.

interface Sample {
  /** As written in the file, with a decimal point. */
  readonly depth: string;
  readonly temp: string;
  readonly salt: string;
}

interface Lowering {
  readonly station: string;
  /** ISO 8601 */
  readonly date: string;
  readonly clock: string;
  readonly samples: readonly Sample[];
}

interface Units {
  readonly depth: UnitSymbol;
  readonly temp: UnitSymbol;
  readonly salt: UnitSymbol;
}

interface Dialect {
  readonly delimiter: "," | ";" | "\t" | "|" | " ";
  readonly decimalMark: "." | ",";
  readonly groups: boolean;
  readonly encoding: "utf-8" | "utf-8-mark" | "utf-16le-mark" | "utf-16be-mark" | "utf-16le" | "latin-1";
  readonly lineEnd: string;
  readonly header: "brackets" | "suffix" | "comma" | "units-row" | "two-lines";
  readonly quoted: boolean;
  readonly missing: string;
  readonly dates: "iso" | "month-first" | "day-first" | "dots" | "moment";
  readonly preamble: string;
  readonly trailing: boolean;
  readonly order: readonly number[];
}

const OWN: Units = { depth: "m", temp: "degC", salt: "mS/cm" };

const decimals = (least: number, most: number, digitsCount: number): fc.Arbitrary<string> =>
  fc
    .integer({ min: Math.round(least * 10 ** digitsCount), max: Math.round(most * 10 ** digitsCount) })
    .map((n) => String(n / 10 ** digitsCount));

/** What a probe writes in a unit: ranges that no other unit of the quantity makes doubtful are not needed, units are given. */
const TEMPS: Readonly<Record<string, fc.Arbitrary<string>>> = {
  degC: decimals(-1.5, 30, 4),
  degF: decimals(29.5, 86, 3),
  K: decimals(271.7, 303, 3),
};
const SALTS: Readonly<Record<string, fc.Arbitrary<string>>> = {
  "uS/cm": decimals(50, 52_000, 1),
  "mS/cm": decimals(0.05, 52, 4),
  "S/m": decimals(0.005, 5.2, 5),
};

const lowering = (units: Units): fc.Arbitrary<Lowering> =>
  fc
    .record({
      day: fc.integer({ min: 1, max: 28 }),
      minutes: fc.integer({ min: 0, max: 1439 }),
      steps: fc.array(fc.tuple(fc.integer({ min: 1, max: 400 }), TEMPS[units.temp]!, SALTS[units.salt]!), {
        minLength: 2,
        maxLength: 12,
      }),
    })
    .map(({ day, minutes, steps }) => {
      let hundredths = 50;
      const samples = steps.map(([step, temp, salt], i) => {
        if (i > 0) hundredths += step;
        return { depth: String(hundredths / 100), temp, salt };
      });
      const two = (n: number): string => String(n).padStart(2, "0");
      const clock = `${two(Math.floor(minutes / 60))}:${two(minutes % 60)}`;
      return { station: "", date: `2026-07-${two(day)}`, clock, samples };
    });

/** The first cast is on a day above 12, so that the order of the dates is told. */
const survey = (units: Units): fc.Arbitrary<readonly Lowering[]> =>
  fc
    .array(lowering(units), { minLength: 1, maxLength: 4 })
    .map((casts) =>
      casts.map((cast, i) => ({ ...cast, station: `Q-${i + 1}`, date: i === 0 ? "2026-07-23" : cast.date })),
    );

const marks = fc.constantFrom<Pick<Dialect, "delimiter" | "decimalMark">[]>(
  { delimiter: ",", decimalMark: "." },
  { delimiter: ";", decimalMark: "." },
  { delimiter: "\t", decimalMark: "." },
  { delimiter: "|", decimalMark: "." },
  { delimiter: " ", decimalMark: "." },
  { delimiter: ";", decimalMark: "," },
  { delimiter: "\t", decimalMark: "," },
  { delimiter: "|", decimalMark: "," },
  { delimiter: " ", decimalMark: "," },
);

const rest: fc.Arbitrary<Omit<Dialect, "delimiter" | "decimalMark">> = fc.record({
  groups: fc.boolean(),
  encoding: fc.constantFrom("utf-8", "utf-8-mark", "utf-16le-mark", "utf-16be-mark", "utf-16le", "latin-1"),
  lineEnd: fc.constantFrom("\n", "\r\n", "\r"),
  header: fc.constantFrom("brackets", "suffix", "comma", "units-row", "two-lines"),
  quoted: fc.boolean(),
  missing: fc.constantFrom("", "NA", "N/A", "NaN", "-", "*", "-9", "-99", "-999", "-999.99", "-9.99e-29", "1e35"),
  dates: fc.constantFrom("iso", "month-first", "day-first", "dots", "moment"),
  preamble: fc.constantFrom(
    "",
    "# Crew: A, B; probe 7\n",
    "Survey of the bay\nAll was calm, the probe; warm\n\n",
    "% 1\n".repeat(40),
  ),
  trailing: fc.boolean(),
  order: fc.shuffledSubarray([0, 1, 2, 3, 4, 5], { minLength: 6 }),
});

/** Blanks that part cells leave no room for blank cells, names with blanks or a delimiter at the end of a line. */
const possible = (how: Dialect): Dialect =>
  how.delimiter === " "
    ? {
        ...how,
        missing: how.missing === "" ? "NA" : how.missing,
        header: how.header === "units-row" ? "units-row" : "suffix",
        quoted: false,
        trailing: false,
        dates: how.dates === "moment" ? "iso" : how.dates,
      }
    : how;

const written = fc
  .record({
    depth: fc.constantFrom<UnitSymbol[]>("m", "ft", "cm", "fathom"),
    temp: fc.constantFrom<UnitSymbol[]>("degC", "degF", "K"),
    salt: fc.constantFrom<UnitSymbol[]>("uS/cm", "mS/cm", "S/m"),
  })
  .chain((units) => fc.record({ units: fc.constant(units), casts: survey(units), how: fc.tuple(marks, rest) }))
  .map(({ units, casts, how: [mark, other] }) => ({ units, casts, how: possible({ ...mark, ...other }) }));

const UNIT_TEXT: Readonly<Record<string, string>> = { degC: "°C", degF: "deg_F", K: "K" };

function headerRows({ header }: Dialect, units: Units): readonly (readonly string[])[] {
  const texts = ["", "", "", units.depth, UNIT_TEXT[units.temp]!, units.salt];
  const names = ["Station", "Date", "Time", "Depth", "Temp", "SpCond"];
  const join = (between: string, end: string): readonly string[] =>
    names.map((name, i) => (texts[i] === "" ? name : `${name}${between}${texts[i]}${end}`));
  switch (header) {
    case "brackets":
      return [join(" (", ")")];
    case "suffix":
      return [join("_", "")];
    case "comma":
      return [join(", ", "")];
    case "units-row":
      return [names, texts.map((text) => text || "-")];
    case "two-lines":
      return [
        ["Station", "", "", "Sample", "Water", "Specific"],
        join(" [", "]").map((name, i) => ["", "Date", "Time", name, name, name.replace("SpCond", "conductance")][i]!),
      ];
  }
}

function dateText(date: string, how: Dialect): string {
  const [year, month, day] = date.split("-");
  switch (how.dates) {
    case "month-first":
      return `${Number(month)}/${Number(day)}/${year}`;
    case "day-first":
      return `${day}/${month}/${year}`;
    case "dots":
      return `${day}.${month}.${year}`;
    default:
      return date;
  }
}

function numberText(text: string, how: Dialect, mayGroup: boolean): string {
  const [whole, part] = text.split(".");
  const mark = how.decimalMark === "." ? "," : ".";
  const isGrouped = how.groups && mayGroup && Number(whole) >= 1000;
  const front = isGrouped ? whole!.replace(/\B(?=(\d{3})+$)/g, mark) : whole!;
  return part === undefined ? front : `${front}${how.decimalMark}${part}`;
}

function textOf(casts: readonly Lowering[], units: Units, how: Dialect): string {
  const rows = casts.flatMap(({ station, date, clock, samples }) =>
    samples.map((sample, i) => [
      station,
      how.dates === "moment" ? `${date}T${clock}` : dateText(date, how),
      how.dates === "moment" ? "" : clock,
      numberText(sample.depth, how, false),
      numberText(sample.temp, how, false),
      i === 1 ? how.missing.replace(".", how.decimalMark) : numberText(sample.salt, how, true),
    ]),
  );
  const quote = (cell: string): string => (how.quoted || cell.includes(how.delimiter) ? `"${cell}"` : cell);
  const lines = [...headerRows(how, units), ...rows].map(
    (row) => how.order.map((i) => quote(row[i]!)).join(how.delimiter) + (how.trailing ? how.delimiter : ""),
  );
  return `${how.preamble}${lines.join("\n")}\n`.replaceAll("\n", how.lineEnd);
}

function bytesOf(text: string, encoding: Dialect["encoding"]): Uint8Array {
  const swapped = (bytes: Buffer): Uint8Array => new Uint8Array(bytes.swap16());
  switch (encoding) {
    case "utf-8":
      return new TextEncoder().encode(text);
    case "utf-8-mark":
      return new TextEncoder().encode(`\ufeff${text}`);
    case "utf-16le-mark":
      return new Uint8Array(Buffer.from(`\ufeff${text}`, "utf16le"));
    case "utf-16be-mark":
      return swapped(Buffer.from(`\ufeff${text}`, "utf16le"));
    case "utf-16le":
      return new Uint8Array(Buffer.from(text, "utf16le"));
    case "latin-1":
      return new Uint8Array(Buffer.from(text, "latin1"));
  }
}

function expectSame(found: Cast, expected: Lowering, units: Units): void {
  const { samples } = found;
  expect([found.station, found.time, samples.n]).toEqual([
    expected.station,
    `${expected.date}T${expected.clock}`,
    expected.samples.length,
  ]);
  expected.samples.forEach((sample, i) => {
    expect(samples.depthM![i]).toBe(convert(Number(sample.depth), units.depth, OWN.depth));
    expect(samples.inSituTempC[i]).toBe(convert(Number(sample.temp), units.temp, OWN.temp));
    const salt = i === 1 ? Number.NaN : convert(Number(sample.salt), units.salt, OWN.salt);
    expect(samples.specificConductanceMsCm![i]).toBe(salt);
  });
}

describe("a survey written in two hundred dialects", () => {
  test("reads back to the same casts, bit for bit", () => {
    const dialects = new Set<string>();
    fc.assert(
      fc.property(written, ({ units, casts, how }) => {
        dialects.add(JSON.stringify([units, how]));
        const text = textOf(casts, units, how);
        const outcome = readCastFile("survey.csv", bytesOf(text, how.encoding));
        if (!outcome.ok) throw new Error(outcome.issues.map((issue) => issue.message).join("; "));
        expect(outcome.value.questions).toEqual([]);
        expect(outcome.value.casts.length).toBe(casts.length);
        casts.forEach((cast, i) => {
          expectSame(outcome.value.casts[i]!, cast, units);
        });
      }),
      { seed: 20260704, numRuns: 600 },
    );
    expect(dialects.size).toBeGreaterThanOrEqual(200);
  });
});
