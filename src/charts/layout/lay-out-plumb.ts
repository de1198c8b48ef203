import { depthPx } from "./depth-axis.ts";
import type { SheetLayout } from "./sheet.ts";
import { valuePx } from "./value-axis.ts";

/** One cast at the depth of the plumb line, its value in each panel by the panel's id. */
export interface PlumbValue {
  readonly colourIndex: number;
  readonly isInHand: boolean;
  readonly values: Readonly<Record<string, number>>;
}

export interface PlumbLayout {
  readonly yPx: number;
  readonly leftPx: number;
  readonly rightPx: number;
  readonly dots: readonly {
    readonly xPx: number;
    readonly colourIndex: number;
    readonly isInHand: boolean;
  }[];
}

/** A line through all panels with a dot on every curve; the cast in hand comes last, so that it lies on top. */
export function layOutPlumb(sheet: SheetLayout, depth: number, casts: readonly PlumbValue[]): PlumbLayout {
  const dots = sheet.panels.flatMap(({ id, axis }) =>
    casts.flatMap(({ colourIndex, isInHand, values }) => {
      const xPx = valuePx(axis, values[id] ?? Number.NaN);
      return xPx >= axis.leftPx - 0.5 && xPx <= axis.rightPx + 0.5 ? [{ xPx, colourIndex, isInHand }] : [];
    }),
  );
  dots.sort((a, b) => Number(a.isInHand) - Number(b.isInHand));
  return { yPx: depthPx(sheet.depth, depth), leftPx: sheet.leftPx, rightPx: sheet.rightPx, dots };
}
