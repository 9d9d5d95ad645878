// @vitest-environment happy-dom
import { cleanup, fireEvent, render, screen } from "@testing-library/react";
import { afterEach, describe, expect, it, vi } from "vitest";
import { Ruler } from "#src/components/islands/parts/Ruler.tsx";

afterEach(cleanup);

describe("the ruler as a slider", () => {
  it("says its run and its ends", () => {
    render(<Ruler run={120} onRun={vi.fn()} />);
    const slider = screen.getByRole("slider", { name: "Run" });
    expect(slider.getAttribute("aria-valuemin")).toBe("10");
    expect(slider.getAttribute("aria-valuemax")).toBe("500");
    expect(slider.getAttribute("aria-valuenow")).toBe("120");
    expect(slider.getAttribute("aria-valuetext")).toBe("120 kits");
  });

  it("stays within its ends for a run typed beyond them, and says the true run", () => {
    render(<Ruler run={750} onRun={vi.fn()} />);
    expect(screen.getByRole("slider").getAttribute("aria-valuenow")).toBe("500");
    expect(screen.getByRole("slider").getAttribute("aria-valuetext")).toBe("750 kits");
  });

  it("moves by keys, and leaves Alt for the page's own", () => {
    const onRun = vi.fn();
    render(<Ruler run={120} onRun={onRun} sweetSpots={[60, 120, 180]} />);
    const slider = screen.getByRole("slider");
    fireEvent.keyDown(slider, { key: "ArrowRight" });
    fireEvent.keyDown(slider, { key: "ArrowRight", shiftKey: true });
    fireEvent.keyDown(slider, { key: "ArrowRight", altKey: true });
    fireEvent.keyDown(slider, { key: "Tab" });
    expect(onRun.mock.calls).toEqual([[121], [180]]);
  });

  it("hides the figure that the ring would touch", () => {
    const { container } = render(<Ruler run={50} onRun={vi.fn()} />);
    const figures = [...container.querySelectorAll("text")].map((text) => text.textContent);
    expect(figures).not.toContain("50");
    expect(figures).toContain("40");
    expect(figures).toContain("60");
  });
});
