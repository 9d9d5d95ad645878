// @vitest-environment happy-dom
import { cleanup, fireEvent, render, screen } from "@testing-library/react";
import { useState } from "react";
import { afterEach, describe, expect, it, vi } from "vitest";
import { Button } from "#src/components/islands/parts/Button.tsx";
import { Figure } from "#src/components/islands/parts/Figure.tsx";
import { MeasureField } from "#src/components/islands/parts/MeasureField.tsx";
import { MoneyField } from "#src/components/islands/parts/MoneyField.tsx";
import { TextField } from "#src/components/islands/parts/TextField.tsx";

afterEach(cleanup);

const box = () => screen.getByRole<HTMLInputElement>("textbox");

function Price({ start, told }: { start: string; told: (value: string) => void }) {
  const [price, setPrice] = useState(start);
  return (
    <MoneyField
      label="Price"
      value={price}
      onMoney={(value) => {
        told(value);
        setPrice(value);
      }}
    />
  );
}

function type(text: string) {
  fireEvent.change(box(), { target: { value: text } });
  fireEvent.blur(box());
}

describe("a money field", () => {
  it("writes two decimals when it is left", () => {
    const told = vi.fn();
    render(<Price start="34.00" told={told} />);
    type("33,5");
    expect(box().value).toBe("33.50");
    expect(told.mock.calls).toEqual([["33.50"]]);
  });

  it("keeps a wrong entry, ties it to a sentence, and tells nobody", () => {
    const told = vi.fn();
    render(<Price start="34.00" told={told} />);
    type("-5");
    expect(box().value).toBe("-5");
    expect(box().getAttribute("aria-invalid")).toBe("true");
    const described = document.getElementById(box().getAttribute("aria-describedby") ?? "");
    expect(described?.textContent).toBe("An amount here is never below zero.");
    expect(told).not.toHaveBeenCalled();
  });

  it("steps by 0.10, with Shift by 1.00, and is as it was after Escape", () => {
    const told = vi.fn();
    render(<Price start="34.00" told={told} />);
    fireEvent.keyDown(box(), { key: "ArrowUp" });
    fireEvent.keyDown(box(), { key: "ArrowDown", shiftKey: true });
    expect(box().value).toBe("33.10");
    fireEvent.change(box(), { target: { value: "9" } });
    fireEvent.keyDown(box(), { key: "Escape" });
    expect(box().value).toBe("33.10");
    expect(told.mock.calls).toEqual([["34.10"], ["33.10"]]);
  });
});

describe("other fields", () => {
  it("a measure converts a typed unit", () => {
    const told = vi.fn();
    render(<MeasureField label="Across" value="5" unit="mm" onMeasure={told} />);
    type("0.8 cm");
    expect(told.mock.calls).toEqual([["8"]]);
  });

  it("a text field that is off cannot be changed, is reachable, and gives its reason", () => {
    render(<TextField label="Revision" defaultValue="rev C" off hint="Set by the parts list." />);
    expect(box().readOnly).toBe(true);
    expect(box().disabled).toBe(false);
    expect(document.getElementById(box().getAttribute("aria-describedby") ?? "")?.textContent).toBe(
      "Set by the parts list.",
    );
  });
});

describe("a button", () => {
  it("that is off stays in the tab order, says why, and does nothing", () => {
    const press = vi.fn();
    render(
      <Button offBecause="Settle rows 15 and 21 first." onClick={press}>
        Bring in 23 lines
      </Button>,
    );
    const button = screen.getByRole("button", {
      name: "Bring in 23 lines",
      description: "Settle rows 15 and 21 first.",
    });
    button.focus();
    expect(document.activeElement).toBe(button);
    fireEvent.click(button);
    expect(press).not.toHaveBeenCalled();
  });

  it("that is busy does not send its form", () => {
    const sent = vi.fn((event: { preventDefault: () => void }) => event.preventDefault());
    const { rerender } = render(form(true, sent));
    fireEvent.click(screen.getByRole("button"));
    expect(sent).not.toHaveBeenCalled();
    rerender(form(false, sent));
    fireEvent.click(screen.getByRole("button"));
    expect(sent).toHaveBeenCalledTimes(1);
  });
});

function form(busy: boolean, sent: (event: { preventDefault: () => void }) => void) {
  return (
    <form onSubmit={sent}>
      <Button type="submit" busy={busy} busyWord="Sending">
        Send
      </Button>
    </form>
  );
}

describe("a figure", () => {
  it("that opens is a button named by label and value", () => {
    const open = vi.fn();
    render(<Figure label="Cost per kit" value="€14.95" onOpen={open} />);
    fireEvent.click(screen.getByRole("button", { name: "Cost per kit €14.95, show the working" }));
    expect(open).toHaveBeenCalledTimes(1);
  });

  it("that does not open is no button and has no dotted foot", () => {
    const { container } = render(<Figure label="Likely sold" value="106" />);
    expect(screen.queryByRole("button")).toBeNull();
    expect(container.innerHTML).not.toContain("foot-dotted");
  });
});
