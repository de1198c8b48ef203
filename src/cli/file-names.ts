/**
 * File names for casts: what is safe on every system of the cast's own name, lower case, each once and none of the
 * names the results themselves need.
 */
export function castFileNames(castNames: readonly string[], reserved: readonly string[]): readonly string[] {
  const taken = new Set(reserved);
  return castNames.map((castName) => {
    const stem = safeStem(castName);
    let name = stem;
    for (let count = 2; taken.has(name); count++) name = `${stem}-${count}`;
    taken.add(name);
    return name;
  });
}

/** Names that one system or another keeps for its devices. */
const DEVICE = /^(con|prn|aux|nul|com\d|lpt\d)$/;

function safeStem(castName: string): string {
  const stem = castName
    .normalize("NFC")
    .toLowerCase()
    .replace(/[^\p{L}\p{N}.]+/gu, "-")
    .replace(/^[-.]+|[-.]+$/g, "")
    .slice(0, 80);
  return stem === "" || DEVICE.test(stem) ? `cast-${stem}`.replace(/-$/, "") : stem;
}
