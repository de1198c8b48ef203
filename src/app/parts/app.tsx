import { useSignal } from "@preact/signals";
import { readingsOf } from "../state/app-state.ts";
import { dispatch, progress, savingTrouble, solved, solvingTrouble, state, survey } from "../store.ts";
import { useFileDrop } from "../use-file-drop.ts";
import { useFlagKey } from "../use-flag-key.ts";
import { useUndoKeys } from "../use-undo-keys.ts";
import { BasisPanel } from "./basis-panel.tsx";
import { CastDetails } from "./cast-details.tsx";
import { CastList } from "./cast-list.tsx";
import { CastSummary } from "./cast-summary.tsx";
import { EmptyState } from "./empty-state.tsx";
import { FileTroubles } from "./file-troubles.tsx";
import { FlagBar } from "./flag-bar.tsx";
import { Header } from "./header.tsx";
import { LevelsTable } from "./levels-table.tsx";
import { NumbersTable } from "./numbers-table.tsx";
import { PreparationRows } from "./preparation-rows.tsx";
import { ProfileCharts } from "./profile-charts.tsx";
import { ReadingJobs } from "./reading-jobs.tsx";
import { ReadingPanel } from "./reading-panel.tsx";
import { Readout } from "./readout.tsx";
import { StationPanel } from "./station-panel.tsx";
import { UncertaintyBudget } from "./uncertainty-budget.tsx";

export function App() {
  const isBasisOpen = useSignal(false);
  const isDropping = useFileDrop();
  useUndoKeys();
  useFlagKey();
  return (
    <div class={`page${isDropping.value ? " dropping" : ""}`}>
      <Header isBasisOpen={isBasisOpen} />
      <CastList />
      <main>
        <ReadingJobs />
        <FileTroubles />
        <ReadingPanel />
        <StationPanel />
        <Notes />
        <Progress />
        {isEmpty() ? <EmptyState /> : <ColumnPlace />}
      </main>
      <aside id="basis" class={isBasisOpen.value ? "open" : ""} aria-label="Basis and summary">
        <BasisPanel />
        <PreparationRows />
        <UncertaintyBudget />
        <CastSummary />
        <CastDetails />
      </aside>
    </div>
  );
}

const isEmpty = (): boolean => survey.value.casts.length === 0 && readingsOf(state.value).length === 0;

function ColumnPlace() {
  if (solved.value.casts.length === 0) return null;
  return (
    <>
      <div class="place">
        <h2>Column</h2>
        <FlagBar />
      </div>
      <ProfileCharts />
      <Readout />
      <LevelsTable />
      <NumbersTable />
    </>
  );
}

function Notes() {
  const troubles = [savingTrouble.value, solvingTrouble.value].filter((trouble) => trouble !== "");
  return (
    <div class="notes" role="status">
      {troubles.map((trouble) => (
        <p key={trouble} class="warn">
          {trouble}
        </p>
      ))}
    </div>
  );
}

/** Lies over the place's heading, so that nothing moves when it comes and goes. */
function Progress() {
  const running = progress.value;
  return running ? (
    <p class="progress">
      Solving: {running.doneCount} of {running.allCount} casts done{" "}
      <button type="button" class="small" onClick={() => dispatch({ kind: "undone" })}>
        Stop and undo
      </button>
    </p>
  ) : null;
}
