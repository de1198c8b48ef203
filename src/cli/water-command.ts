import { parseArgs } from "node:util";
import Papa from "papaparse";
import { csvText } from "../export/index.ts";
import { type WaterPoints, waterAtPoints } from "../survey/index.ts";
import { EXIT, type ExitCode, type Host, UsageError } from "./host.ts";
import { issueLine } from "./issue-lines.ts";
import { WATER_USAGE } from "./usage.ts";

const SALINITY_COLUMNS = ["absolute_salinity_g_kg", "practical_salinity", "conductivity_mS_cm"] as const;
const TEMPERATURE = "temperature_degC";
const PRESSURE = "sea_pressure_dbar";

/** `layerhead water`: the properties of single points, beside the points. */
export async function waterCommand(host: Host, args: readonly string[]): Promise<ExitCode> {
  const { values, positionals } = parseArgs({
    args: [...args],
    options: { help: { type: "boolean", short: "h" } },
    allowPositionals: true,
  });
  if (values.help) {
    host.out(WATER_USAGE);
    return EXIT.done;
  }
  const [path, ...more] = positionals;
  if (path === undefined || more.length > 0)
    throw new UsageError("water needs one table of points, or - for standard input");
  const table = await readTable(host, path);
  if (table === null) return EXIT.badInput;
  const { head, rows } = table;
  const missing = [
    ...(SALINITY_COLUMNS.some((name) => head.includes(name)) ? [] : [SALINITY_COLUMNS.join(" or ")]),
    ...[TEMPERATURE, PRESSURE].filter((name) => !head.includes(name)),
  ];
  if (missing.length > 0) {
    host.err(`${path}: no column ${missing.join(", ")}; found ${head.join(", ")}; rename the columns\n`);
    return EXIT.badInput;
  }

  let faulty = false;
  const column = (name: string): Float64Array => {
    const at = head.indexOf(name);
    return Float64Array.from(rows, (row, i) => {
      const text = (row[at] ?? "").trim();
      const value = text === "" ? Number.NaN : Number(text);
      if (Number.isFinite(value) || text === "" || /^nan$/i.test(text)) return value;
      faulty = true;
      const message = `${name} is "${text}", expected a number; this row's properties are left empty`;
      host.err(issueLine(path, { severity: "error", code: "not-a-number", message, line: i + 2 }));
      return Number.NaN;
    });
  };
  const salinityColumn = SALINITY_COLUMNS.find((name) => head.includes(name))!;
  const salinity = column(salinityColumn);
  const points: WaterPoints = {
    inSituTempC: column(TEMPERATURE),
    seaPressureDbar: column(PRESSURE),
    ...(salinityColumn === "absolute_salinity_g_kg" && { absSalinityGKg: salinity }),
    ...(salinityColumn === "practical_salinity" && { practicalSalinity: salinity }),
    ...(salinityColumn === "conductivity_mS_cm" && { conductivityMsCm: salinity }),
  };
  const added = Object.entries(waterAtPoints(points)).filter(([name]) => !head.includes(name));
  host.out(
    csvText(
      [...head, ...added.map(([name]) => name)].map((name) => ({ name })),
      rows.map((row, i) => [...head.map((_, c) => row[c] ?? null), ...added.map(([, values]) => values[i]!)]),
    ),
  );
  return faulty ? EXIT.badInput : EXIT.done;
}

async function readTable(
  host: Host,
  path: string,
): Promise<{ readonly head: readonly string[]; readonly rows: readonly (readonly string[])[] } | null> {
  let text: string;
  try {
    text = new TextDecoder().decode(path === "-" ? await host.readStandardInput() : await host.readFile(path));
  } catch (error) {
    host.err(`${path}: cannot be read (${(error as NodeJS.ErrnoException).code ?? String(error)})\n`);
    return null;
  }
  const { data } = Papa.parse<string[]>(text, { skipEmptyLines: true });
  const [head, ...rows] = data;
  if (head === undefined || rows.length === 0) {
    host.err(`${path}: holds no table, expected a header and at least one row\n`);
    return null;
  }
  return { head: head.map((name) => name.trim()), rows };
}
