import { describe, expect, it } from "vitest";
import { readCells } from "#src/partslist/cells.ts";
import { guessColumns, mappingOf } from "#src/partslist/columns.ts";
import type { Answer, DraftLine, ExistingLine, Row } from "#src/partslist/draft.ts";
import { choiceLabel, questionSentence } from "#src/partslist/questions.ts";
import { openQuestions, readList } from "#src/partslist/read-list.ts";

const LANTERN = `Pos;Menge;Wert;Bauform;Lief.;Best.-Nr.;EUR;Bem.
R1, R2;2;10k;0207;Ebbing;EB-1003;0,008;
C3;1;100u;RM 2,5;Tamsin;T-E107-16;0,062;
LED1-LED6;5;warmweiss;5 mm;Lumenhof;LH-5WW-30;0,094;!
BT1;1;Halter 2xAA;;Ebbing;EB-77;0,66/100;
U1;1;4093 ;DIP-14;Tamsin;T-4093;0,35;
"C3,C4";2;22p;RM 2,5;;;;
Summe;;;;;;1,19;
`;

function read(text: string, answers: Answer[] = [], existingLines: ExistingLine[] = []) {
  const { records } = readCells(text);
  return readList({ records, mapping: mappingOf(guessColumns(records)), answers, existingLines });
}

function lineAt(rows: readonly Row[], row: number): DraftLine | null {
  const found = rows.find((one) => one.row === row);
  return found?.kind === "line" || found?.kind === "question" ? found.line : null;
}

const asked = (rows: readonly Row[], row: number) => rows.find((one) => one.row === row)?.questions[0];

const KNOWN: ExistingLine = {
  id: "l17",
  line: 17,
  designators: ["U1"],
  quantity: 1,
  class: "integrated-circuit",
  value: "4093",
  description: null,
  package: "DIP-14",
  manufacturer: null,
  partNumber: null,
  mark: "in-kit",
  note: null,
  drawer: null,
};

describe("a list with questions", () => {
  const { rows, counts } = read(LANTERN, [], [KNOWN]);

  it("adds up: every row is a line, skipped, or a question", () => {
    expect(counts).toEqual({
      rows: 8,
      lines: 1,
      skipped: 1,
      questions: 6,
      joined: 0,
      must: 2,
      look: 5,
      linesWithSuggestions: 6,
    });
    expect(rows.map((row) => row.kind)).toEqual([
      "skipped",
      "line",
      "question",
      "question",
      "question",
      "question",
      "question",
      "question",
    ]);
  });

  it.each([
    [4, "must", "The quantity says 5. The designators count 6.", "Use 6, as the designators say", "Keep 5"],
    [
      5,
      "must",
      "The price reads “0,66/100”.",
      "Read it as €0.66 each from 100 up",
      "Read it as €0.66 for 100, €0.0066 each",
    ],
    [3, "look", "“100u” has no unit.", "Read it as 100\u00a0µF", "Leave as text"],
    [
      6,
      "look",
      "“4093 ” ends in a space. Line 17 of the list is “4093”.",
      "Treat as the same part",
      "Make a new line",
    ],
    [8, "look", "This looks like a total, not a part.", "Leave the row out", "Keep as a line"],
  ])("row %i", (row, level, sentence, suggested, alternative) => {
    const question = asked(rows, row);
    if (!question) throw new Error("nothing asked");
    expect(question.level).toBe(level);
    expect(questionSentence(question)).toBe(sentence);
    expect(choiceLabel(question.code, question.suggested)).toBe(suggested);
    expect(question.alternatives.map((choice) => choiceLabel(question.code, choice))[0]).toBe(alternative);
  });

  it("asks about a designator in two rows at the later row", () => {
    const question = rows
      .find((row) => row.row === 7)
      ?.questions.find((one) => one.code === "designator-in-two-rows");
    if (!question) throw new Error("nothing asked");
    expect(questionSentence(question)).toBe("C3 stands in two rows, 3 and 7.");
    expect(
      [question.suggested, ...question.alternatives].map((choice) => choiceLabel(question.code, choice)),
    ).toEqual(["Drop it from row 7", "Drop it from row 3", "Keep both rows"]);
    expect(lineAt(rows, 7)).toMatchObject({ designators: ["C4"], quantity: 1 });
  });

  it("shows an open question with its suggestion carried out", () => {
    expect(lineAt(rows, 4)?.quantity).toBe(6);
    expect(lineAt(rows, 5)?.offers[0]?.prices).toEqual([{ quantity: 100, amount: "0.66", currency: "EUR" }]);
    expect(rows.at(-1)).toMatchObject({ kind: "question", line: null, reason: "left-out" });
  });

  it("puts what must be settled first", () =>
    expect(openQuestions(rows).map((question) => question.level)).toEqual([
      "must",
      "must",
      "look",
      "look",
      "look",
      "look",
      "look",
    ]));
});

