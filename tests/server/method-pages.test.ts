import { readdirSync, readFileSync } from "node:fs";
import { describe, expect, it } from "vitest";
import { methodLinks } from "#src/components/method-links.ts";
import { figuresOf, reckoned, workingOf } from "#src/costing/working.ts";
import { exampleWorkings, METHOD_EXAMPLE } from "#src/server/method-example.ts";

const FOLDER = "src/content/methods";
const pages = readdirSync(FOLDER).map((file) => {
  const text = readFileSync(`${FOLDER}/${file}`, "utf8");
  const field = (name: string) => new RegExp(`^${name}: (.*)$`, "m").exec(text)?.[1] ?? "";
  return {
    slug: file.replace(/\.md$/, ""),
    section: field("section"),
    title: JSON.parse(field("title")) as string,
    figures: JSON.parse(field("figures")) as string[],
  };
});

describe("the pages of the method", () => {
  it("are the ones that workings lead to", () => {
    const inOrder = pages.sort((a, b) => Number(a.section) - Number(b.section));
    expect(methodLinks(Array.from({ length: 20 }, (_, place) => String(place)))).toEqual(
      inOrder.map(({ slug, title }) => ({ label: title, href: `/methods/${slug}` })),
    );
  });

  it.each(pages)("$slug has a worked example in which everything is known", ({ figures }) => {
    const trees = exampleWorkings(figures);
    expect(trees.flatMap(({ lines }) => lines).length).toBeGreaterThan(0);
    for (const line of trees.flatMap(({ lines }) => lines)) expect(line.amount?.kind).not.toBe("not-known");
  });

  it("have an example that follows the section its page explains", () => {
    for (const { section, figures, slug } of pages) {
      // Rounding and workings concern every figure.
      if (section === "1" || section === "14") continue;
      const rules = exampleWorkings(figures).flatMap(({ lines }) =>
        lines.map(({ rule }) => rule.split(".")[0]),
      );
      expect(rules, slug).toContain(section);
    }
  });
});

/** Worked by hand from the plan, section by section of the method. */
describe("the example kit at a run of 40", () => {
  const context = reckoned(METHOD_EXAMPLE);
  const { result } = context;
  const part = (id: string) => result.parts.find((one) => one.id === id);

  it("splits 40 by 1 to 3 into 10 boards and 30 kits", () => {
    expect(result.editions.map(({ id, kits }) => [id, kits])).toEqual([
      ["board", 10],
      ["kit", 30],
    ]);
  });

  it("buys 50 resistors: 60 needed, 2 spare, 12 on the shelf", () => {
    // ⌈0.02 × 60⌉ = 2 and the least spare is 2. Five tens at 0.03 are 1.50; a hundred at 0.016 would be 1.60.
    expect(part("resistor")).toMatchObject({ need: 60, spare: 2, fromStock: 12, toBuy: 50 });
    expect(part("resistor")?.orders[0]).toMatchObject({ quantity: 50 });
  });

  it("buys 50 chips where 31 are needed, because the next break costs less", () => {
    // 31 at 0.48 are 14.88 dollars; 50 at 0.29 are 14.50.
    expect(part("chip")).toMatchObject({ need: 30, spare: 1, toBuy: 31 });
    expect(part("chip")?.orders[0]).toMatchObject({ quantity: 50 });
  });

  it("compares nine to a panel by formula: five panels, 81.81 with freight 90.31", () => {
    // 43 boards to order (42 would be enough in 94.9 of 100 runs); 184 × 138 mm are 2.5392 dm².
    // 5 × 2.5392 × 1.60 = 20.3136; 45 boards at 0.25 + 0.05 = 13.50; with 48.00 81.8136.
    const quote = result.boards.quotes.find(({ id }) => id === "quay-nines");
    expect(result.boards).toMatchObject({ toOrder: 43, chosen: "quay" });
    expect(quote).toMatchObject({ pieces: 5, ordered: 45, boards: "81.81", landed: { value: "90.31" } });
    // 3 × 60 + 2 × 2 by 3 × 40 + 2 × 2 + 2 × 7; nine boards are 216 of 253.92 cm².
    const panel = workingOf(context, "panel:quay-nines");
    expect(panel?.title).toBe("A panel of 9 boards, 184 × 138 mm");
    expect(panel?.lines.at(-1)?.amount).toEqual({ kind: "rate", value: "0.8507" });
  });

  it("opens every figure", () => {
    for (const figure of figuresOf(context))
      expect(workingOf(context, figure)?.lines.length).toBeGreaterThan(0);
  });
});
