import { computed } from "@preact/signals";
import { thumbnailPath } from "../../charts/layout/index.ts";
import type { AnsweredCast } from "../../worker/index.ts";
import { densityRange } from "../show/density-range.ts";
import { shownValue } from "../show/shown.ts";
import { readingsOf } from "../state/app-state.ts";
import { dispatch, isStationPanelOpen, openReading, solved, state } from "../store.ts";

const range = computed(() => densityRange(solved.value.casts));

const THUMBNAIL = { widthPx: 46, heightPx: 30 };

export function CastList() {
  const { casts } = solved.value;
  return (
    <nav class="casts" aria-label="Casts">
      <div class="heading">
        <h2>Casts</h2>
        {casts.length > 0 ? (
          <button type="button" class="plain small" onClick={() => dispatch({ kind: "survey-cleared" })}>
            Remove all
          </button>
        ) : null}
      </div>
      <StationsButton />
      <WaitingFiles />
      <ul>
        {casts.map((entry) => (
          <CastEntry key={entry.cast.id} entry={entry} />
        ))}
      </ul>
      <p class="drop-zone">Drop cast files here, or anywhere on the page</p>
    </nav>
  );
}

function CastEntry({ entry }: { readonly entry: AnsweredCast }) {
  const { cast } = entry;
  const { castInHandId, hiddenIds, colourIndexOf } = state.value;
  const isInHand = cast.id === castInHandId;
  const isHidden = hiddenIds.includes(cast.id);
  const colour = `c${colourIndexOf[cast.id] ?? 0}`;
  return (
    <li class={`cast ${colour}${isInHand ? " in-hand" : ""}${isHidden ? " faded" : ""}`}>
      <label class="eye" title={isHidden ? "Show in the charts" : "Hide in the charts"}>
        <input
          type="checkbox"
          checked={!isHidden}
          aria-label={`Show ${cast.name} in the charts`}
          onChange={() => dispatch({ kind: "cast-toggled", castId: cast.id })}
        />
        <span class="dot" />
      </label>
      <button
        type="button"
        class="take"
        aria-pressed={isInHand}
        onClick={() => dispatch({ kind: "cast-taken", castId: cast.id })}
      >
        <span class="name">{cast.name}</span>
        <span class="about">{aboutCast(entry)}</span>
        <MarkedCounts marked={entry.marked} />
        <IssueCount entry={entry} />
        {isWaiting(cast.fileName) ? <span class="about warn">needs your answer</span> : null}
      </button>
      <Thumbnail entry={entry} />
      <button
        type="button"
        class="plain remove"
        aria-label={`Remove ${cast.name}`}
        title="Remove"
        onClick={() => dispatch({ kind: "cast-removed", castId: cast.id })}
      >
        ×
      </button>
    </li>
  );
}

/** Files that cannot be used as they stand: a question is open, or the answers leave no casts. */
function WaitingFiles() {
  const waiting = readingsOf(state.value).filter(({ questions, refusal }) => questions.length + refusal.length > 0);
  return waiting.map(({ fileName, refusal }) => (
    <button
      key={fileName}
      type="button"
      class="waiting"
      onClick={() => {
        openReading.value = fileName;
      }}
    >
      <b>{fileName}</b> <span class="warn">{refusal.length > 0 ? "gives no casts" : "needs your answer"}</span>
    </button>
  ));
}

function StationsButton() {
  const { stations } = state.value.history.present;
  if (!stations) return null;
  const missingCount = stations.matches.filter(({ listStation }) => listStation === null).length;
  return (
    <button
      type="button"
      class="waiting"
      aria-expanded={isStationPanelOpen.value}
      onClick={() => {
        isStationPanelOpen.value = !isStationPanelOpen.value;
      }}
    >
      Stations of {stations.list.fileName}
      {missingCount > 0 ? <span class="warn"> {missingCount} without match</span> : null}
    </button>
  );
}

const isWaiting = (fileName: string): boolean =>
  readingsOf(state.value).some((reading) => reading.fileName === fileName && reading.questions.length > 0);

function MarkedCounts({ marked: { flaggedCount, leftOutCount } }: Pick<AnsweredCast, "marked">) {
  const said = [
    ...(flaggedCount > 0 ? [`${flaggedCount} flagged`] : []),
    ...(leftOutCount > 0 ? [`${leftOutCount} left out`] : []),
  ];
  return said.length > 0 ? <span class="about warn">{said.join(", ")}</span> : null;
}

function aboutCast({ cast, solution }: AnsweredCast): string {
  const { system } = state.value;
  const distance = cast.distanceKm === null ? [] : [shownValue(cast.distanceKm, "distance", system)];
  const depth = solution ? [shownValue(solution.column.bottomDepthM, "depth", system)] : ["no usable sample"];
  return [...distance, ...depth].join(" · ");
}

function IssueCount({ entry }: { readonly entry: AnsweredCast }) {
  const count = entry.issues.filter((issue) => issue.severity !== "note").length;
  return count === 0 ? null : (
    <span class="about warn">
      {count} {count === 1 ? "issue" : "issues"}
    </span>
  );
}

function Thumbnail({ entry }: { readonly entry: AnsweredCast }) {
  const profile = entry.drawn;
  return (
    <svg class="thumbnail" width={THUMBNAIL.widthPx} height={THUMBNAIL.heightPx} aria-hidden="true">
      {profile ? <path d={thumbnailPath(profile.depthM, profile.rhoKgM3, range.value, THUMBNAIL)} /> : null}
    </svg>
  );
}
