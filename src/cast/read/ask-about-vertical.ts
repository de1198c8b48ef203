/** What the values of depth and pressure put in doubt, taken together. */
import { min } from "simple-statistics";
import type { Question } from "../reading.ts";
import { answerNames } from "./answers.ts";
import { choose, chooseForm, type Doubt, questionOf } from "./ask.ts";
import type { UsedColumn } from "./decision.ts";
import type { MeasuredRows } from "./measured-rows.ts";
import type { RecognisedColumns } from "./recognise-columns.ts";
import type { Table } from "./table.ts";
import { couldHoldAir } from "./vertical.ts";

/** A column in use, as a question names it. */
function asked(table: Table, { columnIndex }: UsedColumn, doubtOf: (name: string) => Doubt): Question {
  const name = answerNames(table.header.cells)[columnIndex]!;
  return questionOf(columnIndex, name, doubtOf(name));
}

/** Depths that are mostly negative count upwards, or have a wrong sign. */
function upsideDown(table: Table, columns: RecognisedColumns, rows: MeasuredRows): Question | null {
  const column = columns.used.depth;
  const depths = [...(rows.depthM ?? [])].filter((depth) => !Number.isNaN(depth));
  const negativeCount = depths.filter((depth) => depth < 0).length;
  if (!column || negativeCount <= depths.length / 2) return null;
  const unit = column.unit ?? "m";
  return asked(table, column, (name) => ({
    code: "depth-upside-down",
    message: `depth is negative in ${negativeCount} of ${depths.length} rows, down to ${min(depths)} m; depth counts positive down: change the sign, or say that the column counts upward`,
    choices: [chooseForm(name, "depth", `${unit} upward`, `depth in ${unit}, counted upward: its sign is changed`)],
  }));
}

/** Pressure that starts at the weight of the air, without saying whether the air is in it. */
function airInPressure(table: Table, columns: RecognisedColumns, rows: MeasuredRows): Question | null {
  const column = columns.used.seaPressure;
  const pressures = [...(rows.seaPressureDbar ?? [])].filter((pressure) => !Number.isNaN(pressure));
  if (!column || rows.depthM !== null || rows.isGaugePressure || pressures.length === 0) return null;
  const least = min(pressures);
  if (!couldHoldAir(least)) return null;
  const header = table.header.cells[column.columnIndex]!;
  return asked(table, column, (name) => ({
    code: "pressure-may-be-absolute",
    message: `"${header}" starts at ${least.toFixed(2)} dbar, about the weight of the air or a little more; expected 0 at the surface; say whether it is gauge or absolute`,
    choices: [
      choose(name, "absolutePressure", column.unit, "absolute: it holds the weight of the air"),
      choose(name, "seaPressure", column.unit, `gauge: the first sample lies ${least.toFixed(1)} dbar deep`),
    ],
  }));
}

/** The question that no cast can be made before, or null. */
export const askAboutVertical = (table: Table, columns: RecognisedColumns, rows: MeasuredRows): Question | null =>
  upsideDown(table, columns, rows) ?? airInPressure(table, columns, rows);
