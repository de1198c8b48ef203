import { describe, expect, test } from "vitest";
import { expectConverted } from "./converted.ts";
import { issueOf, onlyCast, questionOf, readText, rolesOf, unitsIn } from "./reading.ts";

/** Rows below the given headers; unless they are given, two of 1 in every column but for the first, which goes on to 2. */
const table = (headers: readonly string[], ...rows: readonly (readonly (string | number)[])[]): string =>
  [headers, ...(rows.length > 0 ? rows : [headers.map(() => 1), headers.map((_, i) => (i === 0 ? 2 : 1))])]
    .map((row) => row.join(","))
    .join("\n");

describe("names and units in headers", () => {
  test.each([
    ["Depth (m)", "depth", "m"],
    ["Depth [ft]", "depth", "ft"],
    ["Depth.feet", "depth", "ft"],
    ["depth_m", "depth", "m"],
    ["DepthFt", "depth", "ft"],
    ["Depth_in", "depth", "in"],
    ["Depth in m", "depth", "m"],
    ["DEPTH", "depth", "m"],
    ["Sample depth (cm)", "depth", "cm"],
    ["Depth below surface {m}", "depth", "m"],
    ["sea_water_pressure", "seaPressure", "dbar"],
    ["press_kPa", "seaPressure", "kPa"],
    ["Pressure (psi)", "seaPressure", "psi"],
  ])("%s is %s in %s", (header, role, unit) => {
    expect(readText(table([header, "Temp (C)", "Sal"])).columns[0]).toMatchObject({ role, unit });
  });

  test.each([
    ["temp_C", "temperature", "degC"],
    ["Temp.C", "temperature", "degC"],
    ["Temp °C", "temperature", "degC"],
    ["Temperature (Degrees Celsius)", "temperature", "degC"],
    ["Water Temp (deg F)", "temperature", "degF"],
    ["temperature [ITS-90; deg C]", "temperature", "degC"],
    ["sea_water_temperature", "temperature", "degC"],
    ["wtemp", "temperature", "degC"],
  ])("%s is %s in %s", (header, role, unit) => {
    expect(readText(table(["Depth (m)", header, "Sal"])).columns[1]).toMatchObject({ role, unit });
  });

  test.each([
    ["Salinity (PSU)", "practicalSalinity", "1"],
    ["Sal (ppt)", "practicalSalinity", "1"],
    ["sea_water_practical_salinity", "practicalSalinity", "1"],
    ["Conductivity (S/m)", "conductivity", "S/m"],
    ["Cond mS/cm", "conductivity", "mS/cm"],
    ["SpCond.uS", "specificConductance", "uS/cm"],
    ["spec_cond_uS_cm", "specificConductance", "uS/cm"],
    ["Specific Conductance (µS/cm @ 25 °C)", "specificConductance", "uS/cm"],
    ["Conductivity (uS/cm at 25C)", "specificConductance", "uS/cm"],
    ["Sigma-t", "densityAnomaly", "kg/m3"],
    ["sigma_theta (kg m-3)", "densityAnomaly", "kg/m3"],
    ["Latitude (degrees_north)", "latitude", "deg"],
    ["Long", "longitude", "deg"],
    ["River mile", "distance", "mi"],
    ["rkm", "distance", "km"],
    ["Distance from weir (m)", "distance", "m"],
    ["Station_Number", "station", null],
    ["Site ID", "station", null],
    ["Cast No.", "castName", null],
  ])("%s is %s in %s", (header, role, unit) => {
    expect(readText(table(["Depth (m)", "Temp (C)", header])).columns[2]).toMatchObject({ role, unit });
  });

  test.each([
    "Oxygen",
    "Discrete Oxygen (mg/L)",
    "do_raw",
    "DO_temp",
    "Air temperature (C)",
    "Potential temperature (C)",
    "Secchi depth (m)",
    "Barometric pressure (mmHg)",
    "EC (uS/cm)",
    "Julian Date",
    "Chl.ug.L",
    "pH",
    "",
  ])("%j has no role, with a reason", (header) => {
    const column = readText(table(["Depth (m)", "Temp (C)", header, "Sal"])).columns[2]!;
    expect(column.role).toBeNull();
    expect(column.reason).toMatch(/^Not used: .+\.$/);
  });
});

describe("values move into the units of the program", () => {
  test("feet, Fahrenheit, S/m, kPa and miles", () => {
    const text = table(
      ["Depth (ft)", "Pressure (kPa)", "Temp (F)", "Cond (S/m)", "Distance (mi)"],
      [10, 29.89, 50, 3.5, 2],
      [20, 59.78, 41, 4.2, 2],
    );
    const { samples, distanceKm } = onlyCast(readText(text));
    expect([...samples.depthM!]).toEqual([3.048, 6.096]);
    expectConverted(samples.seaPressureDbar![0], 2.989);
    expectConverted(samples.inSituTempC[1], 5);
    expectConverted(samples.conductivityMsCm![0], 35);
    expectConverted(distanceKm, 3.218688);
  });

  test("IPTS-68 becomes ITS-90 by t68 = 1.00024 t90", () => {
    const text = table(["Depth (m)", "Temp (IPTS-68)", "Sal"], [1, 15.0036, 30], [2, 10.0024, 31]);
    expectConverted(onlyCast(readText(text)).samples.inSituTempC[0], 15);
  });
});

