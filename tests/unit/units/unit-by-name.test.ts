import { describe, expect, test } from "vitest";
import { UNITS, unitByName } from "../../../src/units/index.ts";

describe("spellings of CF, UDUNITS and field sheets", () => {
  test.each([
    ["degree_C", "degC"],
    ["degree_Celsius", "degC"],
    ["Degrees Celsius", "degC"],
    ["°C", "degC"],
    ["deg C", "degC"],
    ["ITS-90", "degC"],
    ["°F", "degF"],
    ["Fahrenheit", "degF"],
    ["K", "K"],
    ["DBAR", "dbar"],
    ["decibars", "dbar"],
    ["psi", "psi"],
    ["S m-1", "S/m"],
    ["S/m", "S/m"],
    ["S m^-1", "S/m"],
    ["mS/cm", "mS/cm"],
    ["mS cm⁻¹", "mS/cm"],
    ["µS/cm", "uS/cm"],
    ["μS cm-1", "uS/cm"],
    ["microsiemens per cm", "uS/cm"],
    ["umhos/cm", "uS/cm"],
    ["uS", "uS/cm"],
    ["kg m-3", "kg/m3"],
    ["kg/m³", "kg/m3"],
    ["1e-3", "1"],
    ["PSU", "1"],
    ["PSS-78", "1"],
    ["Feet", "ft"],
    ["metres", "m"],
    ["M", "m"],
    ["degrees_north", "deg"],
    ["percent", "%"],
  ])("%s is %s", (text, symbol) => {
    expect(unitByName(text)?.symbol).toBe(symbol);
  });
});

test("case tells milli from mega, where only case can", () => {
  expect(unitByName("mS")?.symbol).toBe("mS/cm");
  expect(unitByName("MPa")?.symbol).toBe("MPa");
  expect(unitByName("MN")?.symbol).toBe("MN");
});

test.each(["", " ", "furlong", "mg/m2", "Micromolar", "NTU", "RFU"])("%j is no unit", (text) => {
  expect(unitByName(text)).toBeNull();
});

test("a kind asked for keeps other kinds out", () => {
  expect(unitByName("m", "pressure")).toBeNull();
  expect(unitByName("°", "angle")?.symbol).toBe("deg");
});

test("every symbol names its own unit, and no two units share a spelling", () => {
  for (const unit of UNITS) expect(unitByName(unit.symbol)?.symbol).toBe(unit.symbol);
  const owners = new Map<string, string>();
  for (const unit of UNITS) {
    for (const text of unit.aliases) {
      expect(owners.get(text) ?? unit.symbol, `"${text}"`).toBe(unit.symbol);
      owners.set(text, unit.symbol);
      expect(unitByName(text)?.symbol, `"${text}"`).toBe(unit.symbol);
    }
  }
});
