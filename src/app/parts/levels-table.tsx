import type { ComponentChildren } from "preact";
import type { Level, Solution } from "../../survey/index.ts";
import type { DisplaySystem } from "../../units/index.ts";
import { type PageQuantity, shownNumber, shownPercent, unitLabel } from "../show/shown.ts";
import { BEHIND_NOTE, behindDepth } from "../show/water-at.ts";
import { governingCast } from "../state/governing-cast.ts";
import { castInHand, dispatch, solved, state, visibleCasts } from "../store.ts";
import { QuantityEntry } from "./number-entry.tsx";

const DEEPEST_LEVEL_M = 12_000;

interface LevelColumn {
  readonly title: string;
  readonly quantity: PageQuantity | "percent";
  readonly values: (solution: Solution) => Float64Array;
  readonly needsDatum?: boolean;
}

const COLUMNS: readonly LevelColumn[] = [
  { title: "Elevation", quantity: "elevation", values: ({ levels }) => levels.elevationM, needsDatum: true },
  { title: "Density", quantity: "density", values: ({ levels }) => levels.rhoKgM3 },
  { title: "Gauge", quantity: "gaugePressure", values: ({ levels }) => levels.gaugePressureKPa },
  { title: "Absolute", quantity: "absolutePressure", values: ({ levels }) => levels.absPressureKPa },
  { title: "Departure", quantity: "departure", values: ({ levels }) => levels.departureKPa },
  { title: "± (k = 2)", quantity: "departure", values: ({ levelUncertainty }) => levelUncertainty.expandedKPa },
  { title: "", quantity: "percent", values: ({ levels }) => levels.departureFrac },
];

/** The levels in the cast in hand, and which of the visible casts presses hardest there. */
export function LevelsTable() {
  const { system } = state.value;
  const inHand = castInHand.value;
  const { levels, basis } = solved.value.survey;
  const columns = COLUMNS.filter((column) => !column.needsDatum || basis.waterSurfaceElevationM !== null);
  return (
    <section class="level-table" aria-label="Levels">
      <div class="table-head">
        <h2>Levels in {inHand?.cast.name ?? "no cast"}</h2>
        <AddLevel system={system} />
      </div>
      {levels.length === 0 ? (
        <p class="note">
          No level yet. Click in the charts at the depth of an instrument or an intake, or type its depth above.
        </p>
      ) : (
        <div class="scroller">
          <table>
            <thead>
              <tr>
                <th scope="col">Level</th>
                <th scope="col">Depth {unitLabel("depth", system)}</th>
                {columns.map(({ title, quantity }) => (
                  <th key={title + quantity} scope="col">
                    {title} {quantity === "percent" ? "%" : unitLabel(quantity, system)}
                  </th>
                ))}
                <th scope="col">Greatest gauge {unitLabel("gaugePressure", system)}</th>
              </tr>
            </thead>
            <tbody>
              {levels.map((level, k) => (
                <LevelRow key={level.id} level={level} levelIndex={k} columns={columns} system={system} />
              ))}
            </tbody>
          </table>
        </div>
      )}
    </section>
  );
}

interface RowProps {
  readonly level: Level;
  readonly levelIndex: number;
  readonly columns: readonly LevelColumn[];
  readonly system: DisplaySystem;
}

function LevelRow({ level, levelIndex, columns, system }: RowProps) {
  const solution = castInHand.value?.solution ?? null;
  const note = solution ? BEHIND_NOTE[behindDepth(solution.column, level.depthM)] : "";
  const cell = ({ quantity, values }: LevelColumn): string => {
    const value = solution ? values(solution)[levelIndex]! : Number.NaN;
    return quantity === "percent" ? shownPercent(value) : shownNumber(value, quantity, system);
  };
  return (
    <tr>
      <th scope="row">
        <input
          type="text"
          class="level-name"
          maxLength={40}
          aria-label={`Name of ${level.name}`}
          value={level.name}
          onChange={(event) =>
            dispatch({ kind: "level-renamed", levelId: level.id, name: event.currentTarget.value.trim() || level.name })
          }
        />
        <button
          type="button"
          class="plain remove"
          aria-label={`Delete ${level.name}`}
          title="Delete"
          onClick={() => dispatch({ kind: "level-removed", levelId: level.id })}
        >
          ×
        </button>
        {note ? <small class="warn">{note}</small> : null}
      </th>
      <td>
        <QuantityEntry
          label={`Depth of ${level.name}`}
          isCell
          value={level.depthM}
          quantity="depth"
          system={system}
          least={0}
          most={DEEPEST_LEVEL_M}
          onValue={(depthM) => depthM !== null && dispatch({ kind: "level-moved", levelId: level.id, depthM })}
        />
      </td>
      {columns.map((column) => (
        <td key={column.title + column.quantity}>{cell(column)}</td>
      ))}
      <td>
        <Governing levelIndex={levelIndex} system={system} />
      </td>
    </tr>
  );
}

function Governing({
  levelIndex,
  system,
}: {
  readonly levelIndex: number;
  readonly system: DisplaySystem;
}): ComponentChildren {
  const governing = governingCast(visibleCasts.value, levelIndex);
  if (!governing) return "–";
  return (
    <>
      <span class={`dot c${state.value.colourIndexOf[governing.castId] ?? 0}`} /> {governing.name}{" "}
      {shownNumber(governing.gaugePressureKPa, "gaugePressure", system)}
    </>
  );
}

function AddLevel({ system }: { readonly system: DisplaySystem }) {
  return (
    <QuantityEntry
      label="Add a level at depth"
      value={null}
      quantity="depth"
      system={system}
      least={0}
      most={DEEPEST_LEVEL_M}
      onValue={(depthM) => depthM !== null && dispatch({ kind: "level-added", depthM })}
    />
  );
}
