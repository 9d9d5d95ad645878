import { describe, expect, it } from "vitest";
import { readCells } from "#src/partslist/cells.ts";
import { writeList } from "#src/partslist/write-list.ts";

const cells = (text: string) => readCells(text).records.map((record) => record.cells);

/** RFC 4180 (October 2005), section 2, the examples under rules 1, 2, 5, 6 and 7. */
const RFC_4180: readonly (readonly [string, string, string[][]])[] = [
  [
    "rule 1",
    "aaa,bbb,ccc\r\nzzz,yyy,xxx\r\n",
    [
      ["aaa", "bbb", "ccc"],
      ["zzz", "yyy", "xxx"],
    ],
  ],
  [
    "rule 2",
    "aaa,bbb,ccc\r\nzzz,yyy,xxx",
    [
      ["aaa", "bbb", "ccc"],
      ["zzz", "yyy", "xxx"],
    ],
  ],
  [
    "rule 5",
    '"aaa","bbb","ccc"\r\nzzz,yyy,xxx',
    [
      ["aaa", "bbb", "ccc"],
      ["zzz", "yyy", "xxx"],
    ],
  ],
  [
    "rule 6",
    '"aaa","b\r\nbb","ccc"\r\nzzz,yyy,xxx',
    [
      ["aaa", "b\r\nbb", "ccc"],
      ["zzz", "yyy", "xxx"],
    ],
  ],
  ["rule 7", '"aaa","b""bb","ccc"', [["aaa", 'b"bb', "ccc"]]],
];

/** csv-spectrum 2.0.0 (npm, BSD-2-Clause): csvs/<name>.csv with json/<name>.json. */
const SPECTRUM: readonly (readonly [string, string, string[][]])[] = [
  [
    "comma_in_quotes",
    'first,last,address,city,zip\nJohn,Doe,120 any st.,"Anytown, WW",08123',
    [
      ["first", "last", "address", "city", "zip"],
      ["John", "Doe", "120 any st.", "Anytown, WW", "08123"],
    ],
  ],
  [
    "empty",
    'a,b,c\n1,"",""\n2,3,4',
    [
      ["a", "b", "c"],
      ["1", "", ""],
      ["2", "3", "4"],
    ],
  ],
  [
    "empty_crlf",
    'a,b,c\r\n1,"",""\r\n2,3,4',
    [
      ["a", "b", "c"],
      ["1", "", ""],
      ["2", "3", "4"],
    ],
  ],
  [
    "escaped_quotes",
    'a,b\n1,"ha ""ha"" ha"\n3,4\n',
    [
      ["a", "b"],
      ["1", 'ha "ha" ha'],
      ["3", "4"],
    ],
  ],
  [
    "json",
    'key,val\n1,"{""type"": ""Point"", ""coordinates"": [102.0, 0.5]}"\n',
    [
      ["key", "val"],
      ["1", '{"type": "Point", "coordinates": [102.0, 0.5]}'],
    ],
  ],
  [
    "newlines",
    'a,b,c\n1,2,3\n"Once upon \na time",5,6\n7,8,9\n',
    [
      ["a", "b", "c"],
      ["1", "2", "3"],
      ["Once upon \na time", "5", "6"],
      ["7", "8", "9"],
    ],
  ],
  [
    "newlines_crlf",
    'a,b,c\r\n1,2,3\r\n"Once upon \r\na time",5,6\r\n7,8,9\r\n',
    [
      ["a", "b", "c"],
      ["1", "2", "3"],
      ["Once upon \r\na time", "5", "6"],
      ["7", "8", "9"],
    ],
  ],
  [
    "quotes_and_newlines",
    'a,b\n1,"ha \n""ha"" \nha"\n3,4\n',
    [
      ["a", "b"],
      ["1", 'ha \n"ha" \nha'],
      ["3", "4"],
    ],
  ],
  [
    "simple",
    "a,b,c\n1,2,3\n",
    [
      ["a", "b", "c"],
      ["1", "2", "3"],
    ],
  ],
  [
    "simple_crlf",
    "a,b,c\r\n1,2,3\r\n",
    [
      ["a", "b", "c"],
      ["1", "2", "3"],
    ],
  ],
  [
    "utf8",
    "a,b,c\n1,2,3\n4,5,ʤ",
    [
      ["a", "b", "c"],
      ["1", "2", "3"],
      ["4", "5", "ʤ"],
    ],
  ],
];

describe("reading CSV", () => {
  it.each(RFC_4180)("RFC 4180, section 2, %s", (_, text, rows) => expect(cells(text)).toEqual(rows));

  it.each(SPECTRUM)("csv-spectrum 2.0.0, %s", (_, text, rows) => expect(cells(text)).toEqual(rows));

  it("csv-spectrum 2.0.0, location_coordinates: quotes in unquoted cells (its JSON does not match its CSV, so only the cells are held)", () => {
    const text =
      "Contact Phone Number,Location Coordinates,Cities,Counties\n2095257564,37\uFFFD36'37.8\"N 121\uFFFD2'17.9\"W,Modesto,Stanislaus";
    expect(cells(text)[1]).toEqual([
      "2095257564",
      "37\uFFFD36'37.8\"N 121\uFFFD2'17.9\"W",
      "Modesto",
      "Stanislaus",
    ]);
  });
});

describe("writing CSV, RFC 4180, section 2", () => {
  it.each(RFC_4180)("%s reads back", (_, __, rows) => expect(cells(writeList(rows))).toEqual(rows));

  it("ends every record with CRLF and quotes only what needs it", () =>
    expect(writeList([["a", "b,c", 'd"e', "f\ng"]])).toBe('a,"b,c","d""e","f\ng"\r\n'));
});
