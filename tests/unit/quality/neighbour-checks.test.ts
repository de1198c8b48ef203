import { describe, expect, it } from "vitest";
import { calmWater, everyHalfMetre, flagsOf, preparedOf } from "./prepared.ts";

describe("calm water", () => {
  it("passes every check", () => {
    const { flag, issues, reasons } = preparedOf(calmWater(40));
    expect(new Set(flag)).toEqual(new Set([1]));
    expect(issues).toEqual([]);
    expect(reasons.flat()).toEqual([]);
  });
});

describe("flat line", () => {
  const rising = (middle: readonly number[]) => [7.6, 10.1, 12.2, 14.9, 17.4, ...middle, 22.6, 25.1, 27.3, 29.4];
  const cast = (inSituTempC: readonly number[]) => ({
    depthM: everyHalfMetre(inSituTempC),
    inSituTempC,
    practicalSalinity: inSituTempC.map((_, i) => 5 + 2 * i),
  });

  it("makes the third of three equal values suspect", () => {
    // QARTOD: 20, 20, 20 within the resolution is suspect at the third.
    const flags = flagsOf(cast(rising([20, 20, 20])));
    expect(flags.map((flag, i) => (flag === 1 ? null : [i, flag])).filter(Boolean)).toEqual([[7, 3]]);
  });

  it("fails five that are not there by chance", () => {
    const { flag, reasons } = preparedOf(cast(rising([20, 20, 20, 20, 20])));
    expect([...flag.slice(5, 10)]).toEqual([4, 4, 4, 4, 4]);
    expect(reasons[7]).toEqual([
      "temperature stays at 20 degC in 5 samples from line 7 on while the water above and below changes",
    ]);
  });

  it("lets mixed water repeat, at the surface, at the bed and between soft gradients", () => {
    const lake = [24.1, 24.1, 24.1, 24.1, 24, 23.1, 20.2, 16.1, 13, 11.5, 11.1, 11, 11, 11, 11, 11];
    expect(flagsOf(cast(lake))).toEqual(lake.map(() => 1));
    const inner = [20.3, 20.1, 20, 20, 20, 20, 20, 20, 19.9, 19.7];
    expect(flagsOf(cast(inner))).toEqual(inner.map(() => 1));
  });

  it("lets a slow record repeat each value three times", () => {
    const inSituTempC = [20, 18.1, 15.9, 14.2, 12.1, 10].flatMap((value) => [value, value, value]);
    expect(flagsOf(cast(inSituTempC))).toEqual(inSituTempC.map(() => 1));
  });
});

describe("density inversion", () => {
  const inSituTempC = [12.001, 12, 12, 12, 12, 12];
  const depthM = everyHalfMetre(inSituTempC);

  it("makes both samples suspect", () => {
    const { flag, reasons } = preparedOf({
      depthM,
      inSituTempC,
      practicalSalinity: [20, 20.1, 20.2, 20.13, 20.3, 20.4],
    });
    expect([...flag]).toEqual([1, 1, 3, 3, 1, 1]);
    expect(reasons[2]![0]).toMatch(/^heavier by 0\.05\d kg\/m3 than the water below it \(line 5, 2 m\)$/);
    expect(reasons[3]!.at(-1)).toMatch(/^lighter by 0\.05\d kg\/m3 than the water above it/);
  });

  it("fails the one sample that is to blame, and clears its neighbour", () => {
    expect(flagsOf({ depthM, inSituTempC, practicalSalinity: [20, 20.1, 20.6, 20.12, 20.2, 20.3] })).toContain(4);
    expect(flagsOf({ depthM, inSituTempC, practicalSalinity: [20, 20.1, 20.6, 20.2, 20.3, 20.4] })).toEqual([
      1, 1, 4, 1, 1, 1,
    ]);
    expect(flagsOf({ depthM, inSituTempC, practicalSalinity: [20, 20.1, 20.2, 19.7, 20.3, 20.4] })).toEqual([
      1, 1, 1, 4, 1, 1,
    ]);
  });

  it("fails nobody where it can not be told who is wrong", () => {
    const overturn = flagsOf({ depthM, inSituTempC, practicalSalinity: [22, 22, 22, 20, 20, 20] });
    expect(overturn).toEqual([1, 1, 3, 3, 1, 1]);
  });

  it("is no fault where rounding explains it or temperature alone was measured", () => {
    expect(flagsOf({ depthM, inSituTempC, practicalSalinity: [20, 20, 20.1, 20, 20.2, 20.3] })).toEqual([
      1, 1, 1, 1, 1, 1,
    ]);
    const warmBelow = flagsOf({ depthM, inSituTempC: [10.01, 10, 10, 12, 13, 14] });
    expect(warmBelow).not.toContain(4);
    expect(warmBelow).toContain(3);
  });

  it("is none in water that is lighter for being colder than 4 degC", () => {
    expect(flagsOf({ depthM, inSituTempC: [0.1, 1, 2, 3, 3.5, 3.9] })).toEqual([1, 1, 1, 1, 1, 1]);
  });
});

