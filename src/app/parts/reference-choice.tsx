import type { ReferenceDensity } from "../../survey/index.ts";
import { convert, type DisplaySystem } from "../../units/index.ts";
import { Choice } from "./choice.tsx";
import { QuantityEntry } from "./number-entry.tsx";

/** Handbook densities, kg/m3 unless they say otherwise. A specific weight in lbf/ft3 under standard gravity is the same number in lb/ft3. */
const HANDBOOK = {
  fresh: { label: "1000, fresh", rhoKgM3: 1000 },
  sea: { label: "1025, sea", rhoKgM3: 1025 },
  "fresh-us": { label: "62.4 lbf/ft³", rhoKgM3: convert(62.4, "lb/ft3", "kg/m3") },
  "sea-us": { label: "64.0 lbf/ft³", rhoKgM3: convert(64, "lb/ft3", "kg/m3") },
} as const;

type HandbookName = keyof typeof HANDBOOK;
type ChoiceName = HandbookName | "surface" | "mean" | "other";

const NAMES = Object.keys(HANDBOOK) as readonly HandbookName[];

const OPTIONS: readonly (readonly [ChoiceName, string])[] = [
  ...NAMES.map((name) => [name, HANDBOOK[name].label] as const),
  ["surface", "surface sample"],
  ["mean", "depth mean"],
  ["other", "another"],
];

const nameOf = (reference: ReferenceDensity): ChoiceName =>
  reference.kind === "number"
    ? (NAMES.find((name) => HANDBOOK[name].rhoKgM3 === reference.rhoKgM3) ?? "other")
    : reference.kind;

interface ReferenceProps {
  readonly reference: ReferenceDensity;
  readonly system: DisplaySystem;
  readonly onReference: (reference: ReferenceDensity) => void;
}

/** The density that the integrated pressure is held against. */
export function ReferenceChoice({ reference, system, onReference }: ReferenceProps) {
  const choose = (name: ChoiceName): void => {
    if (name === "surface" || name === "mean") onReference({ kind: name });
    else if (name !== "other") onReference({ kind: "number", rhoKgM3: HANDBOOK[name].rhoKgM3 });
    else if (reference.kind !== "number") onReference({ kind: "number", rhoKgM3: 1010 });
  };
  return (
    <>
      <Choice label="Compare with" value={nameOf(reference)} options={OPTIONS} onValue={choose} />
      {reference.kind === "number" ? (
        <QuantityEntry
          label="Reference density"
          value={reference.rhoKgM3}
          quantity="density"
          system={system}
          least={500}
          most={3000}
          onValue={(rhoKgM3) => rhoKgM3 !== null && onReference({ kind: "number", rhoKgM3 })}
        />
      ) : null}
    </>
  );
}
