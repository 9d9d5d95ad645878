// @vitest-environment happy-dom
import { cleanup, fireEvent, render, screen, within } from "@testing-library/react";
import { useState } from "react";
import { afterEach, describe, expect, it } from "vitest";
import { answeredAtOnce } from "#src/components/islands/import/answered-at-once.ts";
import { RowsSection } from "#src/components/islands/import/RowsSection.tsx";
import type { Edit } from "#src/components/islands/import/use-import.ts";
import { partsView, question } from "./parts-view.ts";

afterEach(cleanup);

const START = partsView({
  open: [question(15, "must"), question(21, "must"), question(9, "look")],
  must: 2,
  look: 1,
  settled: [],
  settledCount: 0,
});

/** The section over a view that answers at once, as the page's; what was sent is kept. */
function Rows({ sent }: { sent: Edit[] }) {
  const [view, setView] = useState(START);
  return (
    <RowsSection
      questions={view.questions}
      edit={(edit) => {
        sent.push(edit);
        setView(answeredAtOnce(view, edit));
      }}
    />
  );
}

const rows = () => within(screen.getByRole("list", { name: "Rows to settle" })).queryAllByRole("listitem");
const suggestions = () => screen.getAllByRole("button", { name: "Use 6, as the designators say" });

describe("rows to settle", () => {
  it("stand worst first, each with its sentence, suggestion and other ways", () => {
    render(<Rows sent={[]} />);
    expect(rows().map((row) => /Row \d+/.exec(row.textContent ?? "")?.[0])).toEqual([
      "Row 15",
      "Row 21",
      "Row 9",
    ]);
    expect(rows()[0]?.textContent).toContain("The quantity says 5. The designators count 6.");
    expect(screen.getByText(/2 must be settled, 1 is worth a look/)).toBeTruthy();
    expect(screen.getByRole("button", { name: /^Keep 5.*row 15/ })).toBeTruthy();
  });

  it("move focus on to the next suggestion, and to the end when all are settled", () => {
    const sent: Edit[] = [];
    render(<Rows sent={sent} />);
    fireEvent.click(suggestions()[1] as HTMLElement);
    expect(sent).toEqual([
      { answers: [{ row: 21, code: "quantity-mismatch", choice: "use-designators", typed: undefined }] },
    ]);
    expect(document.activeElement).toBe(suggestions()[1]);
    fireEvent.click(suggestions()[1] as HTMLElement);
    expect(document.activeElement).toBe(suggestions()[0]);
    fireEvent.click(suggestions()[0] as HTMLElement);
    expect(rows()).toEqual([]);
    expect(document.activeElement?.textContent).toBe(
      "Every row is a line, or is skipped for a reason given below.",
    );
  });

  it("take all suggestions with one button", () => {
    const sent: Edit[] = [];
    render(<Rows sent={sent} />);
    fireEvent.click(screen.getByRole("button", { name: "Take all three suggestions" }));
    expect(sent).toEqual([{ takeSuggestions: true }]);
    expect(rows()).toEqual([]);
  });

  it("take a typed quantity, and refuse what is no number", () => {
    const sent: Edit[] = [];
    render(<Rows sent={sent} />);
    fireEvent.click(screen.getByRole("button", { name: /^Type another quantity.*row 15/ }));
    const field = screen.getByLabelText("Quantity of row 15");
    fireEvent.change(field, { target: { value: "many" } });
    fireEvent.click(screen.getByRole("button", { name: "Use it" }));
    expect(screen.getByText("Write a whole number.")).toBeTruthy();
    expect(sent).toEqual([]);
    fireEvent.change(field, { target: { value: "7" } });
    fireEvent.click(screen.getByRole("button", { name: "Use it" }));
    expect(sent[0]?.answers?.[0]).toMatchObject({ row: 15, choice: "type", typed: "7" });
  });

  it("can be opened again", () => {
    const sent: Edit[] = [];
    render(<Rows sent={sent} />);
    fireEvent.click(suggestions()[0] as HTMLElement);
    fireEvent.click(screen.getByRole("button", { name: /^Open it again.*row 15/, hidden: true }));
    expect(sent[1]).toEqual({ reopen: [{ row: 15, code: "quantity-mismatch" }] });
    expect(rows()).toHaveLength(3);
  });
});
