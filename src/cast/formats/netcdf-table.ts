/**
 * A netCDF file with CF conventions as a table of samples: a column a variable, a row a sample. Profiles, trajectories and
 * time series of profiles, as full grids or as ragged arrays (CF 1.11, chapter 9).
 */
import {
  type Attributes,
  type NetcdfDimension,
  type NetcdfFile,
  type NetcdfVariable,
  sizeOf,
  textOf,
} from "./netcdf-file.ts";

export interface NetcdfTable {
  readonly headers: readonly string[];
  readonly units: readonly string[];
  /** Cells as text at full precision, empty where missing; row by row. */
  readonly rows: readonly (readonly string[])[];
}

/** Where a variable has its value for each row of the table. */
type Place = (row: number) => number;

interface TableShape {
  readonly rowCount: number;
  /** For the dimensions that a row fixes: the index along each. */
  readonly indexAlong: ReadonlyMap<string, Place>;
}

const isTextAxis = (variable: NetcdfVariable, values: ArrayLike<number | string>): boolean =>
  typeof values[0] === "string" && variable.dimensions.length > 0 && values[0].length <= 1;

/** A character array is a list of texts: its last dimension counts characters. */
function asTexts(variable: NetcdfVariable): NetcdfVariable {
  const values = variable.values();
  if (!isTextAxis(variable, values)) return { ...variable, values: () => values };
  const length = variable.dimensions.at(-1)!.size;
  const characters = Array.from(values, String);
  const texts = Array.from({ length: Math.floor(characters.length / Math.max(length, 1)) }, (_, i) =>
    characters
      .slice(i * length, (i + 1) * length)
      .join("")
      .replaceAll("\0", "")
      .trim(),
  );
  return { ...variable, dimensions: variable.dimensions.slice(0, -1), values: () => texts };
}

const isNumeric = (variable: NetcdfVariable): boolean => typeof variable.values()[0] === "number";

const attributed = (variables: readonly NetcdfVariable[], attribute: string): NetcdfVariable | undefined =>
  variables.find(({ attributes }) => textOf(attributes, attribute) !== "");

/** The samples of a ragged array where the file says so; else the grid of most axes, of most variables, of most values. */
function sampleGrid(variables: readonly NetcdfVariable[]): readonly NetcdfDimension[] {
  const counted = textOf(attributed(variables, "sample_dimension")?.attributes ?? {}, "sample_dimension");
  const pointing = attributed(variables, "instance_dimension")?.dimensions[0]?.name;
  const sampleName = counted || pointing;
  const grids = new Map<string, { readonly dimensions: readonly NetcdfDimension[]; count: number }>();
  for (const { dimensions } of variables.filter(isNumeric)) {
    const key = dimensions.map(({ name }) => name).join(" ");
    const known = grids.get(key);
    if (known) known.count++;
    else grids.set(key, { dimensions, count: 1 });
  }
  const told = sampleName === undefined ? undefined : grids.get(sampleName);
  const sorted = [...grids.values()].sort(
    (a, b) =>
      b.dimensions.length - a.dimensions.length || b.count - a.count || sizeOf(b.dimensions) - sizeOf(a.dimensions),
  );
  return (told ?? sorted[0])?.dimensions ?? [];
}

/** Along a ragged array: which feature (profile) each sample belongs to. */
function featureOfSample(
  variables: readonly NetcdfVariable[],
  sample: NetcdfDimension,
): { feature: string; of: Place } | null {
  const counts = variables.find((variable) => textOf(variable.attributes, "sample_dimension") === sample.name);
  if (counts?.dimensions[0]) {
    const owner: number[] = [];
    Array.from(counts.values(), Number).forEach((count, feature) => {
      for (let k = 0; k < count && owner.length < sample.size; k++) owner.push(feature);
    });
    return { feature: counts.dimensions[0].name, of: (row) => owner[row] ?? Number.NaN };
  }
  const index = attributed(variables, "instance_dimension");
  if (index && index.dimensions[0]?.name === sample.name) {
    const values = index.values();
    return { feature: textOf(index.attributes, "instance_dimension"), of: (row) => Number(values[row]) };
  }
  return null;
}

function shapeOf(variables: readonly NetcdfVariable[]): TableShape {
  const grid = sampleGrid(variables);
  const indexAlong = new Map<string, Place>();
  let stride = 1;
  for (const { name, size } of [...grid].reverse()) {
    const step = stride;
    indexAlong.set(name, (row) => Math.floor(row / step) % size);
    stride *= size;
  }
  const [only] = grid;
  const ragged = only && grid.length === 1 ? featureOfSample(variables, only) : null;
  if (ragged) indexAlong.set(ragged.feature, ragged.of);
  return { rowCount: sizeOf(grid), indexAlong };
}

