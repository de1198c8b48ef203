/** A netCDF file as far as a table of samples needs it, whichever of its formats it was written in. */
export interface NetcdfFile {
  readonly attributes: Attributes;
  readonly variables: readonly NetcdfVariable[];
}

export type Attributes = Readonly<Record<string, string | number>>;

export interface NetcdfVariable {
  readonly name: string;
  readonly dimensions: readonly NetcdfDimension[];
  readonly attributes: Attributes;
  /** Last dimension fastest. */
  readonly values: () => ArrayLike<number | string>;
}

export interface NetcdfDimension {
  readonly name: string;
  readonly size: number;
}

export const sizeOf = (dimensions: readonly NetcdfDimension[]): number =>
  dimensions.reduce((product, dimension) => product * dimension.size, 1);

/** A text attribute; empty where there is none. */
export const textOf = (attributes: Attributes, name: string): string => {
  const value = attributes[name];
  return typeof value === "string" ? value.trim() : "";
};
