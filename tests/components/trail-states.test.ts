import { describe, expect, it } from "vitest";
import { joined, stopWords, type TrailStop } from "#src/components/trail-states.ts";

const stop = (state: TrailStop["state"], words?: string): TrailStop => ({
  name: "Run",
  href: "#run",
  state,
  words,
});
const done = stop({ kind: "done" });
const open = stop({ kind: "to-settle", count: 2 });
const ahead = stop({ kind: "not-started" });

describe("the trail", () => {
  it("says the state of a stop, with the count of what is open", () => {
    expect([done, open, ahead].map(stopWords)).toEqual(["done", "2 to settle", "not started"]);
    expect(stopWords(stop({ kind: "done" }, "7 matched, 1 left out"))).toBe("7 matched, 1 left out");
  });

  it("joins two begun steps, and no others", () => {
    const stops = [done, open, ahead, done];
    expect(stops.map((_, place) => joined(stops, place))).toEqual([true, false, false, false]);
  });
});
