import { expect, it } from "vitest";
import {
  defaultBasis,
  departureUncertaintyKPa,
  integrateCast,
  sampledProfile,
  uncertaintyOf,
} from "../../../../src/column/index.ts";
import { castOf } from "../../../support/cast-of.ts";

it("the departure is not as uncertain as gravity makes the pressure, for gravity is in the estimate too", () => {
  const cast = castOf({ depthM: [0, 20, 40], inSituTempC: [15, 12, 10], practicalSalinity: [5, 20, 30] });
  const outcome = integrateCast(cast, defaultBasis);
  if (!outcome.ok) throw new Error("no column");
  const profile = sampledProfile(outcome.value);
  const { combinedKPa, contributionKPa } = uncertaintyOf(outcome.value, cast);
  const ofDeparture = departureUncertaintyKPa(outcome.value, profile, combinedKPa);
  // Without a latitude gravity makes nearly all of the pressure's: 0.15 % of 400 kPa.
  expect(contributionKPa.gravity[3]!).toBeCloseTo(0.0015 * profile.gaugePressureKPa[3]!, 9);
  const others = Math.sqrt(combinedKPa[3]! ** 2 - contributionKPa.gravity[3]! ** 2);
  const left = 0.0015 * Math.abs(profile.departureKPa[3]!);
  expect(ofDeparture[3]!).toBeCloseTo(Math.hypot(others, left), 9);
  expect(ofDeparture[3]!).toBeLessThan(combinedKPa[3]!);
});
