/** Seeded damage to text files: the same seed makes the same bytes. */

export type Random = () => number;

/** Numbers in [0, 1) from a 32-bit seed (mulberry32, from memory); enough to choose damage with. */
export function randomOf(seed: number): Random {
  let state = seed >>> 0;
  return () => {
    state = (state + 0x6d2b79f5) >>> 0;
    let mixed = Math.imul(state ^ (state >>> 15), state | 1);
    mixed ^= mixed + Math.imul(mixed ^ (mixed >>> 7), mixed | 61);
    return ((mixed ^ (mixed >>> 14)) >>> 0) / 2 ** 32;
  };
}

export const below = (random: Random, n: number): number => Math.floor(random() * n);

export const pick = <T>(random: Random, items: readonly T[]): T => items[below(random, items.length)]!;

const bytesOf = (text: string): Uint8Array => new TextEncoder().encode(text);

function joined(...parts: readonly Uint8Array[]): Uint8Array {
  const whole = new Uint8Array(parts.reduce((sum, part) => sum + part.length, 0));
  let at = 0;
  for (const part of parts) {
    whole.set(part, at);
    at += part.length;
  }
  return whole;
}

/** Some bytes in place of others, at any place. */
function spliced(random: Random, bytes: Uint8Array, removedCount: number, added: Uint8Array): Uint8Array {
  const at = below(random, bytes.length + 1);
  return joined(bytes.subarray(0, at), added, bytes.subarray(at + removedCount));
}

/** Texts that have a meaning somewhere in a table. */
const TELLING = [
  ",",
  ";",
  "\t",
  "|",
  "  ",
  "\n",
  "\r",
  "\r\n",
  '"',
  '""',
  "#",
  "%",
  "//",
  "-",
  ".",
  "=",
  "\0",
  "\ufeff",
  "\u2212",
  "°",
  "1e999",
  "-1e999",
  "1e-400",
  "-0",
  "-999",
  "-9.99e-29",
  "1e35",
  "999999999999999999999",
  "0x10",
  "NaN",
  "Infinity",
  "1,234",
  "1.234,5",
  "1'234",
  "12:61",
  "2026-02-30",
  "31/31/31",
  "13/13/2026",
  "43843.5",
  "20260704134600",
  "38 02.5 N",
  "Depth (m)",
  "Depth (ft)",
  "Pressure (psia)",
  "Temp",
  "Temperature (K)",
  "Sal",
  "Cond",
  "EC",
  "TDS (mg/L)",
  "Elevation",
  "Date",
  "Time",
  "Station",
  "Lat",
  "Lon (W)",
  "Year",
  "Month",
  "Day",
  "flag",
  "Temp_qc",
  "CTD,x",
  "BOTTLE,x",
  "NUMBER_HEADERS = 99999999",
  "END_DATA",
  "__proto__",
  "constructor",
  "toString",
].map(bytesOf);

const HUGE = 60_000;
const MANY = 3000;

type Damage = (random: Random, bytes: Uint8Array, other: Uint8Array) => Uint8Array;

const DAMAGE: readonly Damage[] = [
  // Bytes flipped.
  (random, bytes) => {
    const copy = bytes.slice();
    for (let n = 1 + below(random, 12); n > 0 && copy.length > 0; n--)
      copy[below(random, copy.length)]! ^= 1 << below(random, 8);
    return copy;
  },
  (random, bytes) => {
    const copy = bytes.slice();
    for (let n = 1 + below(random, 6); n > 0 && copy.length > 0; n--)
      copy[below(random, copy.length)] = below(random, 256);
    return copy;
  },
  // Cut short, a piece taken out, a piece twice.
  (random, bytes) => bytes.slice(0, below(random, bytes.length + 1)),
  (random, bytes) => spliced(random, bytes, below(random, 80), new Uint8Array()),
  (random, bytes) => {
    const at = below(random, bytes.length + 1);
    return spliced(random, bytes, 0, bytes.subarray(at, at + below(random, 200)));
  },
  // Joined with another file, or a piece of it within.
  (_, bytes, other) => joined(bytes, other),
  (random, bytes, other) => {
    const at = below(random, other.length + 1);
    return spliced(random, bytes, 0, other.subarray(at, at + below(random, 300)));
  },
  // A text with a meaning, here and there.
  (random, bytes) => {
    let damaged = bytes;
    for (let n = 1 + below(random, 4); n > 0; n--)
      damaged = spliced(random, damaged, below(random, 6), pick(random, TELLING));
    return damaged;
  },
];

/** Slower to read, so not so often: huge fields, deep quotes, runs of NULs, very many lines or cells. */
const LARGE_DAMAGE: readonly Damage[] = [
  (random, bytes) =>
    spliced(random, bytes, 0, bytesOf(pick(random, ["x", "9", ".", " ", "-", "e", "1 ", "a-", "(", "°"]).repeat(HUGE))),
  (random, bytes) =>
    spliced(random, bytes, 0, bytesOf(pick(random, ['"', '""', '",', '"\n', '\\"', "([{"]).repeat(MANY))),
  (random, bytes) => spliced(random, bytes, 0, new Uint8Array(1 + below(random, MANY))),
  (random, bytes) =>
    spliced(
      random,
      bytes,
      0,
      bytesOf(pick(random, [",", ";", "\t", " ", "\n", "\r", ",\n", "1,2,3\n", "#\n"]).repeat(MANY)),
    ),
];

const LARGE_SHARE = 0.03;

/** A file out of the corpus, damaged once or several times. */
export function damaged(random: Random, corpus: readonly Uint8Array[]): Uint8Array {
  let bytes = pick(random, corpus);
  for (let n = 1 + below(random, 4); n > 0; n--) {
    const kinds = random() < LARGE_SHARE ? LARGE_DAMAGE : DAMAGE;
    bytes = pick(random, kinds)(random, bytes, pick(random, corpus));
  }
  return bytes;
}
