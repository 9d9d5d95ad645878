// @vitest-environment happy-dom
import { act, cleanup, fireEvent, render, screen } from "@testing-library/react";
import { useState } from "react";
import { afterEach, beforeEach, describe, expect, it, vi } from "vitest";
import { Stepper } from "#src/components/islands/parts/Stepper.tsx";

function Kits({ start }: { start: number }) {
  const [run, setRun] = useState(start);
  return (
    <Stepper
      label="Run of"
      value={run}
      onStep={setRun}
      least={10}
      most={500}
      typedLeast={1}
      typedMost={1000}
    />
  );
}

const figure = () => screen.getByRole("button", { name: /type another/ }).textContent;
const more = () => screen.getByRole("button", { name: "One more" });
const less = () => screen.getByRole("button", { name: "One less" });
const pass = (ms: number) => act(() => vi.advanceTimersByTime(ms));

beforeEach(() => {
  vi.useFakeTimers();
});
afterEach(() => {
  cleanup();
  vi.useRealTimers();
});

describe("the stepper", () => {
  it("steps once for a short press", () => {
    render(<Kits start={120} />);
    fireEvent.pointerDown(more(), { button: 0 });
    pass(200);
    fireEvent.pointerUp(more());
    pass(5000);
    expect(figure()).toBe("121");
  });

  it("repeats after 400 ms, 8 a second, until it is let go", () => {
    render(<Kits start={120} />);
    fireEvent.pointerDown(less(), { button: 0 });
    pass(399);
    expect(figure()).toBe("119");
    pass(1);
    expect(figure()).toBe("118");
    pass(1000);
    expect(figure()).toBe("110");
    fireEvent.pointerUp(less());
    pass(5000);
    expect(figure()).toBe("110");
  });

  it("stops at its end and turns that key off, still in the tab order", () => {
    render(<Kits start={12} />);
    fireEvent.pointerDown(less(), { button: 0 });
    pass(5000);
    expect(figure()).toBe("10");
    expect(less().getAttribute("aria-disabled")).toBe("true");
    expect(less().hasAttribute("disabled")).toBe(false);
  });

  it("takes one step for a key press, which has no pointer", () => {
    render(<Kits start={120} />);
    fireEvent.click(more(), { detail: 0 });
    expect(figure()).toBe("121");
    fireEvent.click(more(), { detail: 1 });
    expect(figure()).toBe("121");
  });

  it("lets a run be typed, also beyond what the keys reach, and leaves it as it was on Escape", () => {
    render(<Kits start={120} />);
    fireEvent.click(screen.getByRole("button", { name: /type another/ }));
    fireEvent.change(screen.getByRole("textbox"), { target: { value: "750" } });
    fireEvent.keyDown(screen.getByRole("textbox"), { key: "Enter" });
    expect(figure()).toBe("750");
    fireEvent.click(screen.getByRole("button", { name: /type another/ }));
    fireEvent.change(screen.getByRole("textbox"), { target: { value: "80" } });
    fireEvent.keyDown(screen.getByRole("textbox"), { key: "Escape" });
    expect(figure()).toBe("750");
  });

  it("keeps a wrong entry in view and says what is right", () => {
    render(<Kits start={120} />);
    fireEvent.click(screen.getByRole("button", { name: /type another/ }));
    fireEvent.change(screen.getByRole("textbox"), { target: { value: "12o" } });
    fireEvent.keyDown(screen.getByRole("textbox"), { key: "Enter" });
    expect(screen.getByRole("alert").textContent).toBe("From 1 to 1000");
    expect(screen.getByRole<HTMLInputElement>("textbox").value).toBe("12o");
  });
});
