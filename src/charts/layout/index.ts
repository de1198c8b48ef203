export { depthAtPx } from "./depth-axis.ts";
export { layOutPlumb, type PlumbLayout, type PlumbValue } from "./lay-out-plumb.ts";
export { layOutSheet } from "./lay-out-sheet.ts";
export type { CurveInput, LevelInput, PanelInput, SheetInput, SheetLayout, Size } from "./sheet.ts";
export { type ThumbnailRange, thumbnailPath } from "./thumbnail-path.ts";
export { powerOfTen } from "./value-axis.ts";
