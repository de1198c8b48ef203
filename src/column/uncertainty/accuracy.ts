/** A practical salinity (PSS-78) has no unit, so its type says what its name cannot. */
type PracticalSalinity = number;

/**
 * How well everything behind a pressure is known: standard uncertainties (k = 1; a maker's limits over the square root
 * of 3). Random: independent from sample to sample. Systematic: one error, the same along the whole cast, which no
 * number of samples averages out.
 */
export interface Accuracy {
  readonly randomTempC: number;
  readonly systematicTempC: number;
  /** Counts where salinity itself is what the file holds. */
  readonly randomSalinity: PracticalSalinity;
  readonly systematicSalinity: PracticalSalinity;
  /** Counts where salinity was never measured and the basis's own number stands in for it; systematic. */
  readonly unmeasuredSalinity: PracticalSalinity;
  /** Counts where salinity comes from conductivity or specific conductance: of the conductivity in situ. */
  readonly randomConductivityMsCm: number;
  readonly systematicConductivityMsCm: number;
  /** Counts where depth was measured: of the depth of each sample. */
  readonly randomDepthM: number;
  /** Counts where depth was measured: common to all samples of the cast, as where the zero was set in a swell. */
  readonly systematicDepthM: number;
  /** Counts where pressure was measured, or depth made from it. */
  readonly randomSeaPressureDbar: number;
  readonly systematicSeaPressureDbar: number;
  /** Error of scale of depth or sea pressure, whichever was measured. */
  readonly depthScaleFrac: number;
  /** How well a level stands where it is said to stand. */
  readonly levelDepthM: number;
  /** Null: 0.15 % where no latitude is known, else 0.01 %. */
  readonly gravityFrac: number | null;
  /** Of the air pressure at the water surface; in absolute pressure alone. */
  readonly airPressureKPa: number;
  /** Of the equation of state: how far its density lies from that of water of the very salinity and temperature. */
  readonly equationOfStateKgM3: number;
  /** Of the salt's composition: how far absolute salinity may lie from that of sea salt, as a share of itself. */
  readonly compositionFrac: number;
}

/** An assumption in the words of a report: why its default is what it is, and where it no longer holds. */
export interface AccuracyReason {
  readonly reason: string;
  readonly limits: string;
}

export const defaultAccuracy: Accuracy = {
  randomTempC: 0.01,
  systematicTempC: 0.02,
  randomSalinity: 0.02,
  systematicSalinity: 0.05,
  unmeasuredSalinity: 0.2,
  randomConductivityMsCm: 0.02,
  systematicConductivityMsCm: 0.05,
  randomDepthM: 0.02,
  systematicDepthM: 0.05,
  randomSeaPressureDbar: 0.01,
  systematicSeaPressureDbar: 0.05,
  depthScaleFrac: 0.002,
  levelDepthM: 0.02,
  gravityFrac: null,
  airPressureKPa: 1,
  equationOfStateKgM3: 0.004,
  compositionFrac: 0.001,
};

/** Of gravity as a share of itself: between equator and pole standard gravity is off by up to 0.27 %. */
export const UNPLACED_GRAVITY_FRAC = 0.0015;
/** At a known latitude: anomalies of 0.001 m/s2, and surfaces up to 300 m above the sea. */
export const PLACED_GRAVITY_FRAC = 1e-4;

/** Why each default is what it is, and where another number is due. */
export const accuracyReasons: Readonly<Record<keyof Accuracy, AccuracyReason>> = {
  randomTempC: {
    reason: "last digit and noise of a multi-parameter sonde",
    limits: "fast lowering through a thermocline: more",
  },
  systematicTempC: {
    reason: "a sonde within its yearly calibration",
    limits: "a calibrated CTD: 0.002; a bucket thermometer: 0.2",
  },
  randomSalinity: {
    reason: "noise of a sonde, mismatch of its temperature and conductivity",
    limits: "spikes in a halocline: more",
  },
  systematicSalinity: {
    reason: "a sonde within its calibration in brackish water",
    limits: "a calibrated CTD: 0.003; an uncleaned cell: 0.5",
  },
  unmeasuredSalinity: { reason: "rivers and lakes hold 0.05 to 0.5", limits: "salt lakes and estuaries: measure it" },
  randomConductivityMsCm: { reason: "noise of a sonde", limits: "bubbles and weed at the cell: more" },
  systematicConductivityMsCm: {
    reason: "a calibrated cell in brackish water",
    limits: "sea water by a sonde at 0.5 % of reading: 0.15",
  },
  randomDepthM: { reason: "reading of a marked line, or the swell", limits: "a boat that rolls: 0.1" },
  systematicDepthM: {
    reason: "where on the probe the depth is counted from, and its zero",
    limits: "no zero taken at the surface: 0.3",
  },
  randomSeaPressureDbar: { reason: "noise of a strain gauge", limits: "a surf zone: more" },
  systematicSeaPressureDbar: { reason: "zero taken in air, weather since", limits: "no zero taken: 0.3" },
  depthScaleFrac: { reason: "0.2 % of depth or of full scale", limits: "a line that stretches or drifts off: 0.02" },
  levelDepthM: {
    reason: "a levelled or taped installation",
    limits: "set by echo sounder or by a mooring line: 0.1 to 0.5",
  },
  gravityFrac: {
    reason: "0.01 % by latitude, 0.15 % without one",
    limits: "a lake surface above 300 m: 0.03 % a kilometre",
  },
  airPressureKPa: { reason: "weather moves the air by 1 kPa", limits: "a barometer at the site: 0.05" },
  equationOfStateKgM3: {
    reason: "spread of densities measured in brackish water about the standard",
    limits: "brines: more",
  },
  compositionFrac: { reason: "sea salt, diluted", limits: "rivers, lakes and reservoirs of other salts: 0.2" },
};
