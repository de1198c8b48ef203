/** IPTS-68 over ITS-90 temperature (Saunders 1990; good to 1 mK below 40 degC). Older equations of state want IPTS-68. */
const IPTS68_PER_ITS90 = 1.00024;

/** @param inSituTempC on ITS-90 */
export const ipts68FromIts90 = (inSituTempC: number): number => inSituTempC * IPTS68_PER_ITS90;
