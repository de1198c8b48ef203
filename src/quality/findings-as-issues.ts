import type { Issue } from "../base/index.ts";
import type { Samples } from "../cast/index.ts";
import type { CheckName, Finding } from "./finding.ts";
import { lineList } from "./preparing/line-list.ts";

interface Wording {
  /** Stable; what programs test for. */
  readonly code: string;
  readonly severity: Issue["severity"];
  /** Behind "3 of 40 samples". */
  readonly words: string;
}

const WORDING: Readonly<Record<CheckName, Wording>> = {
  missing: { code: "incomplete-sample", severity: "warning", words: "lack depth, temperature or salinity" },
  "above-surface": { code: "above-surface", severity: "warning", words: "lie above the water surface" },
  "gross-range": { code: "gross-range", severity: "warning", words: "are out of range" },
  freezing: { code: "below-freezing", severity: "warning", words: "are colder than their freezing point" },
  "stated-flag": { code: "stated-flag", severity: "note", words: "are flagged in the file itself" },
  "stated-density-disagrees": {
    code: "stated-density-disagrees",
    severity: "warning",
    words: "do not fit the density that the file states for them",
  },
  duplicate: { code: "duplicate-sample", severity: "note", words: "repeat an earlier line" },
  "depth-jump": { code: "depth-jump", severity: "warning", words: "have a depth that jumps away and back" },
  deck: { code: "deck", severity: "note", words: "were recorded at the surface or on deck" },
  soak: { code: "soak", severity: "note", words: "were recorded while the probe waited near the surface" },
  "other-way": { code: "other-way", severity: "note", words: "were recorded on the other way" },
  "pressure-reversal": {
    code: "pressure-reversal",
    severity: "note",
    words: "were recorded while the probe had turned or stood still",
  },
  "dry-sensor": { code: "dry-sensor", severity: "warning", words: "come from a dry sensor" },
  spike: { code: "spike", severity: "warning", words: "stick out as spikes" },
  rate: { code: "rate-of-change", severity: "warning", words: "change faster than water is known to" },
  "flat-line": { code: "flat-line", severity: "warning", words: "repeat a value while the water changes" },
  "stuck-sensor": { code: "stuck-sensor", severity: "warning", words: "carry the same fine value throughout" },
  "density-inversion": { code: "density-inversion", severity: "warning", words: "are part of a density inversion" },
  "by-hand": { code: "by-hand", severity: "note", words: "were flagged by hand" },
};

/** What the checks found, said once a check: how many samples, whether they are used, and on which lines. */
export function findingsAsIssues(findings: readonly Finding[], samples: Samples, use: Uint8Array): readonly Issue[] {
  const checks = new Set(findings.map(({ check }) => check));
  return [...checks].flatMap((check): readonly Issue[] => {
    const found = new Set(findings.filter((finding) => finding.check === check).map(({ sampleIndex }) => sampleIndex));
    const inColumn = (isUsed: boolean): readonly number[] => [...found].filter((i) => (use[i] === 1) === isUsed);
    return [
      ...said(WORDING[check], inColumn(false), "and are not used", samples),
      ...said(WORDING[check], inColumn(true), "and are used", samples),
    ];
  });
}

function said({ code, severity, words }: Wording, indices: readonly number[], use: string, samples: Samples): Issue[] {
  if (indices.length === 0) return [];
  const lines = indices.map((i) => samples.lineIndex[i]!);
  const message = `${indices.length} of ${samples.n} samples ${words} ${use} (${lineList(lines)})`;
  return [{ severity, code, message, ...(lines.length === 1 && { line: lines[0]! }) }];
}
