export interface Understood {
  readonly file: string;
  /** What makes the file hard. */
  readonly trap: string;
  readonly casts: number;
  /** Over all casts; what was left out is not among them. */
  readonly samples: number;
  /** Role and unit of each column in use, in the order of the file. */
  readonly reads: string;
  readonly first: Readonly<Record<string, number>>;
  readonly last: Readonly<Record<string, number>>;
  /** Codes of the questions that must be open. */
  readonly asks: readonly string[];
  /** Codes of the issues about the file and its casts, each once. */
  readonly says: readonly string[];
  /** Of the first cast, as far as they matter: time, place, station. */
  readonly cast: Readonly<Record<string, string | number | null>>;
}

/** Files that must be refused, and the code of the reason. */
export interface Refused {
  readonly file: string;
  readonly trap: string;
  readonly refusedFor: string;
}

type Row = readonly [depthM: number, inSituTempC: number, practicalSalinity?: number];

const sampleOf = ([depthM, inSituTempC, practicalSalinity]: Row): Readonly<Record<string, number>> =>
  practicalSalinity === undefined ? { depthM, inSituTempC } : { depthM, inSituTempC, practicalSalinity };

export const DTS = "depth m, temperature degC, practicalSalinity 1";
export const DT = "depth m, temperature degC";
export const NO_SALT = ["temperature-only"];
/** The lowering that most of the invented files hold. */
export const FIRST: Row = [0.5, 18.25, 2.1];
export const LAST: Row = [5, 11.9, 24.6];

type Part = Partial<Omit<Understood, "file" | "trap" | "first" | "last">>;

/** One lowering of depth, temperature and salinity, unless `part` says otherwise. */
export function file(
  name: string,
  trap: string,
  first: Row | Readonly<Record<string, number>> = FIRST,
  last: Row | Readonly<Record<string, number>> = LAST,
  part: Part = {},
): Understood {
  const values = (row: Row | Readonly<Record<string, number>>) =>
    Array.isArray(row) ? sampleOf(row as Row) : (row as Readonly<Record<string, number>>);
  return {
    file: name,
    trap,
    casts: 1,
    samples: first === FIRST && last === LAST ? 5 : 2,
    reads: DTS,
    asks: [],
    says: [],
    cast: {},
    ...part,
    first: values(first),
    last: values(last),
  };
}

/** A file that makes no cast before its questions are answered. */
export const waiting = (name: string, trap: string, reads: string, ...asks: readonly string[]): Understood =>
  file(name, trap, {}, {}, { casts: 0, samples: 0, reads, asks, says: asks });

export const SC = "depth m, temperature degC, specificConductance uS/cm";
