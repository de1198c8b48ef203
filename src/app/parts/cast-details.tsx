import { type KeptReading, readingsOf } from "../state/app-state.ts";
import { castInHand, state } from "../store.ts";
import { IssueList } from "./issue-list.tsx";

/** What was met on the way to the cast in hand, and how its file was understood: every decision can be checked. */
export function CastDetails() {
  const inHand = castInHand.value;
  if (!inHand) return null;
  const reading = readingsOf(state.value).find(({ fileName }) => fileName === inHand.cast.fileName);
  const { issues } = inHand;
  return (
    <section aria-label="About this cast">
      {issues.length > 0 ? (
        <details open={inHand.solution === null}>
          <summary>
            {issues.length} {issues.length === 1 ? "remark" : "remarks"} on this cast
          </summary>
          <IssueList issues={issues} />
        </details>
      ) : null}
      {reading ? (
        <details>
          <summary>How the file was read</summary>
          <HowRead reading={reading} />
        </details>
      ) : null}
    </section>
  );
}

function HowRead({ reading }: { readonly reading: KeptReading }) {
  const mark = reading.decimalMark === "." ? "period" : "comma";
  return (
    <div class="how-read">
      <p>
        <b>{reading.fileName}</b>: {reading.encoding}, columns separated by {reading.delimiter}, decimal {mark}, names
        in line {reading.headerLineIndex}, {reading.rowCount} rows. Casts told apart by {reading.splitBy}.
      </p>
      <dl>
        {reading.columns.map((column) => (
          <div key={column.columnIndex}>
            <dt>
              <b>{column.header || `column ${column.columnIndex + 1}`}</b> {column.role ? "→ " : ""}
              {column.role ? inWords(column.role) : ""}
              {column.unit && column.unit !== "1" ? `, ${column.unit}` : ""}
            </dt>
            <dd>
              {column.confidence === "sure" ? "" : <b class="warn">{column.confidence} </b>}
              {column.reason}
            </dd>
          </div>
        ))}
      </dl>
    </div>
  );
}

/** @example inWords("specificConductance") // "specific conductance" */
const inWords = (role: string): string => role.replace(/[A-Z]/g, (letter) => ` ${letter.toLowerCase()}`);
