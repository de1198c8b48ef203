import type { Issue } from "../base/index.ts";
import type { Cast } from "../cast/index.ts";

/**
 * A cast after its tests and preparation. Every sample that was read is still accounted for; plain data, so that it can
 * be handed between threads.
 */
export interface PreparedCast {
  /** The samples that go into the column; same id and name. The very cast that was read where nothing had to be done. */
  readonly cast: Cast;
  /** Quality flag (QARTOD) of each sample as read. */
  readonly flag: Uint8Array;
  /** Of each sample as read: in plain sentences, why it is flagged or left out. */
  readonly reasons: readonly (readonly string[])[];
  /** Of each sample as read: 1 where it goes into the column, alone or in a bin. */
  readonly use: Uint8Array;
  /** Which sample as read each prepared sample is; the first of a bin. */
  readonly sampleIndexOf: Int32Array;
  /** Quality flag of each prepared sample; the worst of a bin. */
  readonly preparedFlag: Uint8Array;
  /** How many samples each prepared sample is the mean of; null without bins. */
  readonly binCount: Int32Array | null;
  /** What the tests and the preparation found, said once for the cast. */
  readonly issues: readonly Issue[];
}
