export { drawPlumb } from "./draw-plumb.ts";
export { drawSheet } from "./draw-sheet.ts";
