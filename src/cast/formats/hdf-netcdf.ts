import type { Dataset, Group } from "h5wasm";
import { checkHeaps } from "./hdf-heaps.ts";
import type { Attributes, NetcdfFile } from "./netcdf-file.ts";
import { sizeOf } from "./netcdf-file.ts";

/** A dataset may be compressed this many times; a header that promises more is not believed. */
const MOST_COMPRESSED = 1000;

/** The library keeps files by name in a file system of its own. */
const SCRATCH_NAME = "/file-in-hand.nc";

/** Whole numbers, floating-point numbers and texts, as HDF5 counts its kinds of data. */
const PLAIN_KINDS = [0, 1, 3];

/** Lists of lists and references, whose lengths a damaged file may state at will, are not looked into. */
const isPlain = (metadata: { readonly type: number } | null): boolean =>
  metadata !== null && PLAIN_KINDS.includes(metadata.type);

function attributesOf(dataset: Dataset | Group): Attributes {
  const found: Record<string, string | number> = {};
  for (const [name, attribute] of Object.entries(dataset.attrs)) {
    if (!isPlain(attribute.metadata)) continue;
    const { value } = attribute;
    const first = Array.isArray(value) || ArrayBuffer.isView(value) ? (value as ArrayLike<unknown>)[0] : value;
    if (typeof first === "string" || typeof first === "number") found[name] = first;
    else if (typeof first === "bigint") found[name] = Number(first);
  }
  return found;
}

/** A dimension that is no variable is kept as a dataset of zeros under this name. */
const EMPTY_DIMENSION = /^This is a netCDF dimension but not a netCDF variable/;

const lastPart = (path: string): string => path.slice(path.lastIndexOf("/") + 1);

/** Dimensions have their names from the scales attached to them; a scale is its own. */
function dimensionsOf(dataset: Dataset): NetcdfFile["variables"][number]["dimensions"] {
  const shape = dataset.shape ?? [];
  return shape.map((size, axis) => {
    const [scale] = dataset.get_attached_scales(axis);
    const own = shape.length === 1 ? lastPart(dataset.path) : `${lastPart(dataset.path)} axis ${axis}`;
    return { name: scale === undefined ? own : lastPart(scale), size };
  });
}

/** Reads netCDF-4, which is HDF5, from its root group. Throws where the header promises what the file cannot hold. */
export async function readHdfNetcdf(bytes: Uint8Array): Promise<NetcdfFile> {
  checkHeaps(bytes);
  const h5wasm = await import("h5wasm");
  const module = await h5wasm.ready;
  module.activate_throwing_error_handler();
  module.FS.writeFile(SCRATCH_NAME, bytes);
  const file = new h5wasm.File(SCRATCH_NAME, "r");
  try {
    const datasets = file.keys().flatMap((name) => {
      const item = file.get(name);
      const isVariable =
        item instanceof h5wasm.Dataset &&
        isPlain(item.metadata) &&
        !EMPTY_DIMENSION.test(String(item.attrs.NAME?.value ?? ""));
      return isVariable ? [item] : [];
    });
    return {
      attributes: attributesOf(file),
      // The values are taken now: the file is closed when this returns.
      variables: datasets.map((dataset) => {
        const dimensions = dimensionsOf(dataset);
        if (!(sizeOf(dimensions) <= bytes.length * MOST_COMPRESSED))
          throw new Error(`${dataset.path} is said to hold more than the whole file can`);
        const values = plainValues(dataset.value);
        return { name: lastPart(dataset.path), dimensions, attributes: attributesOf(dataset), values: () => values };
      }),
    };
  } finally {
    file.close();
    module.FS.unlink(SCRATCH_NAME);
  }
}

function plainValues(value: unknown): ArrayLike<number | string> {
  if (typeof value === "number" || typeof value === "string") return [value];
  if (typeof value === "bigint") return [Number(value)];
  if (value instanceof BigInt64Array || value instanceof BigUint64Array) return Array.from(value, Number);
  if (ArrayBuffer.isView(value) || Array.isArray(value)) return value as unknown as ArrayLike<number | string>;
  return [];
}
