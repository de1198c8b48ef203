import type { ColumnAnswer, ColumnReading, ColumnRole, Confidence } from "../../cast/index.ts";
import { answerName, asAnswered, ROLE_GROUPS, unitsFor } from "../show/column-roles.ts";
import type { KeptReading } from "../state/app-state.ts";

interface TableProps {
  readonly reading: KeptReading;
  readonly onAnswer: (answer: ColumnAnswer) => void;
}

/** The first rows as found, under each column's name what it was taken for and why. */
export function ReadingTable({ reading, onAnswer }: TableProps) {
  const { headers, firstRows, answers, questions, refusal } = reading;
  const columns = refusal.length === 0 ? reading.columns : asAllAnswered(reading);
  const asked = new Set(questions.map(({ columnIndex }) => columnIndex));
  return (
    // biome-ignore lint/a11y/noNoninteractiveTabindex: what scrolls must be reached by keyboard
    <section class="scroller" tabIndex={0} aria-label="Columns and first rows of the file">
      <table class="as-found">
        <thead>
          <tr>
            {columns.map((column) => (
              <th key={column.columnIndex} scope="col" class={column.role === null ? "unused" : ""}>
                <ColumnHead
                  column={column}
                  name={answerName(headers, column.columnIndex)}
                  isSaid={answers.columns.some(({ header }) => header === answerName(headers, column.columnIndex))}
                  isAsked={asked.has(column.columnIndex)}
                  onAnswer={onAnswer}
                />
              </th>
            ))}
          </tr>
        </thead>
        <tbody>
          {firstRows.map((row, k) => (
            <tr key={k}>
              {columns.map(({ columnIndex, role }) => (
                <td key={columnIndex} class={role === null ? "unused" : ""}>
                  {row[columnIndex] ?? ""}
                </td>
              ))}
            </tr>
          ))}
        </tbody>
      </table>
    </section>
  );
}

const asAllAnswered = ({ columns, answers, headers }: KeptReading): readonly ColumnReading[] =>
  columns.map((column) => asAnswered(column, answers.columns, headers));

interface HeadProps {
  readonly column: ColumnReading;
  readonly name: string;
  readonly isSaid: boolean;
  readonly isAsked: boolean;
  readonly onAnswer: (answer: ColumnAnswer) => void;
}

function ColumnHead({ column, name, isSaid, isAsked, onAnswer }: HeadProps) {
  const { header, role, unit, reason } = column;
  const title = header || `column ${column.columnIndex + 1}`;
  const units = role === null ? [] : unitsFor(role, unit);
  return (
    <>
      <span class="header-text">{title}</span>
      <select
        aria-label={`${title} is`}
        value={role ?? "unused"}
        onChange={(event) =>
          onAnswer({ header: name, role: event.currentTarget.value as ColumnRole | "unused", unit: null })
        }
      >
        <option value="unused" selected={role === null}>
          not used
        </option>
        {ROLE_GROUPS.map(({ label, choices }) => (
          <optgroup key={label} label={label}>
            {choices.map((choice) => (
              <option key={choice.role} value={choice.role} selected={choice.role === role}>
                {choice.label}
              </option>
            ))}
          </optgroup>
        ))}
      </select>
      {role !== null && units.length > 0 ? (
        <select
          aria-label={`Unit of ${title}`}
          value={unit ?? ""}
          onChange={(event) => onAnswer({ header: name, role, unit: event.currentTarget.value || null })}
        >
          {unit === null ? (
            <option value="" selected>
              as found
            </option>
          ) : null}
          {units.map((symbol) => (
            <option key={symbol} value={symbol} selected={symbol === unit}>
              {symbol}
            </option>
          ))}
        </select>
      ) : null}
      <span class="why">
        <Sureness confidence={column.confidence} isSaid={isSaid} isAsked={isAsked} /> {reason}
      </span>
    </>
  );
}

/** In a word and a sign, so that it does not hang on colour. */
const SIGNS: Readonly<Record<Confidence, string>> = { sure: "●", likely: "◐", doubtful: "○" };

function Sureness({
  confidence,
  isSaid,
  isAsked,
}: {
  readonly confidence: Confidence;
  readonly isSaid: boolean;
  readonly isAsked: boolean;
}) {
  if (isAsked) return <b class="warn">? needs your answer:</b>;
  if (isSaid) return <b>● your answer:</b>;
  return (
    <b class={confidence === "doubtful" ? "warn" : ""}>
      <span aria-hidden="true">{SIGNS[confidence]}</span> {confidence}:
    </b>
  );
}
