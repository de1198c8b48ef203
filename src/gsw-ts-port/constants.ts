/** Absolute salinity of standard ocean water (SP 35), g/kg. Millero et al. 2008, table 4. */
export const STANDARD_OCEAN_SALINITY = 35.16504;

/** Absolute salinity of reference-composition seawater per unit of practical salinity, g/kg. */
export const SALINITY_UNIT = STANDARD_OCEAN_SALINITY / 35;

/** Salinity at which the reduced root salinity sqrt(SA / SALINITY_SCALE) is 1, g/kg: that of SP 40. */
export const SALINITY_SCALE = 40 * SALINITY_UNIT;

/** One over SALINITY_SCALE as the standard's polynomials round it; more digits would change the last bits of results. */
export const SALINITY_FACTOR = 0.0248826675584615;

/** The fixed "heat capacity" that turns potential enthalpy into conservative temperature, J/(kg K). IOC et al. 2010, eq. 3.3.3. */
export const CONSERVATIVE_HEAT_CAPACITY = 3991.86795711963;

/** 0 degC in kelvin. */
export const CELSIUS_ZERO_K = 273.15;

/** One standard atmosphere, Pa: absolute pressure at sea pressure 0. */
export const STANDARD_ATMOSPHERE_PA = 101325;

export const PA_PER_DBAR = 1e4;

/** Conductivity of seawater of SP 35 at 15 degC (IPTS-68) and sea pressure 0, mS/cm: the convention that belongs to PSS-78. */
export const STANDARD_CONDUCTIVITY_MS_CM = 42.914;

/** Temperature on the scale of 1968 per degC on that of 1990; good to 1 mK below 40 degC. Saunders 1990. */
export const IPTS68_PER_ITS90 = 1.00024;
