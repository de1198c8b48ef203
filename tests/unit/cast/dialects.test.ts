import { describe, expect, test } from "vitest";
import { expectConverted } from "./converted.ts";
import { issueOf, onlyCast, questionOf, readBytes, readText } from "./reading.ts";

const LINES = ["Depth (m),Temperature (°C),Salinity", "0.5,12.25,3.5", "1,12,4", "1.5,11.75,20.5"];
const CSV = LINES.join("\n");

const utf16 = (text: string, order: "le" | "be", mark: boolean): Uint8Array => {
  const body = mark ? `\ufeff${text}` : text;
  const bytes = new Uint8Array(body.length * 2);
  const view = new DataView(bytes.buffer);
  for (let i = 0; i < body.length; i++) view.setUint16(2 * i, body.charCodeAt(i), order === "le");
  return bytes;
};

const latin1 = (text: string): Uint8Array => Uint8Array.from(text, (character) => character.charCodeAt(0));

const expectTheCast = (reading: ReturnType<typeof readText>): void => {
  const { samples } = onlyCast(reading);
  expect([...samples.depthM!]).toEqual([0.5, 1, 1.5]);
  expect([...samples.inSituTempC]).toEqual([12.25, 12, 11.75]);
  expect([...samples.practicalSalinity!]).toEqual([3.5, 4, 20.5]);
};

describe("encodings", () => {
  test.each([
    ["UTF-8", new TextEncoder().encode(CSV)],
    ["UTF-8 with byte-order mark", new TextEncoder().encode(`\ufeff${CSV}`)],
    ["UTF-16 (little-endian) with byte-order mark", utf16(CSV, "le", true)],
    ["UTF-16 (big-endian) with byte-order mark", utf16(CSV, "be", true)],
    ["UTF-16 (little-endian)", utf16(CSV, "le", false)],
    ["UTF-16 (big-endian)", utf16(CSV, "be", false)],
    ["Windows-1252 (Latin-1)", latin1(CSV)],
  ])("%s is recognised, and its degree sign with it", (encoding, bytes) => {
    const reading = readBytes(bytes);
    expect(reading.encoding).toBe(encoding);
    expect(reading.columns[1]).toMatchObject({ header: "Temperature (°C)", role: "temperature", unit: "degC" });
    expectTheCast(reading);
  });
});

describe("line ends", () => {
  test.each([
    ["LF", "\n"],
    ["CRLF", "\r\n"],
    ["CR", "\r"],
  ])("%s", (_, end) => {
    expectTheCast(readText(LINES.join(end) + end));
  });

  test("mixed in one file, lines still counted", () => {
    const reading = readText(`${LINES[0]}\r\n${LINES[1]}\r${LINES[2]}\n${LINES[3]}`);
    expectTheCast(reading);
    expect([...onlyCast(reading).samples.lineIndex]).toEqual([2, 3, 4]);
  });
});

describe("delimiters and decimal marks", () => {
  test.each([
    ["comma", ","],
    ["semicolon", ";"],
    ["tab", "\t"],
    ["vertical bar", "|"],
  ])("%s", (name, character) => {
    const reading = readText(CSV.replaceAll(",", character));
    expect(reading.delimiter).toBe(name);
    expectTheCast(reading);
  });

  test("runs of blanks, as in tables lined up by eye", () => {
    const reading = readText(
      "  Depth_m   Temp_C   Sal\n    0.5     12.25    3.5\n    1.0     12.00    4.0\n    1.5   11.75  20.5\n",
    );
    expect(reading.delimiter).toBe("blanks");
    expectTheCast(reading);
  });

  test("blanks within names do not make blanks the delimiter", () => {
    const reading = readText(
      `${CSV.replaceAll("\n", ",1\n").replace("Salinity,1", "Salinity,Barometric pressure")},1`.replaceAll(",", "\t"),
    );
    expect(reading.delimiter).toBe("tab");
    expectTheCast(reading);
  });

  test.each([
    ["semicolon", ";"],
    ["tab", "\t"],
  ])("decimal commas between %ss", (_, character) => {
    const reading = readText(CSV.replaceAll(",", character).replaceAll(/(\d)\.(\d)/g, "$1,$2"));
    expect(reading.decimalMark).toBe(",");
    expectTheCast(reading);
  });

  test("quoted decimal commas between commas", () => {
    const reading = readText('Depth (m),Temp (C),Sal\n"0,5","12,25","3,5"\n1,12,4\n"1,5","11,75","20,5"\n');
    expectTheCast(reading);
  });

  test("a decimal comma in a header does not make commas the delimiter", () => {
    expectTheCast(readText("Depth, m;Temp, C;Sal\n0,5;12,25;3,5\n1;12;4\n1,5;11,75;20,5"));
  });

  test("a quoted comma before three digits between commas parts thousands where no water is so pure", () => {
    const reading = readText('Depth (m),Temp (C),SpCond (uS/cm)\n1,12,"1,234"\n2,12,"1,240"\n');
    expect([...onlyCast(reading).samples.specificConductanceMsCm!]).toEqual([1.234, 1.24]);
    expect(issueOf(reading.issues, "assumed-thousands").message).toContain("read as parting thousands");
  });

  test("where both can be water, the user is asked", () => {
    const reading = readText('Depth (m),Temp (C),Sal\n"1,234",12,3\n"1,240",12,3\n');
    expect(questionOf(reading, "decimal-or-thousands").choices.map((choice) => choice.label)).toEqual([
      "1,234 is 1.234",
      "1,234 is 1234",
      "not used",
    ]);
    expect(reading.casts).toEqual([]);
  });

  test.each([
    ["1,234.5", "1,300.5", ",", 1234.5],
    ["1.234,5", "1.300,5", ";", 1234.5],
    ["1 234.5", "1 300.5", ";", 1234.5],
    ["1'234.5", "1'300.5", ",", 1234.5],
    ["1,234,567.5", "1,234,568.5", ",", 1234567.5],
  ])("thousands parted as in %s", (first, second, delimiter, value) => {
    const rows = [first, second].map((depth) => [`"${depth}"`, "12", "3"].join(delimiter));
    const reading = readText([["Depth (m)", "Temp (C)", "Sal"].join(delimiter), ...rows].join("\n"));
    expect(onlyCast(reading).samples.depthM![0]).toBe(value);
    expect(reading.questions).toEqual([]);
  });

  test("nothing but commas before three digits between semicolons is a decimal comma, with a warning", () => {
    const reading = readText("Depth (m);Temp (C);Sal\n1;12,345;30,125\n2;12,340;30,130\n");
    expect(onlyCast(reading).samples.inSituTempC[0]).toBe(12.345);
    expect(reading.issues.map((issue) => issue.code)).toEqual(["assumed-decimal-comma"]);
  });

  test("one comma that can only be a decimal mark settles it", () => {
    expect(readText("Depth (m);Temp (C);Sal\n0,5;12,345;30,125\n1;12,340;30,130\n").issues).toEqual([]);
  });

  test("exponents, plus signs and true minus signs are numbers", () => {
    const { samples } = onlyCast(readText("Depth (m),Temp (C),Sal\n5e-1,−1.5,+31\n1.0E0,-1.25,3.1e1\n"));
    expect([...samples.depthM!]).toEqual([0.5, 1]);
    expect([...samples.inSituTempC]).toEqual([-1.5, -1.25]);
    expect([...samples.practicalSalinity!]).toEqual([31, 31]);
  });
});

