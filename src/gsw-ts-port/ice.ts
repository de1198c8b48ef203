/**
 * Gibbs function of ice Ih, IAPWS R10-06 (2009), eq. 1 with the coefficients of table 2. Its temperature part is the real
 * part of a sum over two complex resonances t: r ((t-T) ln(t-T) + (t+T) ln(t+T) - 2 t ln t - T^2/t), T reduced.
 */
const TRIPLE_POINT_K = 273.16;
const TRIPLE_POINT_PA = 611.657;

/** Residual entropy, J/(kg K), on the scale of IAPWS-95 for liquid water. */
const RESIDUAL_ENTROPY = -0.332733756492168e4;

type Complex = readonly [re: number, im: number];

const T1: Complex = [0.368017112855051e-1, 0.510878114959572e-1];
const T2: Complex = [0.337315741065416, 0.335449415919309];
const R1: Complex = [0.447050716285388e2, 0.656876847463481e2];
const R20: Complex = [-0.72597457432922e2, -0.78100842711287e2];
const R21: Complex = [-0.557107698030123e-4, 0.464578634580806e-4];
const R22: Complex = [0.234801409215913e-10, -0.285651142904972e-10];

const multiply = (a: Complex, b: Complex): Complex => [a[0] * b[0] - a[1] * b[1], a[0] * b[1] + a[1] * b[0]];
const shift = (a: Complex, re: number): Complex => [a[0] + re, a[1]];
const logarithm = (a: Complex): Complex => [Math.log(Math.hypot(a[0], a[1])), Math.atan2(a[1], a[0])];
const divide = (re: number, a: Complex): Complex => {
  const square = a[0] * a[0] + a[1] * a[1];
  return [(re * a[0]) / square, (-re * a[1]) / square];
};

/** Real part of the resonance of strength r at t, for reduced temperature T, and of its slope with T. */
function resonance(r: Complex, t: Complex, T: number): readonly [value: number, slope: number] {
  const below = shift(t, -T);
  const above = shift(t, T);
  const lnBelow = logarithm(below);
  const lnAbove = logarithm(above);
  const at = multiply(t, logarithm(t));
  const a = multiply(below, lnBelow);
  const b = multiply(above, lnAbove);
  const c = divide(T, t);
  const value: Complex = [a[0] + b[0] - 2 * at[0] - T * c[0], a[1] + b[1] - 2 * at[1] - T * c[1]];
  const slope: Complex = [lnAbove[0] - lnBelow[0] - 2 * c[0], lnAbove[1] - lnBelow[1] - 2 * c[1]];
  return [multiply(r, value)[0], multiply(r, slope)[0]];
}

/** Specific Gibbs energy of ice (J/kg) and its slope with temperature, minus the specific entropy (J/(kg K)). */
export interface IceGibbs {
  readonly g: number;
  readonly perKelvin: number;
}

/**
 * @param temperatureK temperature, K (ITS-90)
 * @param seaPressurePa pressure above one standard atmosphere, Pa
 */
export function iceGibbs(temperatureK: number, seaPressurePa: number): IceGibbs {
  const T = temperatureK / TRIPLE_POINT_K;
  const z = seaPressurePa / TRIPLE_POINT_PA;
  const pressurePart =
    -0.632020233335886e6 +
    z * (0.655022213658955 + z * (-0.189369929326131e-7 + z * (0.339746123271053e-14 + z * -0.556464869058991e-21)));
  const R2: Complex = [R20[0] + z * (R21[0] + z * R22[0]), R20[1] + z * (R21[1] + z * R22[1])];
  const [first, firstSlope] = resonance(R1, T1, T);
  const [second, secondSlope] = resonance(R2, T2, T);
  return {
    g: pressurePart - RESIDUAL_ENTROPY * temperatureK + TRIPLE_POINT_K * (first + second),
    perKelvin: -RESIDUAL_ENTROPY + firstSlope + secondSlope,
  };
}
