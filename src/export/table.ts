/** What a column of a table holds: its name says quantity and unit, the description is for people. */
export interface ColumnDescription {
  readonly name: string;
  readonly description: string;
  readonly datatype: "string" | "double" | "integer";
  readonly unit?: string;
}

export const textColumn = (name: string, description: string): ColumnDescription => ({
  name,
  description,
  datatype: "string",
});

export const countColumn = (name: string, description: string): ColumnDescription => ({
  name,
  description,
  datatype: "integer",
});

export const numberColumn = (name: string, unit: string, description: string): ColumnDescription => ({
  name,
  unit,
  description,
  datatype: "double",
});
