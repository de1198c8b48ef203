import { describe, expect, test } from "vitest";
import { codesOf, issueOf, onlyCast, readText } from "./reading.ts";

const HEADER = "Depth (m),Temp (C),Sal";

describe("missing values", () => {
  test.each(["", "NA", "n/a", "NaN", "-", "--", "null"])(
    "%j is a missing salinity; the row stays, and is named",
    (text) => {
      const { samples, issues } = onlyCast(readText(`${HEADER}\n1,10,${text}\n2,10,30\n`));
      expect([...samples.practicalSalinity!]).toEqual([Number.NaN, 30]);
      expect(issueOf(issues, "no-salinity")).toMatchObject({ severity: "note", line: 2 });
    },
  );

  test.each(["-99", "-999", "-9999.0", "-99.99"])("%s is read as not measured, and said to be", (text) => {
    const reading = readText(`${HEADER}\n1,10,${text}\n2,10,30\n`);
    expect(onlyCast(reading).samples.practicalSalinity![0]).toBeNaN();
    expect(issueOf(reading.issues, "sentinel").message).toContain(`${text} is read as not measured`);
  });

  test("-99 is a longitude", () => {
    const reading = readText("Depth (m),Temp (C),Lat,Lon\n1,10,19.4,-99\n2,10,19.4,-99\n");
    expect(onlyCast(reading)).toMatchObject({ latitudeDeg: 19.4, longitudeDeg: -99 });
  });

  test("rows without depth or temperature are left out, counted, the first lines named", () => {
    const rows = ["1,10,30", ",10,30", "2,,30", "3,9,31", "4,NA,31", "5,8,32"];
    const { samples, issues } = onlyCast(readText([HEADER, ...rows].join("\n")));
    expect([...samples.depthM!]).toEqual([1, 3, 5]);
    expect([...samples.lineIndex]).toEqual([2, 5, 7]);
    expect(issueOf(issues, "no-depth").message).toBe("line 3: no depth; left out");
    expect(issueOf(issues, "no-temperature").message).toBe("2 rows (lines 4, 6): no temperature; left out");
  });

  test("only the first five lines of many are named", () => {
    const rows = Array.from({ length: 9 }, (_, i) => `${i},,30`);
    const { issues } = onlyCast(readText([HEADER, ...rows, "20,9,30", "21,9,30"].join("\n")));
    expect(issueOf(issues, "no-temperature").message).toBe(
      "9 rows (lines 2, 3, 4, 5, 6 ...): no temperature; left out",
    );
  });
});

describe("values that cannot be right", () => {
  test("text among numbers is named with its line, what was found and what was expected", () => {
    const { samples, issues } = onlyCast(readText(`${HEADER}\n1,10,30\n2,warm,30\n3,9,<0.1\n4,9,31\n`));
    expect([...samples.depthM!]).toEqual([1, 3, 4]);
    expect(issues.filter((issue) => issue.code === "not-a-number").map((issue) => issue.message)).toEqual([
      'line 3: temperature "warm" is not a number; expected a number or a blank',
      'line 4: practical salinity "<0.1" is not a number; expected a number or a blank',
    ]);
  });

  test("rows above the water are left out with a warning", () => {
    const { samples, issues } = onlyCast(readText(`${HEADER}\n-0.3,15,0\n0,10,30\n1,10,30\n`));
    expect([...samples.depthM!]).toEqual([0, 1]);
    expect(issueOf(issues, "above-water").message).toBe("line 2: depth is negative, above the water; left out");
  });

  test("temperature out of range stays, with a remedy", () => {
    const { samples, issues } = onlyCast(readText(`${HEADER}\n1,10,30\n2,183,30\n3,10,30\n`));
    expect(samples.inSituTempC[1]).toBe(183);
    expect(issueOf(issues, "temperature-outside").message).toBe(
      "line 3: temperature 183.0 degC is outside -2 to 45 degC; is the column in degF?",
    );
  });

  test("a row wider than the header is named", () => {
    const reading = readText(`${HEADER}\n1,10,30\n2,10,30,7\n3,10,30\n`);
    expect(issueOf(reading.issues, "rows-too-wide")).toMatchObject({ severity: "warning", line: 3 });
  });

  test("a last column without a name is listed and not used, whatever it holds", () => {
    const reading = readText(`${HEADER},\n1,10,30,calm\n2,9,31,calm\n`);
    expect(reading.columns[3]).toMatchObject({ header: "", role: null, reason: "Not used: it has no name." });
    expect(reading.issues).toEqual([]);
  });

  test("an open quotation mark is named", () => {
    const reading = readText(`${HEADER},Note\n1,10,30,a\n2,10,30,b\n3,10,30,"c\n4,10,30,d\n`);
    expect(codesOf(reading.issues)).toContain("open-quote");
  });

  test("samples stay in the order of the file, soak and reversal with them", () => {
    const depths = [0.5, 0.9, 0.4, 1, 1.5, 1.2, 2];
    const reading = readText([HEADER, ...depths.map((depth) => `${depth},10,30`)].join("\n"));
    expect([...onlyCast(reading).samples.depthM!]).toEqual(depths);
  });
});

test("without salinity and conductance that is said", () => {
  expect(codesOf(readText("Depth (m),Temp (C)\n1,10\n2,9\n").issues)).toEqual(["temperature-only"]);
});
