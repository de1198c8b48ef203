import { useId } from "preact/hooks";

interface ChoiceProps<T extends string> {
  readonly label: string;
  readonly value: T;
  readonly options: readonly (readonly [value: T, text: string])[];
  readonly onValue: (value: T) => void;
}

/** One of a few, by name. */
export function Choice<T extends string>({ label, value, options, onValue }: ChoiceProps<T>) {
  const id = useId();
  return (
    <div class="entry">
      <label for={id}>{label}</label>
      <span class="field">
        <select id={id} value={value} onChange={(event) => onValue(event.currentTarget.value as T)}>
          {options.map(([option, text]) => (
            <option key={option} value={option} selected={option === value}>
              {text}
            </option>
          ))}
        </select>
      </span>
    </div>
  );
}
