import { useSignal } from "@preact/signals";
import type { Profile } from "../../survey/index.ts";
import { type PageQuantity, shownNumber, unitLabel } from "../show/shown.ts";
import { castInHand, state } from "../store.ts";

/** Longer tables are thinned; the export has every row. */
const MOST_ROWS_COUNT = 400;

const COLUMNS: readonly {
  readonly title: string;
  readonly quantity: PageQuantity;
  readonly values: (p: Profile) => Float64Array;
}[] = [
  { title: "Depth", quantity: "depth", values: (p) => p.depthM },
  { title: "Temperature", quantity: "temperature", values: (p) => p.inSituTempC },
  { title: "Practical salinity", quantity: "practicalSalinity", values: (p) => p.practicalSalinity },
  { title: "Density", quantity: "density", values: (p) => p.rhoKgM3 },
  { title: "N² below", quantity: "buoyancyFrequencySquared", values: (p) => p.buoyancyFrequencySquaredPerS2 },
  { title: "Gauge", quantity: "gaugePressure", values: (p) => p.gaugePressureKPa },
  { title: "Absolute", quantity: "absolutePressure", values: (p) => p.absPressureKPa },
  { title: "Departure", quantity: "departure", values: (p) => p.departureKPa },
];

const ORIGIN_WORDS: Readonly<Record<Profile["origin"][number], string>> = {
  sample: "sample",
  level: "level",
  "surface-gap": "held above",
  "bed-gap": "held below",
};

/** The charts of the cast in hand as a table, built when it is opened. */
export function NumbersTable() {
  const isOpen = useSignal(false);
  const inHand = castInHand.value;
  const profile = inHand?.solution?.profile;
  if (!inHand || !profile) return null;
  const step = Math.ceil(profile.n / MOST_ROWS_COUNT);
  return (
    <details
      class="numbers"
      onToggle={(event) => {
        isOpen.value = event.currentTarget.open;
      }}
    >
      <summary>
        The charts of {inHand.cast.name} in numbers{step > 1 ? ` (one row in ${step} of ${profile.n})` : ""}
      </summary>
      {isOpen.value ? <Rows profile={profile} step={step} /> : null}
    </details>
  );
}

function Rows({ profile, step }: { readonly profile: Profile; readonly step: number }) {
  const { system } = state.value;
  const rows = Array.from({ length: Math.ceil(profile.n / step) }, (_, k) => k * step);
  return (
    // biome-ignore lint/a11y/noNoninteractiveTabindex: what scrolls must be reached by keyboard
    <section class="scroller" tabIndex={0} aria-label="Table of the profile">
      <table>
        <thead>
          <tr>
            {COLUMNS.map(({ title, quantity }) => (
              <th key={title} scope="col">
                {title} {unitLabel(quantity, system)}
              </th>
            ))}
            <th scope="col">Origin</th>
          </tr>
        </thead>
        <tbody>
          {rows.map((row) => (
            <tr key={row}>
              {COLUMNS.map(({ title, quantity, values }, k) => {
                const text = shownNumber(values(profile)[row]!, quantity, system);
                return k === 0 ? (
                  <th key={title} scope="row">
                    {text}
                  </th>
                ) : (
                  <td key={title}>{text}</td>
                );
              })}
              <td>{ORIGIN_WORDS[profile.origin[row]!]}</td>
            </tr>
          ))}
        </tbody>
      </table>
    </section>
  );
}
