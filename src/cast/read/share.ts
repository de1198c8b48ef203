/** Told now and then, in order, which share of the work is done, from 0 to 1. */
export type OnShare = (doneFrac: number) => void;

export const untold: OnShare = () => {};

/** Tells a part of the work as the share that it is of the whole. */
export const within =
  (onShare: OnShare, fromFrac: number, toFrac: number): OnShare =>
  (doneFrac) =>
    onShare(fromFrac + doneFrac * (toFrac - fromFrac));
