import { computed } from "@preact/signals";
import { type Budget, budgetOf, type Level } from "../../survey/index.ts";
import { shownValue } from "../show/shown.ts";
import { castInHand, solved, state } from "../store.ts";

interface PlacedBudget {
  readonly place: string;
  readonly budget: Budget;
}

/** Of every level in the cast in hand, or of its bottom where there are no levels. */
const budgets = computed((): readonly PlacedBudget[] => {
  const inHand = castInHand.value;
  if (!inHand?.solution) return [];
  const { levels } = solved.value.survey;
  const { levelUncertainty } = inHand.solution;
  const placed = (place: string, budget: Budget | null): readonly PlacedBudget[] => (budget ? [{ place, budget }] : []);
  if (levels.length > 0) return levels.flatMap((level: Level, k) => placed(level.name, budgetOf(levelUncertainty, k)));
  return placed("The bottom", inHand.bottomBudget);
});

/** How uncertain the pressures are that the user asked for, and what makes them so. */
export function UncertaintyBudget() {
  if (budgets.value.length === 0) return null;
  return (
    <section aria-label="Uncertainty" class="budget">
      <h2>Uncertainty of pressure</h2>
      {budgets.value.map(({ place, budget }) => (
        <div key={place}>
          <p>
            {place}: <b>± {shownValue(budget.expandedKPa, "departure", state.value.system)}</b> (k = 2)
          </p>
          <p class="note">{capitalised(budget.sentence)}.</p>
        </div>
      ))}
    </section>
  );
}

const capitalised = (sentence: string): string => sentence.charAt(0).toUpperCase() + sentence.slice(1);