/** Where a variable's values stand row by row; null where it lives on something else. */
function placeOf(variable: NetcdfVariable, { indexAlong }: TableShape): Place | null {
  const axes = variable.dimensions.map(({ name, size }) => ({ along: indexAlong.get(name), size }));
  if (axes.some(({ along }) => along === undefined)) return null;
  return (row) => axes.reduce((index, { along, size }) => index * size + along!(row), 0);
}

const EPOCH = /^\s*(seconds?|secs?|s|minutes?|mins?|hours?|hrs?|h|days?|d)\s+since\s+(.+)$/i;
const SECONDS_OF: Readonly<Record<string, number>> = { s: 1, m: 60, h: 3600, d: 86_400 };

/** A reader of "days since 1970-01-01" and the like, to ISO 8601; null where the unit is none of these. */
function timeReader(units: string): ((value: number) => string) | null {
  const [, unit = "", origin = ""] = EPOCH.exec(units) ?? [];
  const [, date, clock = "00:00:00"] = /^(\d{4}-\d{1,2}-\d{1,2})(?:[T ]+([\d:.]+))?/.exec(origin.trim()) ?? [];
  if (date === undefined) return null;
  const padded = date.replace(/-(\d)(?=-|$)/g, "-0$1");
  const start = Date.parse(`${padded}T${/^\d{1,2}$/.test(clock) ? `${clock.padStart(2, "0")}:00` : clock}Z`);
  const scale = SECONDS_OF[unit[0]!.toLowerCase()]! * 1000;
  return (value) => {
    // To the nearest 10 ms: a day fraction in double precision is no better.
    const moment = new Date(Math.round((start + value * scale) / 10) * 10);
    return Number.isNaN(moment.getTime()) ? "" : moment.toISOString().replace(/\.?0*Z$/, "");
  };
}

const isFill = (value: number, attributes: Attributes): boolean =>
  !Number.isFinite(value) || value === attributes._FillValue || value === attributes.missing_value;

/** One value as a cell: unpacked, in full, empty where the file says it is missing. */
function cellReader(variable: NetcdfVariable): (value: number | string | undefined) => string {
  const { attributes } = variable;
  const toTime = timeReader(textOf(attributes, "units"));
  const scale = typeof attributes.scale_factor === "number" ? attributes.scale_factor : 1;
  const offset = typeof attributes.add_offset === "number" ? attributes.add_offset : 0;
  return (value) => {
    if (value === undefined) return "";
    if (typeof value === "string") return value;
    if (isFill(value, attributes)) return "";
    return toTime ? toTime(value) : String(scale === 1 && offset === 0 ? value : value * scale + offset);
  };
}

/** What a column is called: what the file says the variable is, else its own name. */
function headerOf({ name, attributes }: NetcdfVariable): string {
  const role = textOf(attributes, "cf_role");
  if (role === "profile_id") return "cast";
  if (role === "timeseries_id") return "station";
  return textOf(attributes, "standard_name") || name;
}

export function netcdfTable(file: NetcdfFile): NetcdfTable {
  const variables = file.variables.map(asTexts);
  const shape = shapeOf(variables);
  const columns = variables.flatMap((variable) => {
    const place = placeOf(variable, shape);
    // What counts or points is not a measurement.
    const isStructure = "sample_dimension" in variable.attributes || "instance_dimension" in variable.attributes;
    if (place === null || isStructure) return [];
    const values = variable.values();
    const cell = cellReader(variable);
    const units = textOf(variable.attributes, "units");
    return [
      {
        header: headerOf(variable),
        units: EPOCH.test(units) ? "" : units,
        isOnGrid: variable.dimensions.length > 0 && sizeOf(variable.dimensions) === shape.rowCount,
        cell: (row: number) => cell(values[place(row)]),
      },
    ];
  });
  const measured = columns.filter((column) => column.isOnGrid);
  const rows: string[][] = [];
  for (let row = 0; row < shape.rowCount; row++) {
    // A grid of profiles of unequal length is filled up with missing values.
    if (measured.some((column) => column.cell(row) !== "")) rows.push(columns.map((column) => column.cell(row)));
  }
  return { headers: columns.map((column) => column.header), units: columns.map((column) => column.units), rows };
}
