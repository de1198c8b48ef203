/**
 * Entropy of seawater as far as it decides potential temperature: the part that changes with temperature or pressure.
 * The terms are minus the temperature slope of the Gibbs function (IAPWS SR7-09 and R13-08), with x^2 = SA / SALINITY_SCALE,
 * y = t / 40 degC and z = p / 10^4 dbar. They are summed in the order of the standard's reference implementation, to the
 * same last bit: buoyancy frequency between samples a few centimetres apart hangs on the last bits of their temperatures.
 */

import { SALINITY_FACTOR } from "./constants.ts";

/** Temperature to y. */
const PER_40_C = 0.025;
/** Pressure to z. */
const PER_10000_DBAR = 1e-4;

/**
 * Temperature- and pressure-dependent part of specific entropy.
 *
 * @param SA absolute salinity, g/kg, not below zero
 * @param t in-situ temperature, degC (ITS-90)
 * @param p sea pressure, dbar
 * @returns J/(kg K); NaN in, NaN out
 */
export function entropyPart(SA: number, t: number, p: number): number {
  const x2 = SALINITY_FACTOR * SA;
  const x = Math.sqrt(x2);
  const y = t * PER_40_C;
  const z = p * PER_10000_DBAR;

  const w0 =
    z *
    (-270.983805184062 +
      z * (776.153611613101 + z * (-196.51255088122 + (28.9796526294175 - 2.13290083518327 * z) * z)));
  const w1 =
    -24715.571866078 +
    z *
      (2910.0729080936 +
        z * (-1513.116771538718 + z * (546.959324647056 + z * (-111.1208127634436 + 8.68841343834394 * z))));
  const w2 =
    2210.2236124548363 +
    z *
      (-2017.52334943521 +
        z * (1498.081172457456 + z * (-718.6359919632359 + (146.4037555781616 - 4.9892131862671505 * z) * z)));
  const w3 =
    -592.743745734632 +
    z * (1591.873781627888 + z * (-1207.261522487504 + (608.785486935364 - 105.4993508931208 * z) * z));
  const w4 =
    290.12956292128547 +
    z * (-973.091553087975 + z * (602.603274510125 + z * (-276.361526170076 + 32.40953340386105 * z)));
  const w5 =
    -113.90630790850321 +
    y * (21.35571525415769 - 67.41756835751434 * z) +
    z * (381.06836198507096 + z * (-133.7383902842754 + 49.023632509086724 * z));
  const water = w0 + y * (w1 + y * (w2 + y * (w3 + y * (w4 + y * w5))));

  const x4Terms =
    y * (-137.1145018408982 + y * (148.10030845687618 + y * (-68.5590309679152 + 12.4848504784754 * y))) -
    22.6683558512829 * z;
  const x3Terms =
    x * x4Terms +
    z * (-175.292041186547 + (83.1923927801819 - 29.483064349429 * z) * z) +
    y *
      (-86.1329351956084 +
        z * (766.116132004952 + z * (-108.3834525034224 + 51.2796974779828 * z)) +
        y * (-30.0682112585625 - 1380.9597954037708 * z + y * (3.50240264723578 + 938.26075044542 * z)));
  const s3 =
    365.7041791005036 +
    y * (-108.30162043765552 + 12.78101825083098 * y) +
    z * (-1190.914967948748 + (298.904564555024 - 145.9491676006352 * z) * z);
  const s2 =
    -675.802947790203 +
    y * s3 +
    z * (2082.7344423998043 + z * (-614.668925894709 + (340.685093521782 - 33.3848202979239 * z) * z));
  const s1 =
    1760.062705994408 +
    y * s2 +
    z *
      (-1721.528607567954 +
        z * (674.819060538734 + z * (-356.629112415276 + (88.4080716616 - 15.84003094423364 * z) * z)));
  const s0 =
    z *
    (729.116529735046 +
      z * (-343.956902961561 + z * (124.687671116248 + z * (-31.656964386073 + 7.04658803315449 * z))));
  const salt = x2 * (s0 + x * x3Terms + y * s1);

  return -(water + salt) * PER_40_C;
}

/**
 * The same at the surface.
 *
 * @param SA absolute salinity, g/kg, not below zero
 * @param pt0 potential temperature referred to the surface, degC
 * @returns J/(kg K); NaN in, NaN out
 */
export function entropyPartAtSurface(SA: number, pt0: number): number {
  const x2 = SALINITY_FACTOR * SA;
  const x = Math.sqrt(x2);
  const y = pt0 * PER_40_C;
  const water =
    y *
    (-24715.571866078 +
      y *
        (2210.2236124548363 +
          y * (-592.743745734632 + y * (290.12956292128547 + y * (-113.90630790850321 + y * 21.35571525415769)))));
  const x4Terms = y * (-137.1145018408982 + y * (148.10030845687618 + y * (-68.5590309679152 + 12.4848504784754 * y)));
  const x3Terms = x * x4Terms + y * (-86.1329351956084 + y * (-30.0682112585625 + y * 3.50240264723578));
  const x2Terms =
    y *
    (1760.062705994408 +
      y * (-675.802947790203 + y * (365.7041791005036 + y * (-108.30162043765552 + 12.78101825083098 * y))));
  return -(water + x2 * (x * x3Terms + x2Terms)) * PER_40_C;
}

/**
 * Temperature slope of entropy at the surface: heat capacity over absolute temperature.
 *
 * @param SA absolute salinity, g/kg, not below zero
 * @param pt0 potential temperature referred to the surface, degC
 * @returns J/(kg K2); NaN in, NaN out
 */
export function entropySlopeAtSurface(SA: number, pt0: number): number {
  const x2 = SALINITY_FACTOR * SA;
  const x = Math.sqrt(x2);
  const y = pt0 * PER_40_C;
  const water =
    -24715.571866078 +
    y *
      (4420.4472249096725 +
        y * (-1778.231237203896 + y * (1160.5182516851419 + y * (-569.531539542516 + y * 128.13429152494615))));
  const x4Terms = -137.1145018408982 + y * (296.20061691375236 + y * (-205.67709290374563 + 49.9394019139016 * y));
  const x3Terms = -86.1329351956084 + x * x4Terms + y * (-60.136422517125 + y * 10.50720794170734);
  const x2Terms =
    1760.062705994408 +
    x * x3Terms +
    y * (-1351.605895580406 + y * (1097.1125373015109 + y * (-433.20648175062206 + 63.905091254154904 * y)));
  return -(water + x2 * x2Terms) * 0.000625;
}
