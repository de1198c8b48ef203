/** ShapeError: array lengths that disagree. DomainError: an argument outside its meaning. UnsupportedError: a format or unit we do not handle. */
export type ToolErrorTag = "ShapeError" | "DomainError" | "UnsupportedError";

/** Thrown for misuse of the library. Narrow with isToolError, never by the text of the message. */
export class ToolError extends Error {
  readonly tag: ToolErrorTag;

  constructor(tag: ToolErrorTag, message: string, options?: ErrorOptions) {
    super(message, options);
    this.name = tag;
    this.tag = tag;
  }
}

export const isToolError = (e: unknown, tag: ToolErrorTag): e is ToolError => e instanceof ToolError && e.tag === tag;
