import { useEffect, useId, useState } from "preact/hooks";
import { convert, type DisplaySystem, displayUnit, type UnitSymbol, unitOf } from "../../units/index.ts";
import { ownUnit, type PageQuantity } from "../show/shown.ts";

const TRUE_MINUS = "−";

/** More decimals than anybody types: they come of a change of units. */
const MOST_TYPED_DECIMALS_COUNT = 4;

/** As many digits as were given, but none that a change of units made up. */
function entryText(value: number | null, digitsCount: number): string {
  if (value === null) return "";
  const given = String(Number(value.toPrecision(8)));
  const isTyped = (given.split(".")[1] ?? "").length <= MOST_TYPED_DECIMALS_COUNT;
  return (isTyped ? given : String(Number(value.toFixed(digitsCount)))).replace("-", TRUE_MINUS);
}

const parsed = (text: string): number => {
  const plain = text.trim().replace(TRUE_MINUS, "-").replace(",", ".");
  return plain === "" ? Number.NaN : Number(plain);
};

interface EntryProps {
  readonly label: string;
  /** In the program's own unit. */
  readonly value: number | null;
  readonly least: number;
  readonly most: number;
  /** What shows in an empty entry; with it, an empty entry means null. */
  readonly emptyMeans?: string;
  readonly onValue: (value: number | null) => void;
  readonly isLabelHidden?: boolean;
}

interface UnitProps {
  readonly unit: UnitSymbol;
  readonly shownUnit: UnitSymbol;
  /** Decimals where a change of units would show more than was typed. */
  readonly digitsCount: number;
}

/** An entry for one number. What it cannot take it refuses with the range in a sentence; the last good value stays. */
export function NumberEntry(props: EntryProps & UnitProps) {
  const { label, value, unit, shownUnit, digitsCount, emptyMeans, isLabelHidden } = props;
  const id = useId();
  const good = entryText(value === null ? null : convert(value, unit, shownUnit), digitsCount);
  const [text, setText] = useState(good);
  const [refusal, setRefusal] = useState("");
  const unitLabel = unitOf(shownUnit).label;
  useEffect(() => {
    setText(good);
    setRefusal("");
  }, [good]);

  const commit = (): void => {
    if (text === good) return;
    if (text.trim() === "" && emptyMeans !== undefined) {
      props.onValue(null);
      return;
    }
    const entered = convert(parsed(text), shownUnit, unit);
    if (entered >= props.least && entered <= props.most) {
      setRefusal("");
      // A new value comes back as props and replaces this.
      setText(good);
      props.onValue(entered);
      return;
    }
    const [least, most] = [props.least, props.most].map((end) =>
      entryText(Number(convert(end, unit, shownUnit).toPrecision(4)), digitsCount),
    );
    const range = `from ${least} to ${most}${unitLabel && ` ${unitLabel}`}`;
    setRefusal(`${label} must be a number ${range}; ${kept(good, emptyMeans)}`);
  };
  const onKeyDown = (event: KeyboardEvent): void => {
    if (event.key === "Enter") commit();
    if (event.key !== "Escape") return;
    setText(good);
    setRefusal("");
  };

  return (
    <div class={`entry${refusal ? " refused" : ""}`}>
      <label for={id} class={isLabelHidden ? "hidden-text" : ""}>
        {label}
      </label>
      <span class="field">
        <input
          id={id}
          type="text"
          inputMode="decimal"
          autocomplete="off"
          value={text}
          placeholder={emptyMeans ?? ""}
          aria-invalid={refusal !== ""}
          aria-describedby={refusal ? `${id}-refusal` : undefined}
          onInput={(event) => setText(event.currentTarget.value)}
          onBlur={commit}
          onKeyDown={onKeyDown}
        />
        {unitLabel && (text !== "" || emptyMeans === undefined) && !isLabelHidden ? (
          <span class="unit">{unitLabel}</span>
        ) : null}
      </span>
      {refusal ? (
        <p class="refusal" id={`${id}-refusal`} role="alert">
          {refusal}
        </p>
      ) : null}
    </div>
  );
}

const kept = (good: string, emptyMeans: string | undefined): string =>
  good === "" ? `it stays ${emptyMeans ?? "empty"}` : `${good} stays`;

/** A number entry in the unit that the page shows for a quantity. */
export function QuantityEntry(props: EntryProps & { readonly quantity: PageQuantity; readonly system: DisplaySystem }) {
  const { quantity, system, ...rest } = props;
  const shown = displayUnit(quantity, system);
  return <NumberEntry {...rest} unit={ownUnit(quantity)} shownUnit={shown.unit} digitsCount={shown.digitsCount} />;
}
