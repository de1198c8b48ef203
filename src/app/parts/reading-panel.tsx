import type { ColumnAnswer } from "../../cast/index.ts";
import { answerColumn, filesGone, readAgain } from "../reading-files.ts";
import { type KeptReading, readingsOf } from "../state/app-state.ts";
import { openReading, state } from "../store.ts";
import { Choice } from "./choice.tsx";
import { IssueList } from "./issue-list.tsx";
import { ReadingQuestions } from "./reading-questions.tsx";
import { ReadingTable } from "./reading-table.tsx";

const NO_ANSWERS = { columns: [] };

/** How one file was understood, with a control for every decision; what is changed here is read again at once. */
export function ReadingPanel() {
  const reading = readingsOf(state.value).find(({ fileName }) => fileName === openReading.value);
  if (!reading) return null;
  const answer = (given: ColumnAnswer): void => void answerColumn(reading, given);
  const isGone = filesGone.value.includes(reading.fileName);
  return (
    <section class="panel-above reading" aria-label={`How ${reading.fileName} was read`}>
      <div class="heading">
        <h2>
          How <b>{reading.fileName}</b> was read
        </h2>
        {reading.sheets.length > 1 ? <SheetChoice reading={reading} /> : null}
        <button type="button" class="plain small" onClick={() => close()}>
          Close
        </button>
      </div>
      <p class="note">{summary(reading)}</p>
      {isGone ? <FileGone fileName={reading.fileName} /> : null}
      <Remembered reading={reading} />
      {reading.refusal.length > 0 ? (
        <div class="refused">
          <p class="warn">
            As it stands this gives no casts. Change an answer{reading.sheets.length > 1 ? " or the sheet" : ""}, or
            undo.
          </p>
          <IssueList issues={reading.refusal} />
        </div>
      ) : null}
      <ReadingQuestions questions={reading.questions} onAnswer={answer} />
      {reading.columns.length > 0 ? <ReadingTable reading={reading} onAnswer={answer} /> : null}
    </section>
  );
}

const close = (): void => {
  openReading.value = null;
};

function summary(reading: KeptReading): string {
  const { encoding, delimiter, decimalMark, headerLineIndex, rowCount, splitBy } = reading;
  const mark = decimalMark === "." ? "period" : "comma";
  const lines = headerLineIndex > 0 ? `, names in line ${headerLineIndex}` : "";
  return `${encoding}, columns separated by ${delimiter}, decimal ${mark}${lines}, ${rowCount} rows. Casts told apart by ${splitBy}.`;
}

function SheetChoice({ reading }: { readonly reading: KeptReading }) {
  return (
    <Choice
      label="Sheet"
      value={reading.sheet ?? ""}
      options={reading.sheets.map((sheet) => [sheet, sheet] as const)}
      onValue={(sheet) => void readAgain([reading], { answers: reading.answers, sheet }, "as-it-is")}
    />
  );
}

/** Says when answers given for an earlier file were used here. */
function Remembered({ reading }: { readonly reading: KeptReading }) {
  const { answers, areAnswersRemembered, headerKey } = reading;
  if (answers.columns.length === 0) return null;
  const isKept = headerKey in state.value.history.present.remembered;
  return (
    <p class="note">
      {areAnswersRemembered
        ? "Read with the answers you gave for an earlier file with the same headers."
        : isKept
          ? "Your answers are used for every file with these headers."
          : "Read with your answers."}{" "}
      <button type="button" class="small" onClick={() => void readAgain([reading], { answers: NO_ANSWERS }, "forget")}>
        Forget them
      </button>
    </p>
  );
}

function FileGone({ fileName }: { readonly fileName: string }) {
  return (
    <p class="warn" role="status">
      The bytes of {fileName} are no longer at hand, so it cannot be read again. Add the file once more; it takes the
      place of this reading.
    </p>
  );
}
