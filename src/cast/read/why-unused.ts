/** Why a column is not used whose name has no role. */
import { choose } from "./ask.ts";
import { type Decision, doubt, leave, type NamedPlace } from "./decision.ts";
import { LONGEST_NAME } from "./read-header-cell.ts";

const UNUSED_NAMES: readonly (readonly [RegExp, string])[] = [
  [/^$/, "it has no name"],
  [/discrete|bottle/i, "single water samples, not the probe"],
  [/baro|(air|atmos\w*)[\W_]*press/i, "pressure of the air"],
  [/potential|conservative|theta/i, "temperature in situ is needed"],
  [/secchi/i, "a depth of the place, not of the sample"],
];

const EC = /^e\.?c\.?([\W_]|$)/i;

/** EC is written for conductivity as measured and for what an instrument has compensated to 25 degC. */
function compensatedOrNot(place: NamedPlace): Decision {
  const { name } = place;
  const unit = /u|µ|μ/i.test(place.header) ? "uS/cm" : /ms/i.test(place.header) ? "mS/cm" : null;
  const message = `"${place.header}" does not say whether it is compensated to 25 degC; name it conductivity or specific conductance`;
  return doubt(
    place,
    "EC does not say whether it is compensated to 25 degC; name it conductivity or specific conductance",
    {
      code: "compensated-or-not",
      message,
      choices: [choose(name, "specificConductance", unit), choose(name, "conductivity", unit)],
    },
  );
}

export function whyUnused(place: NamedPlace): Decision {
  const header = place.header.slice(0, LONGEST_NAME);
  const known = UNUSED_NAMES.find(([pattern]) => pattern.test(header));
  if (known) return leave(place, known[1]);
  return EC.test(header) ? compensatedOrNot(place) : leave(place, "its name is none known here", "likely");
}
