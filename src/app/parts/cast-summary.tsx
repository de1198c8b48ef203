import { computed } from "@preact/signals";
import { describeAtDepths, type Solution } from "../../survey/index.ts";
import type { DisplaySystem } from "../../units/index.ts";
import { layering } from "../layering.ts";
import { layeringRows } from "../show/layering-rows.ts";
import { scientific, shownPercent, shownValue } from "../show/shown.ts";
import { type Strongest, strongestStratification } from "../show/water-at.ts";
import { castInHand, state } from "../store.ts";

const strongest = computed(() => {
  const solution = castInHand.value?.solution;
  return solution ? strongestStratification(solution.profile) : null;
});

/** The cast in hand in a few lines. */
export function CastSummary() {
  const inHand = castInHand.value;
  if (!inHand?.solution) return null;
  return (
    <section aria-label="Summary">
      <h2>{inHand.cast.name}</h2>
      <Rows rows={summaryRows(inHand.solution, strongest.value, state.value.system)} />
      {layering.value && (
        <>
          <h2>Layering</h2>
          <Rows rows={layeringRows(layering.value, state.value.system)} />
        </>
      )}
    </section>
  );
}

function Rows({ rows }: { readonly rows: readonly (readonly [string, string])[] }) {
  return (
    <dl>
      {rows.map(([quantity, value]) => (
        <div class="row" key={quantity}>
          <dt>{quantity}</dt>
          <dd>{value}</dd>
        </div>
      ))}
    </dl>
  );
}

function summaryRows(
  { column }: Solution,
  strongest: Strongest | null,
  system: DisplaySystem,
): readonly (readonly [string, string])[] {
  const bottom = describeAtDepths(column, [column.bottomDepthM]);
  return [
    ["Samples used", String(column.n)],
    ["First sample at", shownValue(column.depthM[0]!, "depth", system)],
    ["Last sample at", shownValue(column.depthM[column.n - 1]!, "depth", system)],
    ["Gauge at bottom", shownValue(bottom.gaugePressureKPa[0]!, "gaugePressure", system)],
    ["Departure there", shownValue(bottom.departureKPa[0]!, "departure", system)],
    ["as head of reference", shownValue(bottom.departureM[0]!, "head", system)],
    ["of gauge pressure", `${shownPercent(bottom.departureFrac[0]!)} %`],
    ["Greatest N²", strongest ? `${scientific(strongest.perS2)} s⁻²` : "–"],
    ["at depth", strongest ? shownValue(strongest.depthM, "depth", system) : "–"],
  ];
}
