import { expect, it } from "vitest";
import { apart } from "#src/components/islands/boards/BoardsMarks.tsx";

it("names at the ends of lines stand apart, in their order, and above the foot", () => {
  expect(apart([100, 104, 200], 300)).toEqual([100, 120, 200]);
  expect(apart([200, 100, 104], 300)).toEqual([200, 100, 120]);
  expect(apart([290, 295, 300], 300)).toEqual([260, 280, 300]);
});
