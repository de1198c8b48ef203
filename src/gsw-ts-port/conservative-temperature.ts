import { CONSERVATIVE_HEAT_CAPACITY, SALINITY_FACTOR } from "./constants.ts";
import { fillGibbs, type Isohaline, newIsohaline } from "./gibbs-saline.ts";
import { enthalpyAt, enthalpySlopeAt, fillIsobar, type Isobar, newIsobar, TEMPERATURE_SCALE_C } from "./isobar.ts";
import { newton } from "./newton.ts";
import { adiabaticTemperature, LAST_TEMPERATURE_STEP, surfacePotentialTemperature } from "./potential-temperature.ts";

function toPotential(surface: Isobar, CT: number): number {
  const target = CONSERVATIVE_HEAT_CAPACITY * CT;
  const step = (y: number): number => (enthalpyAt(surface, y) - target) / enthalpySlopeAt(surface, y);
  return TEMPERATURE_SCALE_C * newton(CT / TEMPERATURE_SCALE_C, LAST_TEMPERATURE_STEP, step);
}

const surfaceIsobar = (SA: number): Isobar => fillIsobar(fillGibbs(SA, newIsohaline()), 0, newIsobar());

/**
 * Conservative temperature from potential temperature: potential enthalpy over a fixed heat capacity. The terms are the
 * surface enthalpy that follows from the Gibbs function (IAPWS SR7-09 and R13-08), summed in the order of the reference.
 *
 * @param SA absolute salinity, g/kg; below zero counts as zero
 * @param pt0 potential temperature referred to the surface, degC (ITS-90)
 * @returns degC; NaN in, NaN out
 * @see IOC, SCOR & IAPSO 2010, eq. 3.3.1
 */
export function conservativeTemperatureFromPotential(SA: number, pt0: number): number {
  const x2 = SALINITY_FACTOR * Math.max(SA, 0);
  const x = Math.sqrt(x2);
  const y = pt0 * 0.025;
  const water =
    61.01362420681071 +
    y *
      (168776.46138048015 +
        y *
          (-2735.2785605119625 +
            y *
              (2574.2164453821433 +
                y *
                  (-1536.6644434977543 + y * (545.7340497931629 + (-50.91091728474331 - 18.30489878927802 * y) * y)))));
  const x2Terms =
    268.5520265845071 +
    y *
      (-12019.028203559312 +
        y *
          (3734.858026725145 +
            y * (-2046.7671145057618 + y * (465.28655623826234 + (-0.6370820302376359 - 10.650848542359153 * y) * y))));
  const x3Terms =
    937.2099110620707 +
    y * (588.1802812170108 + y * (248.39476522971285 + (-3.871557904936333 - 2.6268019854268356 * y) * y));
  const x4Terms =
    -1687.914374187449 +
    x * (246.9598888781377 + x * (123.59576582457964 - 48.5891069025409 * x)) +
    y *
      (936.3206544460336 +
        y * (-942.7827304544439 + y * (369.4389437509002 + (-33.83664947895248 - 9.987880382780322 * y) * y)));
  const potentialEnthalpy = water + x2 * (x2Terms + x * (x3Terms + x * x4Terms));
  return potentialEnthalpy / CONSERVATIVE_HEAT_CAPACITY;
}

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
  conservativeTemperatureFromPotential(SA, surfacePotentialTemperature(SA, t, p));

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
  for (let i = 0; i < out.length; i++) out[i] = conservativeTemperature(SA[i]!, t[i]!, p[i]!);
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

function inSituTemperatureOn({ gibbs, surface, local }: Workspace, SA: number, CT: number, p: number): number {
  fillGibbs(SA, gibbs);
  fillIsobar(gibbs, 0, surface);
  fillIsobar(gibbs, p, local);
  return adiabaticTemperature(surface, local, toPotential(surface, CT));
}
