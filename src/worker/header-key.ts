/** Files whose headers are the same share what was said about their columns. */
export const headerKey = (headers: readonly string[]): string => headers.map((header) => header.trim()).join("\t");
