/*
 * What is said of the layering of one column. Plain data, so that it can be handed between threads. A thing that does
 * not exist is null or left out of its list; inside typed arrays it is NaN.
 *
 * Density here is potential density: each sample moved without exchange of heat or salt to the pressure halfway down the
 * column, so that compressibility, which would make any water look stable, is left out. Depths are m below the surface.
 */

/** Speeds along one direction, for Richardson and Froude numbers. */
export interface VelocityProfile {
  /** Increasing, below the water surface. */
  readonly depthM: ArrayLike<number>;
  /** Positive one way, negative the other. */
  readonly velocityMs: ArrayLike<number>;
}

/** How far water may differ from the first sample and still count as mixed with it. */
export type MixedLayerThreshold =
  | { readonly quantity: "density"; readonly stepKgM3: number }
  | { readonly quantity: "temperature"; readonly stepC: number };

export interface StratificationOptions {
  readonly mixedLayerThreshold: MixedLayerThreshold;
  /** Gradient of smoothed density at which the mixed layer ends by the second opinion. */
  readonly mixedLayerGradientKgM3PerM: number;
  /** Length over which density is averaged for the smoothed buoyancy frequency. */
  readonly smoothingLengthM: number;
  /** A peak of the smoothed buoyancy frequency squared is a pycnocline if it stands out by more than this share of the highest. */
  readonly prominenceFrac: number;
  readonly modeCount: number;
  /** Density differences up to this are noise: no inversion, no layering. */
  readonly densityNoiseKgM3: number;
  readonly velocity: VelocityProfile | null;
}

/** Buoyancy frequency squared at some depths. */
export interface BuoyancyProfile {
  readonly depthM: Float64Array;
  readonly squaredPerS2: Float64Array;
}

export interface Stability {
  /** Neutral: all of its water is equally heavy, up to noise. Unstable: somewhere water lies over lighter water, by more than noise. */
  readonly verdict: "stable" | "neutral" | "unstable";
  /** Heaviest less lightest sample. */
  readonly rhoRangeKgM3: number;
  /** Where density falls downward most, by however little; null where it never falls. */
  readonly greatestInversion: Inversion | null;
  /** Share of the sampled depth with heavier water above it, by more than noise. */
  readonly unstableFrac: number;
}

/** Heavy water over light. */
export interface Inversion {
  readonly heavyDepthM: number;
  readonly lightDepthM: number;
  /** Heavy less light. */
  readonly excessKgM3: number;
}

/** The samples put in order of density (Thorpe 1977). */
export interface ThorpeSorting {
  /** Per sample: the depth it would sort to less its own. */
  readonly displacementM: Float64Array;
  readonly rmsDisplacementM: number;
  /** From the top. */
  readonly overturns: readonly Overturn[];
}

/** A stretch of samples that sorting only exchanges among themselves. */
export interface Overturn {
  readonly fromDepthM: number;
  readonly toDepthM: number;
  readonly sampleCount: number;
  /** Most neighbouring samples that are displaced the same way. */
  readonly runLengthCount: number;
  /** Root mean square of what sorting changes in density. */
  readonly rmsRhoChangeKgM3: number;
  /** Three samples or more, and a change of density above the noise. */
  readonly exceedsNoise: boolean;
}

/** Where a mixed layer ends; at the bottom of the column where its criterion is never met. */
export interface MixedLayerEnd {
  readonly depthM: number;
  readonly reachesBottom: boolean;
}

export interface MixedLayer {
  /** The first sample, which the threshold counts from. */
  readonly referenceDepthM: number;
  readonly byThreshold: MixedLayerEnd;
  /** The second opinion. */
  readonly byGradient: MixedLayerEnd;
}

