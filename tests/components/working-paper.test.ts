import { describe, expect, it } from "vitest";
import { type Paper, paperAsText, ruledOff } from "#src/components/working-paper.ts";

const PAPER: Paper = {
  of: "Cost per kit at a run of 120",
  basis: "In euro, without VAT",
  lines: [
    { letter: "a", label: "Parts, 23 lines", amount: "1024.65" },
    {
      letter: "b",
      label: "Once-only costs",
      sign: "+",
      amount: "769.00",
      subs: [
        { label: "Safety check", amount: "711.00" },
        { label: "Board tooling", amount: "58.00" },
      ],
    },
    { letter: "c", label: "Spent on the run", sign: "=", amount: "1793.65" },
    { letter: "d", label: "Kits", sign: "÷", amount: "120" },
    { letter: "e", label: "Cost per kit", sign: "=", amount: "14.95", result: true },
  ],
  notes: ["c ÷ d is 14.9471, written to the nearest cent."],
  methods: [],
  foot: "Worked at 14:32.",
};

describe("a working on paper", () => {
  it("rules off what is summed: the line before each equals sign", () => {
    expect(PAPER.lines.map((_, place) => ruledOff(PAPER.lines, place))).toEqual([
      false,
      true,
      false,
      true,
      false,
    ]);
  });

  it("copies as text with amounts under each other, sums carried out on their last line", () => {
    expect(paperAsText(PAPER).split("\n")).toEqual([
      "Cost per kit at a run of 120",
      "In euro, without VAT",
      "",
      "a  Parts, 23 lines              1024.65",
      "b  Once-only costs",
      "     Safety check    711.00",
      "     Board tooling    58.00  +   769.00",
      "c  Spent on the run          =  1793.65",
      "d  Kits                      ÷      120",
      "e  Cost per kit              =    14.95",
      "",
      "c ÷ d is 14.9471, written to the nearest cent.",
      "Worked at 14:32.",
    ]);
  });
});
