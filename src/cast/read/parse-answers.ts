/** What the user says about columns on one line of a command: "depth=Depth_ft:ft,temperature=\"T, probe\":degF". */
import { failed, type Issue, type Outcome, succeeded } from "../../base/index.ts";
import { UNITS } from "../../units/index.ts";
import type { ColumnAnswer, ColumnRole, FileReading, ReadingAnswers } from "../reading.ts";
import { formByText } from "./answers.ts";
import { KNOWN_COUNTS } from "./day-count.ts";
import { isMeasured, MEASURED, ROLE_WORDS } from "./roles.ts";

type Said = ColumnRole | "unused";

const lettersOnly = (text: string): string => text.toLowerCase().replace(/[^a-z]/g, "");

/** Plain words beside the names and the descriptions of the roles. */
const PLAIN_WORDS: ReadonlyMap<string, Said> = new Map<string, Said>([
  ["salinity", "practicalSalinity"],
  ["pressure", "seaPressure"],
  ["gaugepressure", "seaPressure"],
  ["conductance", "specificConductance"],
  ["tds", "dissolvedSolids"],
  ["sediment", "suspendedSediment"],
  ["sigma", "densityAnomaly"],
  ["cast", "castName"],
  ["time", "clock"],
  ["watersurfaceelevation", "surfaceElevation"],
  ["bottomdepth", "waterDepth"],
  ["flag", "qualityFlag"],
  ["unused", "unused"],
  ["none", "unused"],
]);

const ROLES = Object.keys(ROLE_WORDS) as readonly ColumnRole[];

function roleByWord(word: string): Said | null {
  const wanted = lettersOnly(word);
  const isNamed = (role: ColumnRole): boolean =>
    role.toLowerCase() === wanted || lettersOnly(ROLE_WORDS[role]) === wanted;
  return ROLES.find(isNamed) ?? PLAIN_WORDS.get(wanted) ?? null;
}

/** Cut at a mark that is not within quotes; a backslash takes the meaning off the sign behind it. */
function cutAt(text: string, mark: string): readonly string[] {
  const parts = [""];
  let isQuoted = false;
  for (let i = 0; i < text.length; i++) {
    const sign = text[i]!;
    if (sign === "\\" && isQuoted && i + 1 < text.length) {
      parts[parts.length - 1] += sign + text[i + 1]!;
      i += 1;
    } else if (sign === mark && !isQuoted) parts.push("");
    else {
      if (sign === '"') isQuoted = !isQuoted;
      parts[parts.length - 1] += sign;
    }
  }
  return parts;
}

const QUOTED = /^"((?:[^"\\]|\\.)*)"$/;

const unquoted = (text: string): string => QUOTED.exec(text)?.[1]?.replace(/\\(.)/g, "$1") ?? text;

/** The units of a role in words, for the message that one is unknown. */
function unitsOf(role: ColumnRole): string {
  if (role === "date" || role === "dateTime") {
    return ["day-first", "month-first", ...KNOWN_COUNTS.map((count) => count.name), "hours since 2020-01-01"].join(
      ", ",
    );
  }
  if (!isMeasured(role)) return "none: it has no unit";
  const { kind } = MEASURED[role];
  return UNITS.filter((unit) => unit.kind === kind)
    .map((unit) => unit.symbol)
    .join(", ");
}

const wrong = (code: string, message: string): Issue => ({ severity: "error", code, message });

/** The header, and the unit behind the last colon outside quotes. */
function headerAndUnit(text: string): readonly [header: string, unit: string | null] {
  const parts = cutAt(text, ":");
  const unit = parts.length > 1 ? parts.at(-1)!.trim() : null;
  const header = parts.slice(0, unit === null ? undefined : -1).join(":");
  return [unquoted(header.trim()), unit === "" ? null : unit];
}

function answerIn(text: string): ColumnAnswer | Issue {
  const equals = text.indexOf("=");
  if (equals < 0) {
    return wrong(
      "answer-unclear",
      `"${text}" is no answer; expected role=header or role=header:unit, as in depth=Depth_ft:ft`,
    );
  }
  const word = text.slice(0, equals).trim();
  const role = roleByWord(word);
  if (role === null) {
    return wrong(
      "unknown-role",
      `"${word}" is no role of a column; expected one of ${[...ROLES, "unused"].join(", ")}`,
    );
  }
  const [header, unit] = headerAndUnit(text.slice(equals + 1));
  if (header === "")
    return wrong("answer-unclear", `"${text}" names no column; expected role=header, or role=#3 for the third`);
  if (role !== "unused" && unit !== null && formByText(role, unit) === null) {
    return wrong(
      "unknown-unit",
      `"${unit}" is no unit of ${ROLE_WORDS[role]}; expected one of ${unitsOf(role)}; put a header with a colon in quotes`,
    );
  }
  return { header, role, unit: role === "unused" ? null : unit };
}

/**
 * The answers in a text, or what is wrong with it.
 * @example parseAnswers("depth=Depth_ft:ft,unused=T2") // two answers
 */
export function parseAnswers(text: string): Outcome<ReadingAnswers> {
  const found = cutAt(text, ",")
    .map((part) => part.trim())
    .filter((part) => part !== "")
    .map(answerIn);
  const issues = found.filter((answer) => "severity" in answer);
  if (issues.length > 0) return failed(...issues);
  const columns = found.filter((answer) => "role" in answer);
  if (columns.length === 0)
    return failed(wrong("answer-unclear", "nothing is said; expected such as depth=Depth_ft:ft"));
  return succeeded({ columns });
}

/** The same for every file with the same headers in the same order: what answers are remembered by. */
export const headerKey = (reading: Pick<FileReading, "headers">): string => JSON.stringify(reading.headers);
