/**
 * Gibbs function of liquid water for oceanographic use, J/kg: the sum of ROWS[j][k] y^j z^k with y = t / 40 degC and
 * z = p / 10^4 dbar. From the freezing point to 40 degC and to 10^4 dbar. IAPWS SR7-09 (2009), table 2.
 */
const ROWS: readonly (readonly number[])[] = [
  [
    101.342743139674, 100015.695367145, -2544.5765420363, 284.517778446287, -33.3146754253611, 4.20263108803084,
    -0.546428511471039,
  ],
  [5.90578347909402, -270.983805184062, 776.153611613101, -196.51255088122, 28.9796526294175, -2.13290083518327],
  [-12357.785933039, 1455.0364540468, -756.558385769359, 273.479662323528, -55.5604063817218, 4.34420671917197],
  [736.741204151612, -672.50778314507, 499.360390819152, -239.545330654412, 48.8012518593872, -1.66307106208905],
  [-148.185936433658, 397.968445406972, -301.815380621876, 152.196371733841, -26.3748377232802],
  [58.0259125842571, -194.618310617595, 120.520654902025, -55.2723052340152, 6.48190668077221],
  [-18.9843846514172, 63.5113936641785, -22.2897317140459, 8.17060541818112],
  [3.05081646487967, -9.63108119393062],
];

export const HIGHEST_TEMPERATURE_POWER = ROWS.length - 1;

/** The highest power of z that goes with y^j; the saline part has none higher. */
export const HIGHEST_PRESSURE_POWER: readonly number[] = ROWS.map((row) => row.length - 1);

/** The same coefficients at index 10 j + k, so that an index reads as its two powers. */
export const WATER: readonly number[] = ROWS.flatMap((row) => [...row, ...Array<number>(10 - row.length).fill(0)]);
