import type { JSX } from "preact";
import { useId, useState } from "preact/hooks";
import { convert, type DisplaySystem, displayUnit, type UnitSymbol, unitOf } from "../../units/index.ts";
import { ownUnit, type PageQuantity } from "../show/shown.ts";

const TRUE_MINUS = "−";

/** More decimals than anybody types: they come of a change of units. */
const MOST_TYPED_DECIMALS_COUNT = 4;

/** As many digits as were given, but none that a change of units made up. */
function entryText(value: number | null, digitsCount: number, isPadded = false): string {
  if (value === null) return "";
  const given = String(Number(value.toPrecision(8)));
  const decimalsCount = (given.split(".")[1] ?? "").length;
  const fixed = value.toFixed(digitsCount);
  const isFixed = decimalsCount > MOST_TYPED_DECIMALS_COUNT || (isPadded && decimalsCount < digitsCount);
  return (isFixed ? (isPadded ? fixed : String(Number(fixed))) : given).replace("-", TRUE_MINUS);
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
  /** In a table: no visible label or unit, and as many decimals as its neighbours. */
  readonly isCell?: boolean;
}

interface UnitProps {
  readonly unit: UnitSymbol;
  readonly shownUnit: UnitSymbol;
  /** Decimals where a change of units would show more than was typed. */
  readonly digitsCount: number;
}

/** An entry for one number. What it cannot take it refuses with the range in a sentence; the last good value stays. */
export function NumberEntry(props: EntryProps & UnitProps) {
  const { label, value, unit, shownUnit, digitsCount, emptyMeans, isCell } = props;
  const id = useId();
  const good = entryText(value === null ? null : convert(value, unit, shownUnit), digitsCount, isCell);
  // What is being typed and not yet taken; null shows the good value, whatever that has become meanwhile.
  const [draft, setDraft] = useState<string | null>(null);
  const [refusedRange, setRefusedRange] = useState("");
  const text = draft ?? good;
  const unitLabel = unitOf(shownUnit).label;
  const refusal = refusedRange && `${label} must be a number ${refusedRange}; ${kept(good, emptyMeans)}`;

  const settle = (): void => {
    setDraft(null);
    setRefusedRange("");
  };
  const commit = (typed: string): void => {
    const meansNull = typed.trim() === "" && emptyMeans !== undefined;
    const entered = meansNull ? null : convert(parsed(typed), shownUnit, unit);
    if (typed === good || entered === null || (entered >= props.least && entered <= props.most)) {
      settle();
      if (typed !== good) props.onValue(entered);
      return;
    }
    const [least, most] = [props.least, props.most].map((end) =>
      entryText(Number(convert(end, unit, shownUnit).toPrecision(4)), digitsCount),
    );
    setRefusedRange(`from ${least} to ${most}${unitLabel && ` ${unitLabel}`}`);
  };
  const onKeyDown = (event: JSX.TargetedKeyboardEvent<HTMLInputElement>): void => {
    if (event.key === "Enter") commit(event.currentTarget.value);
    if (event.key === "Escape") settle();
  };

  return (
    <div class={`entry${refusal ? " refused" : ""}`}>
      <label for={id} class={isCell ? "hidden-text" : ""}>
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
          onInput={(event) => setDraft(event.currentTarget.value)}
          onBlur={(event) => commit(event.currentTarget.value)}
          onKeyDown={onKeyDown}
        />
        {unitLabel && (text !== "" || emptyMeans === undefined) && !isCell ? (
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
