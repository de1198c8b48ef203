import { type DisplaySystem, formatNumber } from "../../units/index.ts";
import type { Layering } from "../../worker/index.ts";
import { shownNumber, shownValue } from "./shown.ts";

const VERDICT = { stable: "stable", neutral: "mixed throughout", unstable: "unstable" } as const;

const fixed = (value: number, digitsCount: number): string => formatNumber(value, { digitsCount });

/** The layering of a column in a few lines: what, and the value with its unit. */
export function layeringRows(
  { stability, mixedLayer, pycnoclines, potentialEnergyAnomalyJM3, twoLayers, modes }: Layering,
  system: DisplaySystem,
): readonly (readonly [string, string])[] {
  const depth = (valueM: number): string => shownValue(valueM, "depth", system);
  const { depthM, reachesBottom } = mixedLayer.byThreshold;
  const [main, ...others] = pycnoclines;
  const speed = modes?.speedMs[0];
  const { greatestInversion } = stability;
  return [
    ["The water is", VERDICT[stability.verdict]],
    ...(stability.verdict === "unstable" && greatestInversion
      ? [
          [
            "Heavy over light",
            `${depth(greatestInversion.heavyDepthM)} over ${depth(greatestInversion.lightDepthM)}`,
          ] as const,
        ]
      : []),
    ["Mixed layer", reachesBottom ? "to the bottom" : depth(depthM)],
    ["Pycnocline", main ? `${depth(main.depthM)}, ${depth(main.thicknessM)} thick` : "none"],
    ...(others.length > 0 ? [["Others at", others.map((one) => depth(one.depthM)).join(", ")] as const] : []),
    [
      "Two layers",
      twoLayers
        ? `${shownNumber(twoLayers.means.upperRhoKgM3, "density", system)} / ${shownValue(twoLayers.means.lowerRhoKgM3, "density", system)}`
        : "–",
    ],
    ["Potential energy anomaly", `${fixed(potentialEnergyAnomalyJM3, 1)}\u00a0J/m³`],
    ["Long internal waves", speed === undefined ? "–" : `${fixed(speed, 2)}\u00a0m/s`],
  ];
}
