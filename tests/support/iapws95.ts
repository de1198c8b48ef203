import table from "./iapws95-coefficients.json";

/**
 * A function's value and its first and second derivatives with respect to reduced density and reduced inverse
 * temperature, so that the formulation can be written down just as it is printed.
 */
class Jet {
  readonly value: number;
  readonly d: number;
  readonly t: number;
  readonly dd: number;
  readonly dt: number;
  readonly tt: number;

  constructor(value: number, d = 0, t = 0, dd = 0, dt = 0, tt = 0) {
    this.value = value;
    this.d = d;
    this.t = t;
    this.dd = dd;
    this.dt = dt;
    this.tt = tt;
  }

  plus(other: Jet | number): Jet {
    if (typeof other === "number") return new Jet(this.value + other, this.d, this.t, this.dd, this.dt, this.tt);
    return new Jet(
      this.value + other.value,
      this.d + other.d,
      this.t + other.t,
      this.dd + other.dd,
      this.dt + other.dt,
      this.tt + other.tt,
    );
  }

  times(other: Jet | number): Jet {
    if (typeof other === "number") return this.times(new Jet(other));
    const [a, b] = [this, other];
    return new Jet(
      a.value * b.value,
      a.d * b.value + a.value * b.d,
      a.t * b.value + a.value * b.t,
      a.dd * b.value + 2 * a.d * b.d + a.value * b.dd,
      a.dt * b.value + a.d * b.t + a.t * b.d + a.value * b.dt,
      a.tt * b.value + 2 * a.t * b.t + a.value * b.tt,
    );
  }

  power(n: number): Jet {
    return n === 0
      ? new Jet(1)
      : this.#apply(this.value ** n, n * this.value ** (n - 1), n * (n - 1) * this.value ** (n - 2));
  }

  exp(): Jet {
    const e = Math.exp(this.value);
    return this.#apply(e, e, e);
  }

  #apply(f: number, f1: number, f2: number): Jet {
    return new Jet(
      f,
      f1 * this.d,
      f1 * this.t,
      f2 * this.d * this.d + f1 * this.dd,
      f2 * this.d * this.t + f1 * this.dt,
      f2 * this.t * this.t + f1 * this.tt,
    );
  }
}

const sum = (terms: readonly Jet[]): Jet => terms.reduce((total, term) => total.plus(term), new Jet(0));

/** The residual part of the dimensionless Helmholtz energy (IAPWS R6-95, eq. 6). */
function residual(delta: Jet, tau: Jet): Jet {
  const offset = delta.plus(-1);
  const square = offset.times(offset);
  return sum([
    ...table.polynomial.map(([n, d, t]) => delta.power(d!).times(tau.power(t!)).times(n!)),
    ...table.exponential.map(([n, d, t, c]) =>
      delta.power(d!).times(tau.power(t!)).times(delta.power(c!).times(-1).exp()).times(n!),
    ),
    ...table.gaussian.map(([n, d, t, alpha, epsilon, beta, gamma]) => {
      const x = delta.plus(-epsilon!);
      const y = tau.plus(-gamma!);
      const bell = x.times(x).times(-alpha!).plus(y.times(y).times(-beta!)).exp();
      return delta.power(d!).times(tau.power(t!)).times(bell).times(n!);
    }),
    ...table.nonAnalytic.map(([n, a, b, B, C, D, A, beta]) => {
      const theta = tau
        .times(-1)
        .plus(1)
        .plus(square.power(1 / (2 * beta!)).times(A!));
      const distance = theta.times(theta).plus(square.power(a!).times(B!));
      const y = tau.plus(-1);
      const psi = square.times(-C!).plus(y.times(y).times(-D!)).exp();
      return distance.power(b!).times(delta).times(psi).times(n!);
    }),
  ]);
}

/** Second derivative of the ideal-gas part with respect to tau (table 4). */
const idealCurvature = (tau: number): number =>
  table.idealExponential.reduce(
    (total, [n, gamma]) => {
      const e = Math.exp(-gamma! * tau);
      return total - (n! * gamma! * gamma! * e) / (1 - e) ** 2;
    },
    -table.idealLog / (tau * tau),
  );

/**
 * IAPWS-95: the truth for pure water, at absolute temperature (K) and density (kg/m3).
 * @returns absolute pressure p_MPa, isochoric heat capacity cv in kJ/(kg K), speed of sound w in m/s
 */
export function iapws95(temperatureK: number, rhoKgM3: number): { p_MPa: number; cv: number; w: number } {
  const delta = rhoKgM3 / table.criticalDensityKgM3;
  const tau = table.criticalTemperatureK / temperatureK;
  const r = residual(new Jet(delta, 1), new Jet(tau, 0, 1));
  const gas = table.gasConstantJKgK;
  const cv = -gas * tau * tau * (idealCurvature(tau) + r.tt);
  const p = rhoKgM3 * gas * temperatureK * (1 + delta * r.d);
  const stiffness = 1 + 2 * delta * r.d + delta * delta * r.dd;
  const heating = 1 + delta * r.d - delta * tau * r.dt;
  const w = Math.sqrt(gas * temperatureK * (stiffness + (heating * heating * gas) / cv));
  return { p_MPa: p / 1e6, cv: cv / 1e3, w };
}

/** Density in kg/m3 at absolute temperature (K) and absolute pressure (MPa), on the liquid side, by the secant rule. */
export function iapws95LiquidDensity(temperatureK: number, pressureMPa: number): number {
  let [a, b] = [1000, 1001];
  let excessA = iapws95(temperatureK, a).p_MPa - pressureMPa;
  for (let round = 0; round < 50 && Math.abs(b - a) > 1e-11; round++) {
    const excessB = iapws95(temperatureK, b).p_MPa - pressureMPa;
    const next = b - (excessB * (b - a)) / (excessB - excessA);
    a = b;
    excessA = excessB;
    b = next;
  }
  return b;
}
