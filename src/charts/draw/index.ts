export { drawLevels } from "./draw-levels.ts";
export { drawPlumb } from "./draw-plumb.ts";
export { drawSheet } from "./draw-sheet.ts";
