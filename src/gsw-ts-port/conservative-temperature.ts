import { CONSERVATIVE_HEAT_CAPACITY } from "./constants.ts";
import { fillGibbs, type Isohaline, newIsohaline } from "./gibbs-saline.ts";
import { enthalpyAt, enthalpySlopeAt, fillIsobar, type Isobar, newIsobar, TEMPERATURE_SCALE_C } from "./isobar.ts";
import { newton } from "./newton.ts";
import { adiabaticTemperature, LAST_TEMPERATURE_STEP } from "./potential-temperature.ts";

const fromPotential = (surface: Isobar, pt0: number): number =>
  enthalpyAt(surface, pt0 / TEMPERATURE_SCALE_C) / CONSERVATIVE_HEAT_CAPACITY;

function toPotential(surface: Isobar, CT: number): number {
  const target = CONSERVATIVE_HEAT_CAPACITY * CT;
  const step = (y: number): number => (enthalpyAt(surface, y) - target) / enthalpySlopeAt(surface, y);
  return TEMPERATURE_SCALE_C * newton(CT / TEMPERATURE_SCALE_C, LAST_TEMPERATURE_STEP, step);
}

const surfaceIsobar = (SA: number): Isobar => fillIsobar(fillGibbs(SA, newIsohaline()), 0, newIsobar());

/**
 * Conservative temperature from potential temperature.
 *
 * @param SA absolute salinity, g/kg; below zero counts as zero
 * @param pt0 potential temperature referred to the surface, degC (ITS-90)
 * @returns degC; NaN in, NaN out
 * @see IOC, SCOR & IAPSO 2010, eq. 3.3.1: potential enthalpy over a fixed heat capacity
 */
export const conservativeTemperatureFromPotential = (SA: number, pt0: number): number =>
  fromPotential(surfaceIsobar(SA), pt0);

/**
 * Potential temperature, referred to the surface, from conservative temperature.
 *
 * @param SA absolute salinity, g/kg; below zero counts as zero
 * @param CT conservative temperature, degC
 * @returns degC (ITS-90), converged to 1e-13; NaN in, NaN out
 * @see IOC, SCOR & IAPSO 2010, eq. 3.3.1, solved by Newton's method
 */
export const potentialTemperatureFromConservative = (SA: number, CT: number): number =>
  toPotential(surfaceIsobar(SA), CT);

/**
 * Conservative temperature from in-situ temperature.
 *
 * @param SA absolute salinity, g/kg; below zero counts as zero
 * @param t in-situ temperature, degC (ITS-90)
 * @param p sea pressure, dbar
 * @returns degC; NaN in, NaN out
 * @see IOC, SCOR & IAPSO 2010, eqs 3.1.3 and 3.3.1
 * @example conservativeTemperature(20, 15, 50) // 15.347795795
 */
export const conservativeTemperature = (SA: number, t: number, p: number): number =>
  conservativeTemperatureOn(newWorkspace(), SA, t, p);

/**
 * In-situ temperature from conservative temperature.
 *
 * @param SA absolute salinity, g/kg; below zero counts as zero
 * @param CT conservative temperature, degC
 * @param p sea pressure, dbar
 * @returns degC (ITS-90), converged to 1e-13; NaN in, NaN out
 * @see IOC, SCOR & IAPSO 2010, eqs 3.1.3 and 3.3.1
 */
export const inSituTemperature = (SA: number, CT: number, p: number): number =>
  inSituTemperatureOn(newWorkspace(), SA, CT, p);

/** Conservative temperature (degC) of n samples of SA (g/kg), t (degC, in situ) and p (dbar); `out` may be an input. */
export function conservativeTemperatureInto(
  SA: Float64Array,
  t: Float64Array,
  p: Float64Array,
  out: Float64Array,
): Float64Array {
  const workspace = newWorkspace();
  for (let i = 0; i < out.length; i++) out[i] = conservativeTemperatureOn(workspace, SA[i]!, t[i]!, p[i]!);
  return out;
}

/** In-situ temperature (degC) of n samples of SA (g/kg), CT (degC) and p (dbar); `out` may be an input. */
export function inSituTemperatureInto(
  SA: Float64Array,
  CT: Float64Array,
  p: Float64Array,
  out: Float64Array,
): Float64Array {
  const workspace = newWorkspace();
  for (let i = 0; i < out.length; i++) out[i] = inSituTemperatureOn(workspace, SA[i]!, CT[i]!, p[i]!);
  return out;
}

/** Room for one sample's intermediate polynomials, lent to the kernels so that arrays of samples cost no allocation. */
interface Workspace {
  readonly gibbs: Isohaline;
  readonly surface: Isobar;
  readonly local: Isobar;
}

const newWorkspace = (): Workspace => ({ gibbs: newIsohaline(), surface: newIsobar(), local: newIsobar() });

function conservativeTemperatureOn({ gibbs, surface, local }: Workspace, SA: number, t: number, p: number): number {
  fillGibbs(SA, gibbs);
  fillIsobar(gibbs, 0, surface);
  fillIsobar(gibbs, p, local);
  return fromPotential(surface, adiabaticTemperature(local, surface, t));
}

function inSituTemperatureOn({ gibbs, surface, local }: Workspace, SA: number, CT: number, p: number): number {
  fillGibbs(SA, gibbs);
  fillIsobar(gibbs, 0, surface);
  fillIsobar(gibbs, p, local);
  return adiabaticTemperature(surface, local, toPotential(surface, CT));
}
