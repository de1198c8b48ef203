import type { Samples } from "../cast/index.ts";

const keys = new WeakMap<Samples, string>();

/** Notes under which key the solving thread and the database have some samples. */
export const noteSamplesKey = (samples: Samples, key: string): void => {
  keys.set(samples, key);
};

export const samplesKeyOf = (samples: Samples): string => keys.get(samples)!;
