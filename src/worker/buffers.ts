/** The memory behind every typed array in a value of plain data, each once: what can be handed over rather than copied. */
export function buffersOf(value: unknown, found: Set<ArrayBuffer> = new Set()): Set<ArrayBuffer> {
  if (ArrayBuffer.isView(value)) {
    if (value.buffer instanceof ArrayBuffer) found.add(value.buffer);
  } else if (Array.isArray(value)) {
    // Long lists are of texts or numbers; only lists of objects can hold arrays.
    if (typeof value[0] === "object") for (const item of value) buffersOf(item, found);
  } else if (typeof value === "object" && value !== null)
    for (const item of Object.values(value)) buffersOf(item, found);
  return found;
}
