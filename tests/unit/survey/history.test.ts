import { describe, expect, it } from "vitest";
import { redo, remember, startHistory, undo } from "../../../src/survey/index.ts";

describe("history", () => {
  const written = remember(remember(startHistory("a"), "b"), "c");

  it("goes back and forth through every value", () => {
    expect(undo(written).present).toBe("b");
    expect(undo(undo(undo(written))).present).toBe("a");
    expect(redo(redo(undo(undo(written)))).present).toBe("c");
    expect(redo(written)).toBe(written);
  });

  it("forgets the undone when something new is done", () => {
    const turned = remember(undo(written), "d");
    expect(redo(turned).present).toBe("d");
    expect(undo(turned).present).toBe("b");
  });

  it("does not remember a change that changed nothing", () => {
    expect(remember(written, "c")).toBe(written);
  });
});
