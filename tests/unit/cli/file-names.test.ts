import { expect, it } from "vitest";
import { castFileNames } from "../../../src/cli/file-names.ts";

it("makes file names that any system takes, each once, none of the reserved", () => {
  const names = [
    "Station 2, 2020-01-13",
    "Station 2 2020/01/13",
    "summary",
    "../../etc/passwd",
    "con",
    "",
    "Ærø Havn",
    "=1+1",
  ];
  expect(castFileNames(names, ["summary"])).toEqual([
    "station-2-2020-01-13",
    "station-2-2020-01-13-2",
    "summary-2",
    "etc-passwd",
    "cast-con",
    "cast",
    "ærø-havn",
    "1-1",
  ]);
});
