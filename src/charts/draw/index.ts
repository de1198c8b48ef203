export { drawLevels } from "./draw-levels.ts";
export { drawMarks } from "./draw-marks.ts";
export { drawPlumb } from "./draw-plumb.ts";
export { drawSelection } from "./draw-selection.ts";
export { drawSheet } from "./draw-sheet.ts";
