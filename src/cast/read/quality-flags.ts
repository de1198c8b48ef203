/**
 * Flags that a file itself gives its values, in the meaning of the QARTOD manuals. The exchange format of the world
 * hydrographic programme has its own figures (WHP-90 manual, table 4.10, from memory); others are taken only where the
 * set of values in a column tells what they mean.
 */
import type { Contender } from "./contender.ts";
import { type Decision, leave } from "./decision.ts";
import { isMissing } from "./parse-number.ts";
import type { Table } from "./table.ts";

/** What each flag of a column means. */
type FlagScheme = ReadonlyMap<string, number>;

export interface FlagColumn {
  readonly columnIndex: number;
  /** The column that the flags are about. */
  readonly targetIndex: number;
  readonly scheme: FlagScheme;
}

const FLAG_NAME = /flag|(^|[\W_])q[cf]($|[\W_])|quality/i;
const EXCHANGE_NAME = /_FLAG_W$/;

const PASS = 1;
const NOT_EVALUATED = 2;
const SUSPECT = 3;
const FAIL = 4;
const MISSING = 9;

/** 1 not calibrated, 2 good, 3 questionable, 4 bad, 5 not reported, 6 interpolated or a mean, 7 despiked, 8 irregular, 9 not sampled. */
const EXCHANGE: FlagScheme = new Map([
  ["1", NOT_EVALUATED],
  ["2", PASS],
  ["3", SUSPECT],
  ["4", FAIL],
  ["5", MISSING],
  ["6", PASS],
  ["7", PASS],
  ["8", SUSPECT],
  ["9", MISSING],
]);

/** 1 good, 3 suspect, 4 bad, 9 missing agree in all figures of this family; 0 and 2 vouch for nothing. */
const FIGURES: FlagScheme = new Map([
  ["0", NOT_EVALUATED],
  ["1", PASS],
  ["2", NOT_EVALUATED],
  ["3", SUSPECT],
  ["4", FAIL],
  ["8", PASS],
  ["9", MISSING],
]);

const WORDS: FlagScheme = new Map([
  ["pass", PASS],
  ["passed", PASS],
  ["good", PASS],
  ["ok", PASS],
  ["suspect", SUSPECT],
  ["questionable", SUSPECT],
  ["fail", FAIL],
  ["failed", FAIL],
  ["bad", FAIL],
  ["missing", MISSING],
]);

const plain = (text: string): string => text.trim().toLowerCase().replace(/\.0+$/, "");

const names = (text: string): string =>
  text
    .toLowerCase()
    .replace(/flags?|quality|qc|qf|codes?|\bw$/g, "")
    .replace(/[^a-z0-9]/g, "");

/** The column that has the name of a flag column without the word for flags; else the nearest before it that is no flag. */
function targetOf(headers: readonly string[], columnIndex: number): number {
  const exchangeName = headers[columnIndex]!.replace(EXCHANGE_NAME, "");
  const exact = headers.indexOf(exchangeName);
  if (exact >= 0 && exact !== columnIndex) return exact;
  const wanted = names(headers[columnIndex]!);
  const isFlag = (header: string): boolean => FLAG_NAME.test(header);
  const named = wanted === "" ? -1 : headers.findIndex((header) => !isFlag(header) && names(header) === wanted);
  return named >= 0 ? named : headers.slice(0, columnIndex).findLastIndex((header) => !isFlag(header));
}

/** The meaning of the flags of one column, or null where the values do not tell. */
function schemeOf(header: string, values: ReadonlyMap<string, number>): FlagScheme | null {
  if (EXCHANGE_NAME.test(header)) return EXCHANGE;
  const flags = [...values.keys()];
  if (flags.every((flag) => WORDS.has(flag))) return WORDS;
  const countOf = (flag: string): number => values.get(flag) ?? 0;
  // 0 and 1 alone may mean good and bad, or bad and good.
  const isTold = countOf("1") > 0 && (countOf("0") === 0 || flags.length > 2);
  if (isTold && flags.every((flag) => FIGURES.has(flag))) return FIGURES;
  const isExchange = countOf("2") > countOf("1") && countOf("0") === 0;
  return isExchange && flags.every((flag) => EXCHANGE.has(flag)) ? EXCHANGE : null;
}

function flagsIn(table: Table, columnIndex: number): ReadonlyMap<string, number> {
  const counts = new Map<string, number>();
  for (let row = 0; row < table.rows.length; row++) {
    const text = plain(table.rows.cellAt(row, columnIndex) ?? "");
    if (!isMissing(text)) counts.set(text, (counts.get(text) ?? 0) + 1);
  }
  return counts;
}

export interface FlagDecision {
  readonly decision: Decision;
  /** null where the flags cannot be used. */
  readonly column: FlagColumn | null;
}

const LISTED_FLAGS = 6;

/** What a column of flags is taken for; null when it is none. */
export function flagColumnOf(table: Table, columnIndex: number, contender: Contender | null): FlagDecision | null {
  const header = table.header.cells[columnIndex]!;
  const isNamed = contender === null ? FLAG_NAME.test(header) : contender.role === "qualityFlag";
  if (!isNamed) return null;
  const place = { columnIndex, header };
  const unused = (why: string): FlagDecision => ({ decision: leave(place, why), column: null });
  const values = flagsIn(table, columnIndex);
  if (values.size === 0) return unused("a flag about another column, but empty");
  const targetIndex = targetOf(table.header.cells, columnIndex);
  if (targetIndex < 0) return unused("a flag about no column before it");
  const scheme = schemeOf(header, values);
  if (scheme === null) {
    const listed = [...values.keys()].slice(0, LISTED_FLAGS).join(", ");
    return unused(`a flag about another column, but ${listed} does not tell what it means`);
  }
  const reason = `Named as a flag about "${table.header.cells[targetIndex]}".`;
  const reading = { ...place, role: "qualityFlag", unit: null, confidence: "likely", reason } as const;
  return {
    decision: { reading, issues: [], used: null, question: null },
    column: { columnIndex, targetIndex, scheme },
  };
}

/** Of several flags about one sample the first of these counts. */
const WORST_FIRST = [FAIL, SUSPECT, MISSING, PASS, NOT_EVALUATED];

const worse = (a: number, b: number): number => (WORST_FIRST.indexOf(a) <= WORST_FIRST.indexOf(b) ? a : b);

/** One flag a row, the worst among the columns given; a value without a flag is not evaluated. null without columns. */
export function statedFlags(table: Table, columns: readonly FlagColumn[]): Uint8Array | null {
  if (columns.length === 0) return null;
  const { rows } = table;
  return Uint8Array.from({ length: rows.length }, (_, row) =>
    columns.reduce(
      (worst, { columnIndex, scheme }) =>
        worse(worst, scheme.get(plain(rows.cellAt(row, columnIndex) ?? "")) ?? NOT_EVALUATED),
      NOT_EVALUATED,
    ),
  );
}
