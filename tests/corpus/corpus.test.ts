import { readdirSync, readFileSync } from "node:fs";
import { describe, expect, test } from "vitest";
import type { Outcome } from "../../src/base/index.ts";
import { type Cast, type FileReading, readCastFile } from "../../src/cast/index.ts";
import { REFUSED, UNDERSTOOD } from "./corpus.ts";
import type { Understood } from "./expected.ts";

const FOLDER = new URL("./files/", import.meta.url);

const readingOf = (name: string): Outcome<FileReading> => readCastFile(name, readFileSync(new URL(name, FOLDER)));

const read = (name: string): FileReading => {
  const outcome = readingOf(name);
  if (!outcome.ok) throw new Error(`${name} was refused: ${outcome.issues.map((issue) => issue.message).join("; ")}`);
  return outcome.value;
};

const rolesOf = ({ columns }: FileReading): string =>
  columns
    .filter(({ role }) => role !== null)
    .map(({ role, unit }) => (unit === null ? role : `${role} ${unit}`))
    .join(", ");

const codesOf = ({ issues, casts }: FileReading): readonly string[] => [
  ...new Set([...issues, ...casts.flatMap((cast) => cast.issues)].map((issue) => issue.code)),
];

const sampleCount = ({ casts }: FileReading): number => casts.reduce((sum, cast) => sum + cast.samples.n, 0);

/** The named values of one sample; NaN where the cast has no such column. */
function valuesAt(cast: Cast, at: number, names: readonly string[]): Readonly<Record<string, number>> {
  const columns = cast.samples as unknown as Readonly<Record<string, ArrayLike<number> | null>>;
  return Object.fromEntries(names.map((name) => [name, columns[name]?.[at] ?? Number.NaN]));
}

/** A value that is written as it is measured is the same to the last bit; one that is converted may lose a few. */
function expectValues(found: Readonly<Record<string, number>>, expected: Readonly<Record<string, number>>): void {
  for (const [name, value] of Object.entries(expected)) {
    const isNear = Math.abs(found[name]! - value) <= 1e-9 * Math.max(1, Math.abs(value));
    expect(isNear, `${name} is ${found[name]}, expected ${value}`).toBe(true);
  }
}

test("every file has its line in the table, and there are at least sixty", () => {
  const listed = [...UNDERSTOOD, ...REFUSED].map(({ file }) => file).sort();
  expect(readdirSync(FOLDER).sort()).toEqual(listed);
  expect(listed.length).toBeGreaterThanOrEqual(60);
});

describe("a file is understood as it must be", () => {
  test.each(UNDERSTOOD)("$file: $trap", (expected) => {
    const reading = read(expected.file);
    expect(rolesOf(reading)).toBe(expected.reads);
    expect(reading.questions.map((question) => question.code)).toEqual(expected.asks);
    expect([...codesOf(reading)].sort()).toEqual([...new Set(expected.says)].sort());
    expect([reading.casts.length, sampleCount(reading)]).toEqual([expected.casts, expected.samples]);
    const [first, last] = [reading.casts[0], reading.casts.at(-1)];
    if (!first || !last) return;
    expectValues(valuesAt(first, 0, Object.keys(expected.first)), expected.first);
    expectValues(valuesAt(last, last.samples.n - 1, Object.keys(expected.last)), expected.last);
    expect(first).toMatchObject(expected.cast);
  });

  test.each(REFUSED)("$file is refused: $trap", ({ file, refusedFor }) => {
    const outcome = readingOf(file);
    expect(outcome.ok).toBe(false);
    expect(outcome.issues[0]).toMatchObject({ severity: "error", code: refusedFor });
  });
});

describe("a question is answered by each of its choices", () => {
  const asking = UNDERSTOOD.filter(({ asks }) => asks.length > 0);

  test.each(asking)("$file", ({ file }) => {
    const bytes = readFileSync(new URL(file, FOLDER));
    const { questions } = read(file);
    for (const question of questions) {
      expect(question.choices.length).toBeGreaterThan(1);
      for (const { answer } of question.choices.filter((choice) => choice.answer.role !== "unused")) {
        const outcome = readCastFile(file, bytes, { columns: [answer] });
        const codes = outcome.ok ? outcome.value.questions.map((open) => open.code) : [];
        expect(codes).not.toContain(question.code);
        expect(outcome.issues.map((issue) => issue.code)).not.toContain("answer-not-used");
      }
    }
  });
});

const shown = (value: number): string => (Number.isNaN(value) ? "-" : String(Number(value.toPrecision(6))));

const valuesText = (values: Readonly<Record<string, number>>): string => Object.values(values).map(shown).join(" / ");

function lineOf(expected: Understood): string {
  const reading = read(expected.file);
  const [first, last] = [reading.casts[0], reading.casts.at(-1)];
  const values =
    first && last
      ? `${valuesText(valuesAt(first, 0, Object.keys(expected.first)))} to ${valuesText(valuesAt(last, last.samples.n - 1, Object.keys(expected.last)))}`
      : "no cast yet";
  const asked = reading.questions.map((question) => question.code).join(", ");
  const verdict = asked === "" ? "understood" : `asks: ${asked}`;
  const size = `${reading.casts.length} x ${sampleCount(reading)}`;
  const cells = [
    expected.file,
    expected.trap,
    rolesOf(reading) || "-",
    size,
    values,
    codesOf(reading).join(", ") || "-",
    verdict,
  ];
  return `| ${cells.map((cell) => cell.replaceAll("|", "\\|")).join(" | ")} |`;
}

test("the table of results is fresh", async () => {
  const refused = REFUSED.map(({ file, trap }) => {
    const codes = readingOf(file).issues.map((issue) => issue.code);
    return `| ${file} | ${trap} | - | - | - | ${codes.join(", ")} | refused |`;
  });
  const asking = UNDERSTOOD.filter(({ asks }) => asks.length > 0).length;
  const count = `${UNDERSTOOD.length + REFUSED.length} files: ${UNDERSTOOD.length - asking} understood, ${asking} with a question, ${refused.length} refused with a reason.`;
  const table = [
    "# What is understood of the corpus",
    "",
    "Written by `corpus.test.ts`, which fails when it is stale; `npx vitest run tests/corpus -u` writes it anew.",
    "Values are those named in `corpus.ts`, of the first sample and the last.",
    "",
    count,
    "",
    "| file | trap | read as | casts x samples | values | issues | verdict |",
    "|---|---|---|---|---|---|---|",
    ...UNDERSTOOD.map(lineOf),
    ...refused,
    "",
  ];
  await expect(table.join("\n")).toMatchFileSnapshot("./RESULTS.md");
});