describe("two columns for one role", () => {
  test("the better name wins, and both are named", () => {
    const reading = readText(
      table(["Depth (m)", "temp (C)", "Water temperature (C)", "Sal"], [1, 8, 9, 30], [2, 8, 9, 30]),
    );
    expect(rolesOf(reading).temperature?.[0]).toBe("Water temperature (C)");
    expect(issueOf(reading.issues, "two-columns-for-one-role").message).toContain(
      '"temp (C)" could both be temperature',
    );
  });

  test("the same depth in metres and feet is used once, the first", () => {
    const reading = readText(table(["Depth (m)", "Depth (ft)", "Temp (C)", "Sal"], [1, 3.28, 9, 1], [2, 6.56, 9, 1]));
    expect(rolesOf(reading).depth).toEqual(["Depth (m)", "m"]);
    expect(reading.columns[1]!.role).toBeNull();
  });

  test("an empty column gives way to one with values", () => {
    const reading = readText(table(["Depth (m)", "Depth", "Temp (C)", "Sal"], ["", 1, 9, 1], ["", 2, 9, 1]));
    expect(rolesOf(reading).depth?.[0]).toBe("Depth");
  });

  test("salinity and conductance are different roles: both are kept", () => {
    const reading = readText(
      table(["Depth (m)", "Temp (C)", "Sal", "SpCond (uS/cm)"], [1, 9, 0.2, 420], [2, 9, 0.2, 421]),
    );
    const { samples } = onlyCast(reading);
    expect(samples.practicalSalinity![0]).toBe(0.2);
    expect(samples.specificConductanceMsCm![0]).toBe(0.42);
  });
});

