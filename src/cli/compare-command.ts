import { VERSION } from "../export/index.ts";
import { type ShortcutCost, type SolvedCast, type Survey, shortcutCosts, solve } from "../survey/index.ts";
import { columnOptions } from "./column-options.ts";
import { gatherSurvey } from "./gather-survey.ts";
import { EXIT, type ExitCode, type Host } from "./host.ts";
import { castIssueLines } from "./issue-lines.ts";
import { textTable } from "./text-table.ts";
import { COMPARE_USAGE } from "./usage.ts";

/** `layerhead compare`: what depth times one specific weight costs. */
export async function compareCommand(host: Host, args: readonly string[]): Promise<ExitCode> {
  const options = columnOptions(args);
  if (options.help) {
    host.out(COMPARE_USAGE);
    return EXIT.done;
  }
  const { survey, allRead } = await gatherSurvey(host, options.files, options.reading, options);
  const solved = solve(survey);
  for (const path of new Set(options.files)) {
    const own = solved.filter(({ cast }) => cast.fileName === path);
    host.err(
      castIssueLines(
        path,
        own.map(({ cast, issues }) => ({ castName: cast.name, issues })),
      ),
    );
  }
  const compared = solved.map((one) => compare(survey, one));
  host.out(
    options.json
      ? `${JSON.stringify({ version: VERSION, casts: compared.map(castJson) })}\n`
      : compared.map(castText).join("\n"),
  );
  return allRead && solved.every((cast) => cast.solution !== null) ? EXIT.done : EXIT.badInput;
}

interface Compared {
  readonly name: string;
  readonly depthsM: readonly number[];
  readonly gaugeKPa: readonly number[];
  readonly costs: readonly ShortcutCost[];
}

/** At the survey's levels, or at the bottom where it has none. */
function compare({ levels }: Survey, { cast, solution }: SolvedCast): Compared {
  if (!solution) return { name: cast.name, depthsM: [], gaugeKPa: [], costs: [] };
  const depthsM = levels.length > 0 ? levels.map(({ depthM }) => depthM) : [solution.column.bottomDepthM];
  const costs = shortcutCosts(solution.column, depthsM);
  const [first] = costs;
  const gaugeKPa = depthsM.map((_, i) => first!.pressureKPa[i]! - first!.errorKPa[i]!);
  return { name: cast.name, depthsM, gaugeKPa, costs };
}

const HEADS = [
  ["kPa", ""],
  ["error kPa", ""],
  ["head m", ""],
  ["%", ""],
  ["gauge reads deeper m", ""],
  ["specific weight from", ""],
] as const;

function castText({ name, depthsM, gaugeKPa, costs }: Compared): string {
  const tables = depthsM.map((depthM, i) => {
    const rows = costs.map((cost) => [
      cost.pressureKPa[i]!.toFixed(3),
      cost.errorKPa[i]!.toFixed(3),
      cost.errorM[i]!.toFixed(4),
      (cost.errorFrac[i]! * 100).toFixed(3),
      cost.gaugeDepthErrorM[i]!.toFixed(4),
      cost.shortcut.name,
    ]);
    return `  at ${depthM.toFixed(3)} m: ${gaugeKPa[i]!.toFixed(3)} kPa integrated\n${textTable(HEADS, rows)}`;
  });
  return `${[name, ...(tables.length > 0 ? tables : ["  no result"])].join("\n")}\n`;
}

const finite = (value: number): number | null => (Number.isFinite(value) ? value : null);

const castJson = ({ name, depthsM, gaugeKPa, costs }: Compared): Record<string, unknown> => ({
  name,
  depth_m: depthsM,
  gauge_pressure_kPa: gaugeKPa.map(finite),
  shortcuts: costs.map((cost) => ({
    name: cost.shortcut.name,
    specific_weight_kN_m3: cost.shortcut.weightKPaPerM,
    pressure_kPa: Array.from(cost.pressureKPa, finite),
    error_kPa: Array.from(cost.errorKPa, finite),
    error_m: Array.from(cost.errorM, finite),
    error_percent: Array.from(cost.errorFrac, (share) => finite(share * 100)),
    gauge_depth_error_m: Array.from(cost.gaugeDepthErrorM, finite),
  })),
});
