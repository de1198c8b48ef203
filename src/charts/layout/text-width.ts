/** Mean advance of a character of the sheet's 11 px system font, generous so that labels never touch. */
const ADVANCE_PX = 6.3;
const SUPERSCRIPTS = /[⁰¹²³⁴-⁹⁻]/gu;
const SUPERSCRIPT_SAVING_PX = 2;
const TITLE_ADVANCE_PX = 6.8;

/** Room a tick or level label takes, estimated: a layout has no page to measure on. */
export const labelWidthPx = (label: string): number =>
  label.length * ADVANCE_PX - (label.match(SUPERSCRIPTS)?.length ?? 0) * SUPERSCRIPT_SAVING_PX;

/** Room a panel title takes. */
export const titleWidthPx = (title: string): number => title.length * TITLE_ADVANCE_PX;
