import { useEffect, useState } from "preact/hooks";
import { describeAtDepths } from "../../survey/index.ts";
import type { DisplaySystem } from "../../units/index.ts";
import type { AnsweredCast } from "../../worker/index.ts";
import { reasonsNear } from "../show/sample-marks.ts";
import { scientific, shownPercent, shownValue } from "../show/shown.ts";
import { BEHIND_NOTE, behindDepth, buoyancyAround } from "../show/water-at.ts";
import { castInHand, plumbDepthM, state } from "../store.ts";

/** A screen reader hears the values once the plumb line rests, not at every step. */
const QUIET_MS = 700;

/** So near to a flagged sample, against the depth of the water, the plumb line tells why it is flagged. */
const REACH_FRAC = 0.006;

interface Reading {
  readonly name: string;
  readonly depth: string;
  readonly note: string;
  /** Why the sample here is flagged. */
  readonly flagged: string;
  readonly values: readonly (readonly [quantity: string, value: string])[];
}

/** All values of the cast in hand at the plumb line. */
export function Readout() {
  const reading = readingAt(castInHand.value, plumbDepthM.value, state.value.system);
  if (!reading)
    return (
      <div class="readout">
        Point at the charts, or use the arrow keys there, to read values; click or Enter drops a level.
      </div>
    );
  return (
    <div class="readout">
      <span>
        <b>{reading.name}</b> at <b>{reading.depth}</b>
        {reading.note ? <span class="warn"> {reading.note}</span> : null}
      </span>
      {reading.flagged ? <span class="warn flagged">{reading.flagged}</span> : null}
      {reading.values.map(([quantity, value]) => (
        <span key={quantity}>
          {quantity} <b>{value}</b>
        </span>
      ))}
      <Spoken
        text={`${reading.depth} ${reading.note} ${reading.flagged}: ${reading.values.map((pair) => pair.join(" ")).join(", ")}`}
      />
    </div>
  );
}

function Spoken({ text }: { readonly text: string }) {
  const [spoken, setSpoken] = useState("");
  useEffect(() => {
    const timer = setTimeout(() => setSpoken(text), QUIET_MS);
    return () => clearTimeout(timer);
  }, [text]);
  return (
    <span class="hidden-text" aria-live="polite">
      {spoken}
    </span>
  );
}

function readingAt(inHand: AnsweredCast | null, depthM: number | null, system: DisplaySystem): Reading | null {
  if (!inHand?.solution || depthM === null) return null;
  const { column, profile } = inHand.solution;
  const at = describeAtDepths(column, [depthM]);
  const buoyancy = buoyancyAround(profile, depthM);
  return {
    name: inHand.cast.name,
    depth: shownValue(depthM, "depth", system),
    note: BEHIND_NOTE[behindDepth(column, depthM)],
    flagged: reasonsNear(inHand, depthM, column.bottomDepthM * REACH_FRAC),
    values: [
      ["temperature", shownValue(at.inSituTempC[0]!, "temperature", system)],
      ["salinity", shownValue(at.practicalSalinity[0]!, "practicalSalinity", system)],
      ["density", shownValue(at.rhoKgM3[0]!, "density", system)],
      ["N²", Number.isNaN(buoyancy) ? "–" : `${scientific(buoyancy)} s⁻²`],
      ["gauge", shownValue(at.gaugePressureKPa[0]!, "gaugePressure", system)],
      ["absolute", shownValue(at.absPressureKPa[0]!, "absolutePressure", system)],
      [
        "departure",
        `${shownValue(at.departureKPa[0]!, "departure", system)} (${shownValue(at.departureM[0]!, "head", system)}, ${shownPercent(at.departureFrac[0]!)} %)`,
      ],
    ],
  };
}
