import { describe, expect, test } from "vitest";
import { dateOrderOf, parseClock, parseDate, parseDateTime } from "../../../src/cast/read/parse-time.ts";
import { questionOf, readText } from "./reading.ts";

describe("dates", () => {
  test.each([
    ["2020-01-13", "2020-01-13"],
    ["2020/1/3", "2020-01-03"],
    ["20200113", "2020-01-13"],
    ["1/13/2020", "2020-01-13"],
    ["2/8/17", "2017-02-08"],
    ["1/13/69", "1969-01-13"],
    ["1/13/68", "2068-01-13"],
    ["13-Jan-2020", "2020-01-13"],
    ["13 January 2020", "2020-01-13"],
    ["Jan 13, 2020", "2020-01-13"],
    ["2020-02-29", "2020-02-29"],
  ])("%s is %s", (text, date) => {
    expect(parseDate(text, "month-first")).toBe(date);
  });

  test.each(["2019-02-29", "2020-13-01", "2020-00-10", "13/32/20", "43843", "20", "soon", "13-Foo-2020"])(
    "%s is no date",
    (text) => {
      expect(parseDate(text, "month-first")).toBeNull();
    },
  );

  test("whether day or month stands first is told from the whole column", () => {
    expect(dateOrderOf(["2/8/17", "3/21/17"])).toEqual({ order: "month-first", assumed: false });
    expect(dateOrderOf(["2/8/17", "21/3/17"])).toEqual({ order: "day-first", assumed: false });
    expect(dateOrderOf(["2/8/17", "3/4/17"])).toEqual({ order: "month-first", assumed: true });
    expect(dateOrderOf(["2.8.17"])).toEqual({ order: "day-first", assumed: false });
    expect(dateOrderOf(["2020-01-13"]).assumed).toBe(false);
    expect(dateOrderOf([]).assumed).toBe(false);
  });

  test("in a file the order that nothing tells is asked about; the days still tell casts apart", () => {
    const rows = (date: string) => `${date},1,10,30\n${date},2,10,30\n`;
    const HEADER = "Date,Depth (m),Temp (C),Sal\n";
    const untold = readText(HEADER + rows("2/8/17"));
    expect(questionOf(untold, "date-order").choices.map((choice) => choice.label)).toEqual([
      "month first: 2/8/17 is 2017-02-08",
      "day first: 2/8/17 is 2017-08-02",
      "not used",
    ]);
    expect(readText(HEADER + rows("2/8/17") + rows("3/8/17")).casts.map((cast) => cast.time)).toEqual([null, null]);
    const told = readText(HEADER + rows("2/8/17") + rows("21/3/17"));
    expect(told.issues).toEqual([]);
    expect(told.casts.map((cast) => cast.time)).toEqual(["2017-08-02", "2017-03-21"]);
  });
});

test.each([
  ["Date (MM/DD/YYYY)", "2017-02-08"],
  ["Date (dd/mm/yy)", "2017-08-02"],
])("a header that spells out the order is believed where the dates do not tell: %s", (header, time) => {
  const reading = readText(`${header},Depth (m),Temp (C),Sal\n2/8/17,1,10,30\n2/8/17,2,10,30\n`);
  expect(reading.casts[0]!.time).toBe(time);
  expect(reading.issues).toEqual([]);
});

describe("times of day", () => {
  test.each([
    ["629", "06:29"],
    ["1609", "16:09"],
    ["7:52", "07:52"],
    ["15:18:00", "15:18:00"],
    ["15:18:00.250", "15:18:00"],
    ["1:05 PM", "13:05"],
    ["12:05 am", "00:05"],
    ["0000", "00:00"],
  ])("%s is %s", (text, clock) => {
    expect(parseClock(text)).toBe(clock);
  });

  test.each(["2460", "25:00", "12:61", "noon", "1.5", "12345"])("%s is none", (text) => {
    expect(parseClock(text)).toBeNull();
  });
});

test.each([
  ["2016-06-30 07:40:55", "2016-06-30", "07:40:55"],
  ["2016-06-30T07:40Z", "2016-06-30", "07:40"],
  ["2016-06-30T07:40:55+01:00", "2016-06-30", "07:40:55"],
  ["1/13/2020 1:46 PM", "2020-01-13", "13:46"],
  ["13 Oct 2020 13:46", "2020-10-13", "13:46"],
  ["2016-06-30", "2016-06-30", null],
])("%s has its date and its time", (text, date, clock) => {
  expect(parseDateTime(text, "month-first")).toEqual({ date, clock });
});