describe("answers", () => {
  const answers: Answer[] = [
    { row: 4, code: "quantity-mismatch", choice: "keep-quantity" },
    { row: 5, code: "price-unclear", choice: "read-for" },
    { row: 3, code: "value-without-unit", choice: "leave-text" },
    { row: 7, code: "designator-in-two-rows", choice: "drop-there" },
    { row: 8, code: "looks-like-total", choice: "keep-row" },
  ];
  const { rows, counts } = read(LANTERN, answers);

  it("are carried out", () => {
    expect(lineAt(rows, 4)?.quantity).toBe(5);
    expect(lineAt(rows, 5)?.offers[0]?.prices[0]?.amount).toBe("0.0066");
    expect(lineAt(rows, 3)).toMatchObject({ reading: null, value: "100u", designators: [] });
    expect(lineAt(rows, 7)?.designators).toEqual(["C3", "C4"]);
    expect(counts.must).toBe(0);
  });

  it("make the row a line once nothing is open", () =>
    expect(rows.find((row) => row.row === 4)?.kind).toBe("line"));

  it("that are no choice of the question are ignored", () => {
    const odd = read(LANTERN, [{ row: 4, code: "quantity-mismatch", choice: "burn-it" }]);
    expect(odd.counts.must).toBe(2);
  });

  it("may be typed", () => {
    const typed = read(LANTERN, [{ row: 4, code: "quantity-mismatch", choice: "type", typed: "7" }]);
    expect(lineAt(typed.rows, 4)?.quantity).toBe(7);
  });

  it("hold for all rows that ask alike", () => {
    const list = "Ref,Value\nC1,100n\nC2,100n\nC3,100n\nR1,1k";
    const { rows: open } = read(list);
    expect(asked(open, 2)?.alsoRows).toEqual([3, 4]);
    const left = read(list, [{ row: 2, code: "value-without-unit", choice: "leave-text" }]).rows;
    expect([2, 3, 4].map((row) => lineAt(left, row)?.reading)).toEqual([null, null, null]);
    expect(left.every((row) => row.kind !== "question")).toBe(true);
  });
});