/** A peak of the smoothed buoyancy frequency. */
export interface Pycnocline {
  readonly depthM: number;
  readonly peakSquaredPerS2: number;
  /** 2 pi over the buoyancy frequency of the peak. */
  readonly bruntPeriodS: number;
  /** By how much the peak stands out, over the highest peak. */
  readonly prominenceFrac: number;
  /** Density gained between the troughs of buoyancy frequency on either side. */
  readonly rhoStepKgM3: number;
  /** Where 15 % and 85 % of that gain are reached, and the distance between them. */
  readonly topDepthM: number;
  readonly bottomDepthM: number;
  readonly thicknessM: number;
}

/** Centre and root-mean-square width of the buoyancy frequency squared of the sorted column. */
export interface StratificationMoments {
  readonly centroidDepthM: number;
  readonly rmsWidthM: number;
}

export interface LayerDensities {
  readonly upperRhoKgM3: number;
  readonly lowerRhoKgM3: number;
  /** g (lower less upper) / lower. */
  readonly reducedGravityMs2: number;
}

/** Speeds of long waves on two layers. */
export interface TwoLayerWaves {
  /** Internal, the water surface held flat. */
  readonly rigidLidMs: number;
  /** Internal, the water surface free. */
  readonly freeSurfaceMs: number;
  /** Of the tide and other waves that move the whole depth. */
  readonly externalMs: number;
}

/** Two mixed layers that stand for the column, meeting at its main pycnocline. */
export interface TwoLayers {
  readonly upperThicknessM: number;
  readonly lowerThicknessM: number;
  /** Depth means of the measured column: its mass is kept. */
  readonly means: LayerDensities;
  /** Its mass and its potential energy anomaly are kept. */
  readonly energyKept: LayerDensities;
  /** Of the layers of mean density. */
  readonly waves: TwoLayerWaves;
}

export interface VerticalModes {
  /** Long-wave speed of the first, second ... internal mode; fewer than asked for where the column has no more. */
  readonly speedMs: Float64Array;
  /** First speed over the Coriolis parameter; null without a latitude and at the equator. */
  readonly deformationRadiusM: number | null;
}

/** Stratification against shear. */
export interface FlowNumbers {
  /** Midway between neighbouring velocities; NaN where they do not differ. */
  readonly depthM: Float64Array;
  readonly gradientRichardsonRatio: Float64Array;
  /** Of the two layers; null where there is only one. */
  readonly layers: LayerFlow | null;
}

export interface LayerFlow {
  readonly upperVelocityMs: number;
  readonly lowerVelocityMs: number;
  /** Null where both layers move alike. */
  readonly bulkRichardsonRatio: number | null;
  readonly upperFroudeSquaredRatio: number;
  readonly lowerFroudeSquaredRatio: number;
  /** Sum of both; 1 is critical. */
  readonly compositeFroudeSquaredRatio: number;
}

export interface Stratification {
  readonly options: StratificationOptions;
  /** The pressure that samples are moved to before their densities are compared. */
  readonly referenceSeaPressureDbar: number;
  /** Per sample. */
  readonly potentialRhoKgM3: Float64Array;
  readonly stability: Stability;
  readonly buoyancy: {
    /** Between samples as measured; negative where unstable. */
    readonly raw: BuoyancyProfile;
    /** Between samples in order of density. */
    readonly sorted: BuoyancyProfile;
    /** The sorted column averaged over the smoothing length, evenly from surface to bottom. */
    readonly smoothed: BuoyancyProfile;
  };
  readonly thorpe: ThorpeSorting;
  readonly mixedLayer: MixedLayer;
  /** The main one, with the greatest gain in density, first; none in neutral water. */
  readonly pycnoclines: readonly Pycnocline[];
  /** Null in neutral water, like everything below but the energy. */
  readonly moments: StratificationMoments | null;
  /** Work per volume that mixing the column would take; negative where that would set energy free. */
  readonly potentialEnergyAnomalyJM3: number;
  readonly twoLayers: TwoLayers | null;
  readonly modes: VerticalModes | null;
  /** Null where no velocities were given. */
  readonly flow: FlowNumbers | null;
}