describe("what stands around the table", () => {
  test("comment lines of any sign are passed over and lines keep their numbers", () => {
    const reading = readText(`# Vessel "Ann, 2\n% x\n// y\n\n${CSV}\n# end\n`);
    expect(reading.headerLineIndex).toBe(5);
    expect([...onlyCast(reading).samples.lineIndex]).toEqual([6, 7, 8]);
    expectTheCast(reading);
  });

  test("text above the headers without a comment sign is passed over and said to be", () => {
    const reading = readText(`Survey of the bay\nCrew: A, B\n${CSV}`);
    expect(reading.headerLineIndex).toBe(3);
    expect(reading.issues.map((issue) => issue.code)).toEqual(["preface"]);
    expectTheCast(reading);
  });

  test("a header behind a comment sign is found", () => {
    const reading = readText(`# made by hand\n# ${CSV}`);
    expect(reading.headerLineIndex).toBe(2);
    expectTheCast(reading);
  });

  test.each(["#,", '"#",'])("a header that begins with the number sign as a name: %s", (first) => {
    const reading = readText(
      `${first}${LINES[0]}\n${LINES.slice(1)
        .map((line, i) => `${i},${line}`)
        .join("\n")}`,
    );
    expect(reading.columns.map((column) => column.role)).toEqual([null, "depth", "temperature", "practicalSalinity"]);
    expectTheCast(reading);
  });

  test("a row of units below the headers gives the units", () => {
    const reading = readText("CTDPRS,CTDTMP,CTDSAL,CTDOXY\nDBAR,ITS-90,PSS-78,UMOL/KG\n5,12,30,200\n10,11,31,190\n");
    expect(reading.columns.map((column) => column.unit)).toEqual(["dbar", "degC", "1", null]);
    expect([...onlyCast(reading).samples.seaPressureDbar!]).toEqual([5, 10]);
    expect(onlyCast(reading).samples.depthM).toBeNull();
  });

  test("units in brackets in that row are read too", () => {
    const reading = readText("depth,temp,sal\n[ft],[deg F],[psu]\n10,50,1\n20,41,2\n");
    const { samples } = onlyCast(reading);
    expect([...samples.depthM!]).toEqual([3.048, 6.096]);
    expectConverted(samples.inSituTempC[0], 10);
  });

  test("headers repeated further down, as where files were joined, are passed over", () => {
    const reading = readText(`${LINES[0]}\n${LINES[1]}\n${LINES[0]}\n${LINES[2]}\n${LINES[3]}`);
    expectTheCast(reading);
    expect([...onlyCast(reading).samples.lineIndex]).toEqual([2, 4, 5]);
  });

  test("a quoted cell that spans lines does not shift the line numbers", () => {
    const reading = readText('Depth (m),Temp (C),Note\n1,12,"two\nlines"\n2,11,\n');
    expect([...onlyCast(reading).samples.lineIndex]).toEqual([2, 4]);
  });
});
