import type { StationMatch } from "../../cast/index.ts";
import type { KeptStations } from "../state/app-state.ts";
import { dispatch, isStationPanelOpen, state } from "../store.ts";

const HOW_IN_WORDS: Readonly<Record<StationMatch["how"], string>> = {
  same: "= same name",
  tolerant: "≈ alike",
  corrected: "● your answer",
  none: "? no match",
};

/** Which station of the list each station of the casts was taken for; every match can be corrected. */
export function StationPanel() {
  const { stations } = state.value.history.present;
  if (!stations || !isStationPanelOpen.value) return null;
  const { list, matches } = stations;
  const foundCount = matches.filter(({ listStation }) => listStation !== null).length;
  return (
    <section class="panel-above stations" aria-label="Stations of the list">
      <div class="heading">
        <h2>
          Stations from <b>{list.fileName}</b>: {foundCount} of {matches.length} found in the list
        </h2>
        <span>
          <button type="button" class="plain small" onClick={() => dispatch({ kind: "stations-dropped" })}>
            Do without the list
          </button>
          <button
            type="button"
            class="plain small"
            onClick={() => {
              isStationPanelOpen.value = false;
            }}
          >
            Close
          </button>
        </span>
      </div>
      {matches.length === 0 ? (
        <p class="note">No cast names a station yet. The list is used for the casts you add.</p>
      ) : (
        // biome-ignore lint/a11y/noNoninteractiveTabindex: what scrolls must be reached by keyboard
        <section class="scroller" tabIndex={0} aria-label="Matches">
          <table>
            <thead>
              <tr>
                <th scope="col">Station of the casts</th>
                <th scope="col">In the list</th>
                <th scope="col">Why</th>
              </tr>
            </thead>
            <tbody>
              {matches.map((match) => (
                <MatchRow key={match.castStation} match={match} stations={stations} />
              ))}
            </tbody>
          </table>
        </section>
      )}
    </section>
  );
}

function MatchRow({ match, stations }: { readonly match: StationMatch; readonly stations: KeptStations }) {
  const { castStation, listStation, how, reason } = match;
  return (
    <tr>
      <th scope="row">{castStation}</th>
      <td>
        <select
          aria-label={`${castStation} in the list`}
          value={listStation ?? ""}
          onChange={(event) =>
            dispatch({ kind: "station-corrected", castStation, listStation: event.currentTarget.value || null })
          }
        >
          <option value="" selected={listStation === null}>
            none
          </option>
          {stations.list.stations.map(({ station }) => (
            <option key={station} value={station} selected={station === listStation}>
              {station}
            </option>
          ))}
        </select>
      </td>
      <td>
        <b class={how === "none" ? "warn" : ""}>{HOW_IN_WORDS[how]}</b> {reason}
      </td>
    </tr>
  );
}