describe("dry sensor", () => {
  const practicalSalinity = [12, 14, 18, 24, 28, 29, 29.5];
  const cast = (salinity: readonly number[]) => ({
    depthM: everyHalfMetre(salinity),
    inSituTempC: salinity.map((_, i) => 15 - i / 10),
    practicalSalinity: salinity,
  });

  it("fails near-zero salinity below salty water, and only that", () => {
    expect(flagsOf(cast(practicalSalinity.with(4, 0.02).with(5, 0.01)))).toEqual([1, 1, 1, 1, 4, 4, 1]);
  });

  it("leaves fresh water above salty water alone", () => {
    expect(flagsOf(cast([0.02, 0.03, 0.2, 24.2, 28, 29, 29.5]))).not.toContain(4);
  });
});

describe("stuck sensor", () => {
  const n = 12;
  const depthM = Array.from({ length: n }, (_, i) => i + 1);
  const practicalSalinity = depthM.map((z) => 20 + z / 8);

  it("makes one fine value over a whole cast suspect", () => {
    const { flag, reasons } = preparedOf({ depthM, practicalSalinity, inSituTempC: depthM.map(() => 12.347) });
    expect(new Set(flag)).toEqual(new Set([3]));
    expect(reasons[0]).toEqual(["temperature is 12.347 degC in all 12 samples while the depth changes"]);
  });

  it("looks at the conductivity itself", () => {
    const columns = {
      depthM,
      inSituTempC: depthM.map((z) => 12 + z / 100),
      conductivityMsCm: depthM.map(() => 31.247),
    };
    expect(preparedOf(columns).reasons[0]).toEqual([
      "conductivity is 31.247 mS/cm in all 12 samples while the depth changes",
    ]);
    expect(flagsOf({ ...columns, conductivityMsCm: depthM.map(() => 0.255) })).toEqual(depthM.map(() => 1));
  });

  it("lets a coarse record of mixed water be the same throughout", () => {
    expect(flagsOf({ depthM, practicalSalinity, inSituTempC: depthM.map(() => 12.3) })).toEqual(depthM.map(() => 1));
  });
});

describe("rate of change", () => {
  it("makes a change beyond any halocline suspect, in both samples", () => {
    const practicalSalinity = [5, 5.1, 5.2, 30, 30.1, 30.2];
    const inSituTempC = practicalSalinity.map(() => 12);
    const depthM = [1, 2, 3, 3.5, 4.5, 5.5];
    const { flag, reasons } = preparedOf({ depthM, inSituTempC, practicalSalinity });
    expect([...flag]).toEqual([1, 1, 3, 3, 1, 1]);
    expect(reasons[2]).toEqual(["salinity changes by 24.8 within 0.5 m, between lines 4 and 5"]);
    expect(flagsOf({ depthM: [1, 2, 3, 5.4, 6.5, 7.5], inSituTempC, practicalSalinity })).toEqual([1, 1, 1, 1, 1, 1]);
  });

  it("allows for water that drifts past a resting probe", () => {
    const practicalSalinity = [5, 5.1, 9, 9.1, 9.2, 9.3];
    const columns = {
      depthM: [1, 2, 2.01, 3, 4, 5],
      inSituTempC: practicalSalinity.map(() => 12),
      practicalSalinity,
    };
    expect(flagsOf({ ...columns, timeS: [0, 1, 2, 3, 4, 5] })).toEqual([1, 3, 3, 1, 1, 1]);
    expect(flagsOf({ ...columns, timeS: [0, 1, 9, 10, 11, 12] })).toEqual([1, 1, 1, 1, 1, 1]);
  });
});
