import type { Signal } from "@preact/signals";
import { useRef } from "preact/hooks";
import { readFiles } from "../reading-files.ts";
import { dispatch, state, survey } from "../store.ts";
import { ExportMenu } from "./export-menu.tsx";

const SYSTEMS = ["SI", "US"] as const;

export function Header({ isBasisOpen }: { readonly isBasisOpen: Signal<boolean> }) {
  const { past, future } = state.value.history;
  const hasCasts = survey.value.casts.length > 0;
  return (
    <header class="top">
      <h1>Layerhead</h1>
      {hasCasts ? <SurveyName /> : null}
      <span class="spacer" />
      <button type="button" class="plain" disabled={past.length === 0} onClick={() => dispatch({ kind: "undone" })}>
        Undo
      </button>
      <button type="button" class="plain" disabled={future.length === 0} onClick={() => dispatch({ kind: "redone" })}>
        Redo
      </button>
      <fieldset class="switch">
        <legend class="hidden-text">Units</legend>
        {SYSTEMS.map((system) => (
          <label key={system} class={state.value.system === system ? "on" : ""}>
            <input
              type="radio"
              name="system"
              checked={state.value.system === system}
              onChange={() => dispatch({ kind: "system-chosen", system })}
            />
            {system}
          </label>
        ))}
      </fieldset>
      <button
        type="button"
        class="narrow-only"
        aria-expanded={isBasisOpen.value}
        aria-controls="basis"
        onClick={() => {
          isBasisOpen.value = !isBasisOpen.value;
        }}
      >
        Basis
      </button>
      <AddCasts />
      <ExportMenu />
    </header>
  );
}

function SurveyName() {
  return (
    <input
      class="survey-name"
      type="text"
      aria-label="Name of the survey"
      value={survey.value.name}
      onChange={(event) => dispatch({ kind: "survey-renamed", name: event.currentTarget.value.trim() })}
    />
  );
}

/** A button that opens the file chooser; the input itself stays out of sight but can be reached by scripts. */
function AddCasts() {
  const input = useRef<HTMLInputElement>(null);
  return (
    <>
      <button type="button" onClick={() => input.current?.click()}>
        Add casts
      </button>
      <input
        ref={input}
        type="file"
        multiple
        hidden
        aria-label="Cast files"
        onChange={(event) => {
          const chosen = event.currentTarget;
          void readFiles([...(chosen.files ?? [])]).then(() => {
            chosen.value = "";
          });
        }}
      />
    </>
  );
}
