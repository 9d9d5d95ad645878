// @vitest-environment happy-dom
import { act, cleanup, fireEvent, render, screen } from "@testing-library/react";
import { afterEach, beforeEach, describe, expect, it, vi } from "vitest";
import Toasts from "#src/components/islands/parts/Toasts.tsx";
import { closeToast, showToast, toastsNow } from "#src/components/islands/parts/toasts.ts";

const pass = (ms: number) => act(() => vi.advanceTimersByTime(ms));
const show = (toast: Parameters<typeof showToast>[0]) => act(() => showToast(toast));

beforeEach(() => {
  vi.useFakeTimers();
});
afterEach(() => {
  act(() => {
    for (const toast of toastsNow()) closeToast(toast.id);
  });
  cleanup();
  vi.useRealTimers();
});

describe("toasts", () => {
  it("leave after 6 seconds", () => {
    render(<Toasts />);
    show({ text: "Line 14 now buys 1 000 LEDs." });
    pass(5999);
    expect(screen.queryByText(/Line 14/)).not.toBeNull();
    pass(1);
    expect(screen.queryByText(/Line 14/)).toBeNull();
  });

  it("stay while hovered or in focus", () => {
    render(<Toasts />);
    show({ text: "Saved.", action: { label: "Undo", run: vi.fn() } });
    fireEvent.focus(screen.getByRole("button", { name: "Undo" }));
    pass(60_000);
    expect(screen.queryByText("Saved.")).not.toBeNull();
    fireEvent.blur(screen.getByRole("button", { name: "Undo" }));
    pass(6000);
    expect(screen.queryByText("Saved.")).toBeNull();
  });

  it("keep a fault until it is closed", () => {
    render(<Toasts />);
    show({ kind: "fault", text: "Nordhafen did not answer." });
    pass(600_000);
    expect(screen.getByRole("alert").textContent).toContain("Nordhafen");
    fireEvent.click(screen.getByRole("button", { name: "Close" }));
    expect(screen.queryByRole("alert")).toBeNull();
  });

  it("are at most two, and a note makes room before a fault does", () => {
    render(<Toasts />);
    show({ kind: "fault", text: "A fault." });
    show({ text: "First note." });
    show({ text: "Second note." });
    expect(toastsNow().map(({ text }) => text)).toEqual(["A fault.", "Second note."]);
  });

  it("run their action once and leave", () => {
    const run = vi.fn();
    render(<Toasts />);
    show({ text: "Saved.", action: { label: "Undo", run } });
    fireEvent.click(screen.getByRole("button", { name: "Undo" }));
    expect(run).toHaveBeenCalledTimes(1);
    expect(toastsNow()).toEqual([]);
  });
});
