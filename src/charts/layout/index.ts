export { depthAtPx, depthPx } from "./depth-axis.ts";
export { layOutLevels } from "./lay-out-levels.ts";
export { layOutMarks, type MarkInput, type MarksLayout } from "./lay-out-marks.ts";
export { layOutPlumb, type PlumbLayout, type PlumbValue } from "./lay-out-plumb.ts";
export { layOutSheet } from "./lay-out-sheet.ts";
export { powerOfTen } from "./power-of-ten.ts";
export type { CurveInput, LevelInput, LevelLayout, PanelInput, SheetInput, SheetLayout, Size } from "./sheet.ts";
export { type ThumbnailRange, thumbnailPath } from "./thumbnail-path.ts";
