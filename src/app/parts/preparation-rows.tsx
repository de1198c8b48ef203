import type { Preparation, WaterKind } from "../../survey/index.ts";
import { dispatch, survey } from "../store.ts";
import { Choice } from "./choice.tsx";

const WAYS = [
  ["auto", "auto"],
  ["down", "down"],
  ["up", "up"],
  ["all", "all samples"],
] as const satisfies readonly (readonly [Preparation["way"], string])[];

const BINS = ["none", "0.1", "0.25", "0.5", "1"] as const;
const BIN_OPTIONS = BINS.map((bin) => [bin, bin === "none" ? "none" : `${bin} m`] as const);

const KINDS = [
  ["any", "any"],
  ["fresh", "fresh"],
  ["estuary", "estuary"],
  ["sea", "sea"],
] as const satisfies readonly (readonly [WaterKind, string])[];

const change = (part: Partial<Preparation>): void => dispatch({ kind: "preparation-changed", change: part });

/** How raw samples become those that the columns stand on. */
export function PreparationRows() {
  const { way, binM, waterKind } = survey.value.preparation;
  return (
    <section class="basis" aria-label="Preparation">
      <h2>Preparation</h2>
      <Choice label="Way" value={way} options={WAYS} onValue={(value) => change({ way: value })} />
      <Choice
        label="Bins"
        value={binM === null ? "none" : String(binM)}
        options={BIN_OPTIONS}
        onValue={(bin) => change({ binM: bin === "none" ? null : Number(bin) })}
      />
      <Choice
        label="Water kind"
        value={waterKind}
        options={KINDS}
        onValue={(kind) => change({ waterKind: kind as WaterKind })}
      />
    </section>
  );
}
