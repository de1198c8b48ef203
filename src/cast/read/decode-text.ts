/** Bytes to text: UTF-8 and UTF-16 with or without a byte-order mark, else the single-byte set of Western Windows. */

export interface DecodedText {
  /** Line ends are all "\n". */
  readonly text: string;
  /** In words, for the user. */
  readonly encoding: string;
}

const startsWith = (bytes: Uint8Array, ...mark: readonly number[]): boolean => mark.every((b, i) => bytes[i] === b);

/** UTF-16 of plain Western text has a zero in every second byte. */
function utf16WithoutMark(bytes: Uint8Array): "utf-16le" | "utf-16be" | null {
  const head = bytes.subarray(0, 512);
  const zeros = [0, 0];
  for (let i = 0; i < head.length; i++) if (head[i] === 0) zeros[i % 2]! += 1;
  const [even, odd] = zeros as [number, number];
  const most = head.length * 0.4;
  if (odd > most && even === 0) return "utf-16le";
  if (even > most && odd === 0) return "utf-16be";
  return null;
}

function isUtf8(bytes: Uint8Array): boolean {
  try {
    new TextDecoder("utf-8", { fatal: true }).decode(bytes);
    return true;
  } catch {
    return false;
  }
}

function labelOf(bytes: Uint8Array): readonly [label: string, encoding: string] {
  if (startsWith(bytes, 0xef, 0xbb, 0xbf)) return ["utf-8", "UTF-8 with byte-order mark"];
  if (startsWith(bytes, 0xff, 0xfe)) return ["utf-16le", "UTF-16 (little-endian) with byte-order mark"];
  if (startsWith(bytes, 0xfe, 0xff)) return ["utf-16be", "UTF-16 (big-endian) with byte-order mark"];
  const wide = utf16WithoutMark(bytes);
  if (wide === "utf-16le") return ["utf-16le", "UTF-16 (little-endian)"];
  if (wide === "utf-16be") return ["utf-16be", "UTF-16 (big-endian)"];
  if (isUtf8(bytes)) return ["utf-8", "UTF-8"];
  return ["windows-1252", "Windows-1252 (Latin-1)"];
}

/** The text, or null when the bytes are not text in any encoding we know. */
export function decodeText(bytes: Uint8Array): DecodedText | null {
  const [label, encoding] = labelOf(bytes);
  const text = new TextDecoder(label).decode(bytes);
  if (text.includes("\0")) return null;
  return { text: text.replace(/\r\n?/g, "\n"), encoding };
}