describe("lines", () => {
  it("carry the offer with its supplier, code and price", () =>
    expect(lineAt(read(LANTERN).rows, 2)).toMatchObject({
      designators: ["R1", "R2"],
      quantity: 2,
      class: "resistor",
      value: "10k",
      package: "0207",
      offers: [
        {
          supplier: "Ebbing",
          orderCode: "EB-1003",
          prices: [{ quantity: 1, amount: "0.008", currency: "EUR" }],
        },
      ],
    }));

  it("hint at the nearest preferred value", () => {
    const rows = read("Ref,Value\nR1,670 ohm\nR2,680 ohm\nR3,4.99k").rows;
    expect([2, 3, 4].map((row) => lineAt(rows, row)?.preferredHint)).toEqual(["680", null, null]);
  });

  it("recognise properties in free text, never over the list's own columns", () => {
    const rows = read(
      "Ref,Description,Tolerance\nR1,Metal film 10k 1% 1/4W 0207,5%\nC1,Ceramic 100nF 50V X7R RM 5,",
    ).rows;
    expect(lineAt(rows, 2)?.tolerance).toBe("5%");
    expect(lineAt(rows, 2)?.recognised.map(({ name, value }) => `${name} ${value}`)).toEqual([
      "power 0.25",
      "package 0207",
    ]);
    expect(lineAt(rows, 3)?.recognised.map(({ name, value }) => `${name} ${value}`)).toEqual([
      "voltage 50",
      "hole-spacing 5",
      "dielectric X7R",
    ]);
  });

  it("without designators count by their quantity, or ask", () => {
    const rows = read("Ref,Value,What\nR1,1k,\n,,Main board\n,,Enclosure").rows;
    expect(lineAt(rows, 3)).toMatchObject({
      designators: [],
      quantity: 1,
      quantityFrom: "answer",
      class: "board",
    });
    expect(asked(rows, 3)).toMatchObject({ code: "quantity-missing", alsoRows: [4] });
  });

  it.each([
    ["Ref,Value,DNP\nR1,1k,x", "x"],
    ["Ref,Value,Bestückt\nR1,1k,nein", "nein"],
    ["Ref,Value\nR1,DNP 1k", "DNP 1k"],
    ["Ref,Value\nR1,1k (not fitted)", "1k (not fitted)"],
    ["Ref,Value,Note\nR1,1k,n. b.", "n. b."],
    ["Ref,Value,Note\nR1,1k,do not place", "do not place"],
  ])("marked as not fitted: %s", (list, from) => {
    const line = lineAt(read(list).rows, 2);
    expect(line).toMatchObject({ mark: "do-not-place", markFrom: from });
    expect(line?.reading?.si).toBe("1000");
  });

  it("ask where a value may mean that nothing is fitted", () =>
    expect(asked(read("Ref,Value\nR1,n/a\nR2,1k").rows, 2)).toMatchObject({
      code: "maybe-not-fitted",
      suggested: { choice: "do-not-place" },
    }));
});

describe("joining", () => {
  const list = "Ref,Value,Package\nR1,10k,0207\nR2,10k,0207\nR3,22k,0207\nR4,10 kΩ,0207\n";

  it("is offered, not done", () => {
    const { joinOffers, counts } = read(list);
    expect(joinOffers).toEqual([{ rows: [2, 3, 5], designators: ["R1", "R2", "R4"], quantity: 3 }]);
    expect(counts.lines).toBe(4);
  });

  it("keeps the count of rows when done", () => {
    const { records } = readCells(list);
    const { rows, counts } = readList({
      records,
      mapping: mappingOf(guessColumns(records)),
      answers: [],
      join: "all",
    });
    expect(counts).toMatchObject({ rows: 5, lines: 2, skipped: 1, joined: 2 });
    expect(lineAt(rows, 2)).toMatchObject({ designators: ["R1", "R2", "R4"], quantity: 3 });
    expect(rows.find((row) => row.row === 5)).toMatchObject({ kind: "joined", into: 2 });
  });
});

describe("two builds in one file", () => {
  const list = "Ref,Qty,Value\nR1-R4,4,1k\nC1,1,1uF\n\nRef,Qty,Value\nR1-R3,3,2k\nC1,1,1uF\nC9,1,1uF\n";

  it("must be settled before they are added up", () => {
    const { rows, counts } = read(list);
    expect(counts.must).toBe(1);
    const question = rows.find((row) => row.row === 5)?.questions[0];
    expect(question && questionSentence(question)).toBe(
      "A second table begins here. 4 of its designators stand in the first one too.",
    );
  });

  it("leaves the other table out when one is taken", () => {
    const { counts } = read(list, [{ row: 5, code: "alternative-tables", choice: "take-first" }]);
    expect(counts).toMatchObject({ lines: 2, questions: 0 });
  });
});
