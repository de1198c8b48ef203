import type { Attributes, NetcdfFile } from "./netcdf-file.ts";
import { sizeOf } from "./netcdf-file.ts";

const BYTES_OF: Readonly<Record<string, number>> = { byte: 1, char: 1, short: 2, int: 4, float: 4, double: 8 };

interface ListedAttribute {
  readonly name: string;
  readonly value: unknown;
}

const attributesOf = (listed: readonly ListedAttribute[]): Attributes =>
  Object.fromEntries(
    listed.flatMap(({ name, value }) => {
      const first = Array.isArray(value) ? value[0] : value;
      return typeof first === "string" || typeof first === "number" ? [[name, first]] : [];
    }),
  );

/** Reads netCDF classic and 64-bit offset. Throws where the header promises more than the file holds. */
export async function readClassicNetcdf(bytes: Uint8Array): Promise<NetcdfFile> {
  const { NetCDFReader } = await import("netcdfjs");
  const reader = new NetCDFReader(bytes);
  const dimensions = reader.dimensions.map(({ name, size }) => ({
    name,
    // The record dimension is written with size 0; its length stands in the header.
    size: name === reader.recordDimension.name ? reader.recordDimension.length : size,
  }));
  return {
    attributes: attributesOf(reader.globalAttributes),
    variables: reader.variables.map((variable) => {
      const own = variable.dimensions.map((index) => dimensions[index]!);
      const promised = sizeOf(own) * (BYTES_OF[variable.type] ?? 8);
      if (!(promised <= bytes.length)) throw new Error(`${variable.name} is said to hold more than the whole file`);
      return {
        name: variable.name,
        dimensions: own,
        attributes: attributesOf(variable.attributes),
        values: () => flat(reader.getDataVariable(variable.name)),
      };
    }),
  };
}

/** Record variables come as one array a record. */
const flat = (values: readonly (string | number | number[])[]): (string | number)[] => values.flat();
