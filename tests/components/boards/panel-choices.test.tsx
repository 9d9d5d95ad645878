// @vitest-environment happy-dom
import { cleanup, fireEvent, render, screen } from "@testing-library/react";
import { afterEach, expect, it, vi } from "vitest";
import { PanelChoices } from "#src/components/islands/boards/PanelChoices.tsx";
import { PrintPanel } from "#src/components/islands/boards/PrintPanel.tsx";
import { paperFor } from "#src/components/islands/boards/panel-paper.ts";
import { fitPanels } from "#src/costing/panels/fit-panels.ts";
import { layOutPanel } from "#src/costing/panels/lay-out-panel.ts";
import { BOARD, panelOf, ROUTED } from "#tests/costing/panels/panel-cases.ts";

afterEach(cleanup);

const plain = (text: string | null | undefined) => (text ?? "").replace(/\u00a0/g, " ");
const PICTURE = { shape: "rectangle", widthMm: 58, heightMm: 42 } as const;

it("sizes of panel are radios that say how many, how much is board, and what is ordered", () => {
  const panels = [12, 16].map((count) => panelOf(BOARD, ROUTED, count));
  const onChoose = vi.fn();
  render(<PanelChoices panels={panels} count={12} toOrder={125} onChoose={onChoose} />);
  const radios = screen.getAllByRole("radio") as HTMLInputElement[];
  // 12 in 3 × 4 turned: 292.32 of 174 × 192 = 334.08 cm²; 125 ÷ 12 → 11 panels. 16: 389.76 of 238 × 188 = 447.44; 8 panels.
  expect(screen.getAllByRole("group")[0]?.textContent).toContain("Boards to a panel");
  const labels = radios.map((radio) => plain(radio.labels?.[0]?.textContent));
  expect(labels).toEqual(["12 boards88 % used11 panels, 132", "16 boards87 % used8 panels, 128"]);
  expect(radios.map(({ checked }) => checked)).toEqual([true, false]);
  fireEvent.click(radios[1] as HTMLElement);
  expect(onChoose).toHaveBeenCalledWith(16);
});

it("says nothing of panels to order while no board is needed", () => {
  render(<PanelChoices panels={[panelOf(BOARD, ROUTED, 16)]} count={16} toOrder={0} onChoose={() => {}} />);
  expect(plain(screen.getByRole("group").textContent)).not.toContain("panels,");
});

// A4 less 12 and 14 mm: 273 × 182 upright, 269 × 186 lying. Round the panel 6 mm beside, 36 above and below.
it.each([
  [238, 144, "lying"],
  [263, 150, "lying"],
  [264, 150, null],
  [238, 151, null],
  [176, 237, "upright"],
  [177, 237, null],
  [176, 238, null],
] as const)("a panel of %i × %i mm lies on A4: %s", (width, height, paper) => {
  expect(paperFor({ width: width * 1000, height: height * 1000 })).toBe(paper);
});

/** Stands in for the browser's printing, which this document does not have. */
function printer() {
  const print = vi.fn();
  window.print = print;
  return print;
}

it("prints at true scale: millimetres of the drawing are millimetres of paper, and the bar is fifty", async () => {
  const print = printer();
  const fitted = fitPanels(BOARD, ROUTED);
  const twelve = fitted.ok && fitted.arrangements.find(({ count }) => count === 8);
  if (!fitted.ok || !twelve) throw new Error("It fits.");
  // Eight boards: 118 × 188 mm, upright; with 3 mm at each side and 12 below 124 × 203.
  const panel = layOutPanel(twelve, fitted.measures);
  render(<PrintPanel panel={panel} picture={PICTURE} title="Dew Lantern, panel at Kilnside" />);
  fireEvent.click(screen.getByRole("button", { name: "Print 1:1" }));
  await vi.waitFor(() => expect(print).toHaveBeenCalledOnce());
  expect(document.documentElement.dataset).toMatchObject({ printing: "panel", sheet: "upright" });
  const sheet = document.querySelector("[data-print-sheet] svg") as SVGSVGElement;
  expect([sheet.getAttribute("viewBox"), sheet.style.width, sheet.style.height]).toEqual([
    "-3 -3 124 203",
    "124mm",
    "203mm",
  ]);
  expect(sheet.querySelector("path[fill=none]:last-of-type")?.getAttribute("d")).toContain("M0 195H50");
  fireEvent(window, new Event("afterprint"));
  expect(document.querySelector("[data-print-sheet]")).toBeNull();
  expect(document.documentElement.dataset.printing).toBeUndefined();
});

it("a panel that does not fit on A4 says so and prints nothing", () => {
  const print = printer();
  render(<PrintPanel panel={panelOf(BOARD, ROUTED)} picture={PICTURE} title="Dew Lantern" />);
  const button = screen.getByRole("button", { name: "Print 1:1" });
  expect(plain(document.getElementById(button.getAttribute("aria-describedby") ?? "")?.textContent)).toBe(
    "250 × 192 mm do not fit on A4, so the panel cannot be printed at true scale.",
  );
  fireEvent.click(button);
  expect(print).not.toHaveBeenCalled();
});
