import { describe, expect, it } from "vitest";
import { csvText } from "../../../src/export/index.ts";

const text = (...cells: (string | number | null)[]) => csvText([{ name: "a" }], [cells]).split("\n")[1];

describe("csvText", () => {
  it("writes numbers at full precision and missing ones empty", () => {
    expect(text(0.1 + 0.2, 1e-7, null, Number.NaN, -5)).toBe("0.30000000000000004,1e-7,,,-5");
  });

  it("quotes what would break the table", () => {
    expect(text('a "b"', "c,d", "e\nf".replace("\n", " "))).toBe('"a ""b""","c,d",e f');
    expect(csvText([{ name: "a" }], [["x\ny"]])).toBe('a\n"x\ny"\n');
  });

  it("takes the sting out of text that a spreadsheet would run", () => {
    expect(text("=1+1", "+cmd", "-2+3", "@x", "\tx")).toBe("'=1+1,'+cmd,'-2+3,'@x,'\tx");
  });

  it("leaves a number that is text as it is", () => {
    expect(text("-5", "+7", "007")).toBe("-5,+7,007");
  });
});
