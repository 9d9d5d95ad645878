// @vitest-environment happy-dom
import { cleanup, render, screen, within } from "@testing-library/react";
import { afterEach, expect, it } from "vitest";
import { EditionsSection } from "#src/components/islands/run/EditionsSection.tsx";
import { costRun } from "#src/costing/cost-run.ts";
import { edition, part, plan } from "#tests/costing/plans.ts";

afterEach(cleanup);

const opens = () => ({ open: false, onOpen: () => undefined, controls: "" });

it("says in the cells only that a figure is not known, and below once what is needed", () => {
  const open = plan({
    parts: [
      part({ id: "led", offers: [], quantities: [{ edition: "kit", perKit: 1 }] }),
      part({ id: "chip", offers: [], quantities: [{ edition: "bare", perKit: 1 }] }),
    ],
    editions: [
      edition({ price: null }),
      edition({ id: "bare", name: "Bare board", price: "5" }),
      edition({ id: "later", name: "Later", weight: 0, price: "5" }),
    ],
  });
  render(<EditionsSection run={costRun(open)} opens={opens} />);
  const cells = (name: string) => {
    const row = screen.getByRole("rowheader", { name }).closest("tr") as HTMLElement;
    return within(row)
      .getAllByRole("cell")
      .map(({ textContent }) => textContent);
  };
  expect(cells("Full kit")).toEqual(["5", "not set", "not known", "not known", "not known", "not known"]);
  expect(cells("Bare board").slice(2)).toEqual(["€5.00", "not known", "not known", "not known"]);
  expect(cells("Later").slice(2)).toEqual(["€5.00", "–", "–", "–"]);
  expect(screen.getByText(/^Not known yet:/).textContent).toBe("Not known yet: needs a price and 2 prices.");
});
