import { GRAVITY_DEPTH_RATE, gravity, surfaceGravity } from "../gsw-ts-port/index.ts";

/** Conventional standard gravity (3rd CGPM, 1901): used at all depths where no latitude is known. */
export const STANDARD_GRAVITY_MS2 = 9.80665;

/** m/s2 at the water surface; latitude null: standard gravity. */
export const surfaceGravityMs2 = (latitudeDeg: number | null): number =>
  latitudeDeg === null ? STANDARD_GRAVITY_MS2 : surfaceGravity(latitudeDeg);

/** Gravity in m/s2 as a function of depth in m: g0(latitude) (1 + 2.26e-7 z); latitude null: standard gravity at all depths. */
export function gravityByDepth(latitudeDeg: number | null): (depthM: number) => number {
  if (latitudeDeg === null) return () => STANDARD_GRAVITY_MS2;
  const surfaceMs2 = surfaceGravity(latitudeDeg);
  return (depthM) => surfaceMs2 * (1 + GRAVITY_DEPTH_RATE * depthM);
}

/** m/s2 at a sea pressure in the standard ocean, as TEOS-10's buoyancy frequency wants it; latitude null: standard gravity. */
export const gravityAtPressureMs2 = (latitudeDeg: number | null, seaPressureDbar: number): number =>
  latitudeDeg === null ? STANDARD_GRAVITY_MS2 : gravity(latitudeDeg, seaPressureDbar);
