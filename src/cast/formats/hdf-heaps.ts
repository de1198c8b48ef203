/**
 * The global heaps of an HDF5 file (format specification 3.0, III.E) hold its lists of unequal length, the names of
 * dimensions among them. A heap whose objects do not add up sends the library round in circles, so it is looked over
 * before the file is opened.
 */

const SIGNATURE = [0x47, 0x43, 0x4f, 0x4c];
const HEADER_BYTES = 16;

const isHeapAt = (bytes: Uint8Array, at: number): boolean => SIGNATURE.every((byte, i) => bytes[at + i] === byte);

/** Whether the objects of the heap at this place lie behind each other up to its end. */
function addsUp(view: DataView, at: number): boolean {
  const end = at + Number(view.getBigUint64(at + 8, true));
  if (!(end <= view.byteLength)) return false;
  let place = at + HEADER_BYTES;
  while (place + HEADER_BYTES <= end) {
    const index = view.getUint16(place, true);
    const size = Number(view.getBigUint64(place + 8, true));
    // Object 0 is the free space, which counts its own header and goes to the end.
    if (index === 0) return place + size === end;
    if (size === 0) return false;
    place += HEADER_BYTES + Math.ceil(size / 8) * 8;
  }
  return place <= end;
}

/** Throws where a heap cannot be what it says. */
export function checkHeaps(bytes: Uint8Array): void {
  const view = new DataView(bytes.buffer, bytes.byteOffset, bytes.byteLength);
  for (let at = 0; at + HEADER_BYTES <= bytes.length; at += 8)
    if (isHeapAt(bytes, at) && !addsUp(view, at)) throw new Error("a heap of lists in the file is damaged");
}
