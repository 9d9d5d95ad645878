import type { PaperSource } from "./working-paper.ts";

/** The page that explains each section of the method; workings name the section each of their steps follows. */
const METHODS: Readonly<Record<string, { slug: string; title: string }>> = {
  "1": { slug: "numbers", title: "Numbers and rounding" },
  "2": { slug: "run-and-need", title: "The run, and what it needs" },
  "3": { slug: "offers", title: "Offers and the order quantity" },
  "4": { slug: "baskets", title: "An order to one supplier" },
  "6": { slug: "boards", title: "Boards" },
  "7": { slug: "work", title: "Work" },
  "8": { slug: "cost-of-a-run", title: "What a run costs" },
  "9": { slug: "every-run-size", title: "Every run size" },
  "10": { slug: "price", title: "Price" },
  "11": { slug: "break-even", title: "Break-even" },
  "14": { slug: "workings", title: "Workings" },
};

/** Links to the pages of some sections ("3", "8"), each once, in the order of the sections; sections without a page are left out. */
export function methodLinks(sections: Iterable<string>): PaperSource[] {
  const whole = [...sections].map((section) => section.split(".")[0] ?? "");
  return [...new Set(whole)]
    .sort((a, b) => Number(a) - Number(b))
    .flatMap((section) => {
      const method = METHODS[section];
      return method ? [{ label: method.title, href: `/methods/${method.slug}` }] : [];
    });
}
