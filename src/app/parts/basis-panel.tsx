import type { Basis, DepthMade, SolvedCast, WaterChoice } from "../../survey/index.ts";
import type { DisplaySystem } from "../../units/index.ts";
import { shownValue } from "../show/shown.ts";
import { castInHand, dispatch, state, survey } from "../store.ts";
import { Choice } from "./choice.tsx";
import { NumberEntry, QuantityEntry } from "./number-entry.tsx";
import { ReferenceChoice } from "./reference-choice.tsx";

const WATER_OPTIONS = [
  ["teos10", "TEOS-10"],
  ["exact", "TEOS-10, exact"],
  ["limnological", "Limnological"],
  ["eos80", "EOS-80"],
  ["constant", "Constant"],
] as const satisfies readonly (readonly [WaterChoice["id"], string])[];

const DEPTH_OPTIONS = [
  ["measured", "measured"],
  ["standard-ocean", "standard ocean"],
  ["constant", "constant density"],
] as const satisfies readonly (readonly [DepthMade["kind"], string])[];

const DENSITY_RANGE = { least: 500, most: 3000 } as const;
const FIRST_CONSTANT_KGM3 = 1000;

const change = (part: Partial<Basis>): void => dispatch({ kind: "basis-changed", change: part });

/** Everything assumed beyond the samples, each item to be changed in place. */
export function BasisPanel() {
  const { basis } = survey.value;
  const { system } = state.value;
  const inHand = castInHand.value;
  const { water, depthMade } = basis;
  return (
    <section class="basis" aria-label="Basis">
      <h2>Basis</h2>
      <Choice
        label="Water model"
        value={water.id}
        options={WATER_OPTIONS}
        onValue={(id) => change({ water: id === "constant" ? { id, rhoKgM3: FIRST_CONSTANT_KGM3 } : { id } })}
      />
      {water.id === "constant" ? (
        <QuantityEntry
          label="Constant density"
          value={water.rhoKgM3}
          quantity="density"
          system={system}
          {...DENSITY_RANGE}
          onValue={(rhoKgM3) => rhoKgM3 !== null && change({ water: { id: "constant", rhoKgM3 } })}
        />
      ) : null}
      <NumberEntry
        label="Latitude"
        value={basis.latitudeDeg}
        unit="deg"
        shownUnit="deg"
        digitsCount={4}
        least={-90}
        most={90}
        emptyMeans={latitudeWithout(inHand)}
        onValue={(latitudeDeg) => change({ latitudeDeg })}
      />
      <QuantityEntry
        label="Air pressure"
        value={basis.airPressureKPa}
        quantity="airPressure"
        system={system}
        least={30}
        most={120}
        onValue={(airPressureKPa) => airPressureKPa !== null && change({ airPressureKPa })}
      />
      <QuantityEntry
        label="Salinity if unmeasured"
        value={basis.unmeasuredPracticalSalinity}
        quantity="practicalSalinity"
        system={system}
        least={0}
        most={42}
        onValue={(value) => value !== null && change({ unmeasuredPracticalSalinity: value })}
      />
      <Choice
        label="Depth was"
        value={depthMade.kind}
        options={DEPTH_OPTIONS}
        onValue={(kind) =>
          change({ depthMade: kind === "constant" ? { kind, rhoKgM3: FIRST_CONSTANT_KGM3 } : { kind } })
        }
      />
      {depthMade.kind === "constant" ? (
        <QuantityEntry
          label="made with"
          value={depthMade.rhoKgM3}
          quantity="density"
          system={system}
          {...DENSITY_RANGE}
          onValue={(rhoKgM3) => rhoKgM3 !== null && change({ depthMade: { kind: "constant", rhoKgM3 } })}
        />
      ) : null}
      <GapRows inHand={inHand} />
      <QuantityEntry
        label="Bed depth"
        value={basis.bedDepthM}
        quantity="depth"
        system={system}
        least={0.01}
        most={12_000}
        emptyMeans={bedWithout(inHand, system)}
        onValue={(bedDepthM) => change({ bedDepthM })}
      />
      <QuantityEntry
        label="Surface elevation"
        value={basis.waterSurfaceElevationM}
        quantity="elevation"
        system={system}
        least={-500}
        most={9000}
        emptyMeans="no datum"
        onValue={(waterSurfaceElevationM) => change({ waterSurfaceElevationM })}
      />
      <ReferenceChoice
        reference={basis.referenceDensity}
        system={system}
        onReference={(referenceDensity) => change({ referenceDensity })}
      />
    </section>
  );
}

/** What stands in when the basis gives no latitude. */
function latitudeWithout(inHand: SolvedCast | null): string {
  const fromFile = inHand?.cast.latitudeDeg ?? null;
  return fromFile === null ? "standard gravity" : `${Number(fromFile.toFixed(4))}° from file`.replace("-", "−");
}

/** What stands in when the basis gives no bed. */
function bedWithout(inHand: SolvedCast | null, system: DisplaySystem): string {
  const fromFile = inHand?.cast.waterDepthM ?? null;
  return fromFile === null ? "last sample" : `${shownValue(fromFile, "depth", system)} from file`;
}

/** The gaps can only be held as yet; said all the same, with their thickness, since numbers there stand on no sample. */
function GapRows({ inHand }: { readonly inHand: SolvedCast | null }) {
  const column = inHand?.solution?.column;
  const thickness = (fromM: number, toM: number): string => shownValue(toM - fromM, "depth", state.value.system);
  return (
    <>
      <div class="entry">
        <span>Surface gap {column ? thickness(0, column.depthM[0]!) : ""}</span>
        <b>hold</b>
      </div>
      <div class="entry">
        <span>Bed gap {column ? thickness(column.depthM[column.n - 1]!, column.bottomDepthM) : ""}</span>
        <b>hold</b>
      </div>
    </>
  );
}