describe("units that the file does not give", () => {
  const withTemps = (...temps: readonly number[]): string =>
    table(["Depth (m)", "temp", "Sal"], ...temps.map((temp, i) => [i, temp, 30]));
  const withCond = (...conds: readonly number[]): string =>
    table(["Depth (m)", "Temp (C)", "Cond"], ...conds.map((cond, i) => [i, 10, cond]));

  test("temperature that can be water in degC is taken so, with a note that names the range", () => {
    const issue = issueOf(readText(withTemps(1.6, 12, 29.6)).issues, "assumed-unit-temperature");
    expect(issue.severity).toBe("note");
    expect(issue.message).toContain("values lie in 1.6 to 29.6");
  });

  test.each([
    [[38, 40, 42], "degC", ["degC", "degF"]],
    [[58, 61, 66], "degF", ["degF", "degC", "K"]],
  ])("temperature of %j is asked about, and nothing is computed until it is answered", (temps, likeliest, units) => {
    const reading = readText(withTemps(...temps));
    const question = questionOf(reading, "no-unit-temperature");
    expect(question.message).toContain(`as in "temp (${likeliest})"`);
    expect(unitsIn(question)).toEqual(units);
    expect(reading.columns[1]).toMatchObject({ role: null, confidence: "doubtful" });
    expect(reading.casts).toEqual([]);
  });

  test("temperature between 270 and 318 is in kelvin, with a warning", () => {
    const reading = readText(withTemps(285.15, 283.15));
    expectConverted(onlyCast(reading).samples.inSituTempC[0], 12);
    expect(issueOf(reading.issues, "assumed-unit-temperature").severity).toBe("warning");
  });

  test("depth is taken in metres with a warning that says so", () => {
    const issue = issueOf(readText(table(["Depth", "Temp (C)", "Sal"])).issues, "assumed-unit-depth");
    expect(issue.severity).toBe("warning");
    expect(issue.message).toContain("m is assumed");
  });

  test.each([
    [48210, "uS/cm"],
    [518, "uS/cm"],
    [45, "mS/cm"],
    [4.4, "S/m"],
  ])("conductivity around %d is %s by its median, with a warning (methods 1.5)", (value, unit) => {
    const reading = readText(withCond(value * 0.99, value, value * 1.01));
    expect(reading.columns[2]!.unit).toBe(unit);
    expect(issueOf(reading.issues, "assumed-unit-conductivity").severity).toBe("warning");
  });

  test.each([0.05, 0.9, 2.5, 15, 80])("conductivity around %d could be several units: a question", (value) => {
    const reading = readText(withCond(value, value, value));
    expect(unitsIn(questionOf(reading, "no-unit-conductivity"))).toEqual(["uS/cm", "mS/cm", "S/m"]);
    expect(onlyCast(reading).samples.conductivityMsCm).toBeNull();
  });

  test.each([45, 4.4])("specific conductance around %d could be a soft lake's as well: a question", (value) => {
    const text = table(["Depth (m)", "Temp (C)", "SpCond"], [1, 10, value], [2, 10, value]);
    questionOf(readText(text), "no-unit-specific-conductance");
  });

  test("a brackish column in mS/cm is not taken for sea water in S/m because of its median", () => {
    questionOf(readText(withCond(1, 4, 38)), "no-unit-conductivity");
  });

  test("beside a salinity column the same conductivity is left unused with a warning and no question", () => {
    const reading = readText(table(["Depth (m)", "Temp (C)", "Sal", "Cond"], [1, 10, 1, 2], [2, 10, 1, 2]));
    expect(rolesOf(reading).conductivity).toBeUndefined();
    expect(issueOf(reading.issues, "no-unit-conductivity").severity).toBe("warning");
    expect(reading.questions).toEqual([]);
  });

  test.each([
    ["Depth (cubits)", "cubits", "depth in m"],
    ["Depth (dbar)", "dbar", "sea pressure in dbar"],
    ["Depth (psi)", "psi", "sea pressure in psi"],
  ])("a unit that is no length is not overruled: %s", (header, text, likeliest) => {
    const reading = readText(table([header, "Temp (C)", "Sal"]));
    const question = questionOf(reading, "no-unit-depth");
    expect(question.message).toContain(`"${text}" is no unit of depth known here`);
    expect(question.choices[0]!.label).toBe(likeliest);
    expect(reading.casts).toEqual([]);
  });

  test("pressure in metres may be depth, or the height of a column of water", () => {
    const question = questionOf(readText(table(["Pressure (m)", "Temp (C)", "Sal"])), "no-unit-sea-pressure");
    expect(question.choices.slice(0, 2).map((choice) => choice.label)).toEqual(["depth in m", "sea pressure in mH2O"]);
  });

  test("a column that holds texts alone is not used, with a warning", () => {
    const reading = readText(table(["Depth (m)", "Temp (C)", "Lat"], [1, 9, "up north"], [2, 9, "up north"]));
    expect(issueOf(reading.issues, "no-numbers").message).toContain('"up north"');
  });

  test("a remark in brackets is no unit", () => {
    expect(readText(table(["Depth (below surface)", "Temp (C)", "Sal"])).columns[0]).toMatchObject({
      role: "depth",
      unit: "m",
    });
  });

  test("salinity in g/kg may be absolute or practical: a question", () => {
    const reading = readText(table(["Depth (m)", "Temp (C)", "Salinity (g/kg)"]));
    const question = questionOf(reading, "practical-or-absolute");
    expect(question.choices.map(({ answer }) => answer.role)).toEqual([
      "absoluteSalinity",
      "practicalSalinity",
      "unused",
    ]);
    expect(onlyCast(reading).samples).toMatchObject({ practicalSalinity: null, absSalinityGKg: null });
  });

  test("so is pressure that starts a metre or two below, unless its name says that it is gauge", () => {
    const rows = [
      [11.3, 9, 30],
      [15, 9, 30],
    ] as const;
    questionOf(readText(table(["Pressure (dbar)", "Temp (C)", "Sal"], ...rows)), "pressure-may-be-absolute");
    expect(readText(table(["Sea pressure (dbar)", "Temp (C)", "Sal"], ...rows)).questions).toEqual([]);
    expect(readText(table(["Pressure (dbar)", "Temp (C)", "Sal"], [25, 9, 30], [30, 9, 30])).questions).toEqual([]);
  });

  test("beside depth, pressure shows by itself whether the air is in it", () => {
    const headers = ["Depth (m)", "Pressure (dbar)", "Temp (C)", "Sal"];
    const absolute = readText(table(headers, [1, 11.1, 9, 30], [5, 15.1, 9, 30]));
    expect(onlyCast(absolute).samples.seaPressureDbar![0]).toBe(11.1 - 10.1325);
    expect(rolesOf(absolute).absolutePressure).toEqual(["Pressure (dbar)", "dbar"]);
    const gauge = readText(table(headers, [11, 11.1, 9, 30], [15, 15.1, 9, 30]));
    expect(onlyCast(gauge).samples.seaPressureDbar![0]).toBe(11.1);
  });

  test("pressure that starts at one atmosphere is suspected to be absolute, and no cast is made of it", () => {
    const reading = readText(table(["Pressure (dbar)", "Temp (C)", "Sal"], [10.2, 9, 30], [15, 9, 30]));
    expect(reading.casts).toEqual([]);
    expect(questionOf(reading, "pressure-may-be-absolute").choices.length).toBe(3);
    expect(issueOf(reading.issues, "pressure-may-be-absolute").message).toContain("10.20 dbar");
  });
});
