/** Places that are not on the Earth. */
import type { Issue } from "../../base/index.ts";
import type { MeasuredRows } from "./measured-rows.ts";

function offTheEarthIssue(words: string, degrees: Float64Array | null, largestDeg: number): Issue | null {
  const found = degrees?.find((value) => Math.abs(value) > largestDeg);
  if (found === undefined) return null;
  const message = `${words} ${found} is outside -${largestDeg} to ${largestDeg} degrees; not used; is it in degrees and decimals?`;
  return { severity: "warning", code: "off-the-earth", message };
}

export function checkPlaces(rows: MeasuredRows): readonly Issue[] {
  const issues = [
    offTheEarthIssue("latitude", rows.latitudeDeg, 90),
    offTheEarthIssue("longitude", rows.longitudeDeg, 180),
  ];
  return issues.filter((issue) => issue !== null);
}
