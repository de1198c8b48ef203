const SUPERSCRIPT: Readonly<Record<string, string>> = {
  "-": "⁻",
  "0": "⁰",
  "1": "¹",
  "2": "²",
  "3": "³",
  "4": "⁴",
  "5": "⁵",
  "6": "⁶",
  "7": "⁷",
  "8": "⁸",
  "9": "⁹",
};

/** @example powerOfTen(-4) // "10⁻⁴" */
export const powerOfTen = (exponent: number): string =>
  `10${[...String(exponent)].map((character) => SUPERSCRIPT[character]).join("")}`;
