// @vitest-environment happy-dom
import { cleanup, fireEvent, render, screen } from "@testing-library/react";
import { afterEach, describe, expect, it } from "vitest";
import KeysHelp from "#src/components/islands/parts/KeysHelp.tsx";

afterEach(() => {
  cleanup();
  localStorage.clear();
});

const list = () => screen.queryByRole("heading", { name: "Keys" });

describe("the list of keys", () => {
  it("opens on a question mark and gives focus back", () => {
    render(
      <>
        <button type="button">Somewhere</button>
        <KeysHelp />
      </>,
    );
    const somewhere = screen.getByRole("button", { name: "Somewhere" });
    somewhere.focus();
    fireEvent.keyDown(somewhere, { key: "?" });
    expect(list()).not.toBeNull();
    expect(document.activeElement?.textContent).toBe("Close");
    fireEvent.click(screen.getByRole("button", { name: "Close" }));
    expect(document.activeElement).toBe(somewhere);
  });

  it("does not open while somebody types", () => {
    render(
      <>
        <input aria-label="Part" />
        <KeysHelp />
      </>,
    );
    fireEvent.keyDown(screen.getByRole("textbox"), { key: "?" });
    expect(list()).toBeNull();
  });

  it("can be turned off, and then needs Alt", () => {
    render(<KeysHelp />);
    fireEvent.keyDown(document.body, { key: "?" });
    fireEvent.click(screen.getByRole("checkbox"));
    fireEvent.click(screen.getByRole("button", { name: "Close" }));
    fireEvent.keyDown(document.body, { key: "?" });
    expect(list()).toBeNull();
    fireEvent.keyDown(document.body, { key: "?", altKey: true });
    expect(list()).not.toBeNull();
  });
});
