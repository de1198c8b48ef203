import type { ColumnAnswer, Question } from "../../cast/index.ts";

interface QuestionsProps {
  readonly questions: readonly Question[];
  readonly onAnswer: (answer: ColumnAnswer) => void;
}

/** What is open about a file: until it is answered nothing is computed from the column. */
export function ReadingQuestions({ questions, onAnswer }: QuestionsProps) {
  return questions.map(({ code, columnIndex, message, choices }) => (
    <fieldset key={`${code} ${columnIndex}`} class="question">
      <legend class="warn">Needs your answer</legend>
      <p>{message}</p>
      <p class="actions">
        {choices.map(({ label, answer }) => (
          <button key={label} type="button" onClick={() => onAnswer(answer)}>
            {label}
          </button>
        ))}
      </p>
    </fieldset>
  ));
}
