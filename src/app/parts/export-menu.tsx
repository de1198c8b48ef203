import { useSignal } from "@preact/signals";
import { useEffect, useRef } from "preact/hooks";
import { download } from "../download.ts";
import { readingsOf } from "../state/app-state.ts";
import { type ExportKind, exportFiles } from "../state/export-files.ts";
import { castInHand, solved, state } from "../store.ts";

const CHOICES: readonly { readonly kind: ExportKind; readonly label: string }[] = [
  { kind: "cast-profile", label: "Profile of this cast, CSV" },
  { kind: "all-profiles", label: "Profiles of all casts, CSV" },
  { kind: "levels", label: "Levels in all casts, CSV" },
  { kind: "everything", label: "Everything, JSON" },
];

/** A list under its button, never modal: Escape or a click elsewhere closes it. */
export function ExportMenu() {
  const isOpen = useSignal(false);
  const root = useRef<HTMLDivElement>(null);
  const close = (): void => {
    isOpen.value = false;
  };
  useEffect(() => {
    const closeOutside = (event: Event): void => {
      if (!root.current?.contains(event.target as Node)) close();
    };
    const closeByKey = (event: KeyboardEvent): void => {
      if (event.key === "Escape") close();
    };
    document.addEventListener("pointerdown", closeOutside);
    document.addEventListener("keydown", closeByKey);
    return () => {
      document.removeEventListener("pointerdown", closeOutside);
      document.removeEventListener("keydown", closeByKey);
    };
  }, []);
  const choose = (kind: ExportKind): void => {
    close();
    const { survey, casts } = solved.value;
    for (const file of exportFiles(kind, {
      survey,
      casts,
      inHand: castInHand.value,
      readings: readingsOf(state.value),
    }))
      download(file.name, file.mediaType, file.text);
  };
  const nothingYet = solved.value.casts.length === 0;
  return (
    <div class="menu" ref={root}>
      <button
        type="button"
        class="primary"
        disabled={nothingYet}
        aria-expanded={isOpen.value}
        onClick={() => {
          isOpen.value = !isOpen.value;
        }}
      >
        Export
      </button>
      {isOpen.value ? (
        <div class="choices">
          {CHOICES.map(({ kind, label }) => (
            <button
              key={kind}
              type="button"
              disabled={kind === "levels" && solved.value.survey.levels.length === 0}
              onClick={() => choose(kind)}
            >
              {label}
            </button>
          ))}
          <p class="note">
            SI units, full precision. A metadata file with columns, units and basis comes with each CSV.
          </p>
        </div>
      ) : null}
    </div>
  );
}
