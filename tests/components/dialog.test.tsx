// @vitest-environment happy-dom
import { cleanup, fireEvent, render, screen } from "@testing-library/react";
import { useState } from "react";
import { afterEach, describe, expect, it, vi } from "vitest";
import { Dialog } from "#src/components/islands/parts/Dialog.tsx";

afterEach(cleanup);

function TakeOff({ onAct }: { onAct: () => void }) {
  const [open, setOpen] = useState(false);
  const close = () => setOpen(false);
  return (
    <>
      <button type="button" onClick={() => setOpen(true)}>
        People
      </button>
      <Dialog
        open={open}
        title="Take Tom off this kit?"
        safe={{ label: "Keep Tom", run: close }}
        act={{
          label: "Take Tom off",
          removes: true,
          run: () => {
            onAct();
            close();
          },
        }}
      >
        What he has set stays.
      </Dialog>
    </>
  );
}

function openDialog(onAct = vi.fn()) {
  render(<TakeOff onAct={onAct} />);
  const opener = screen.getByRole("button", { name: "People" });
  opener.focus();
  fireEvent.click(opener);
  return { opener, onAct };
}

describe("a dialog", () => {
  it("starts on the safe choice", () => {
    openDialog();
    expect(document.activeElement?.textContent).toBe("Keep Tom");
    expect(screen.getByRole("dialog", { name: "Take Tom off this kit?" })).toBeTruthy();
  });

  it("holds focus: Tab leads from its last control to its first, and back", () => {
    openDialog();
    const act = screen.getByRole("button", { name: "Take Tom off" });
    act.focus();
    fireEvent.keyDown(act, { key: "Tab" });
    expect(document.activeElement?.textContent).toBe("Keep Tom");
    fireEvent.keyDown(document.activeElement as Element, { key: "Tab", shiftKey: true });
    expect(document.activeElement?.textContent).toBe("Take Tom off");
  });

  it("gives focus back to what opened it, and does nothing when the safe choice is taken", () => {
    const { opener, onAct } = openDialog();
    fireEvent.click(screen.getByRole("button", { name: "Keep Tom" }));
    expect(document.activeElement).toBe(opener);
    expect(onAct).not.toHaveBeenCalled();
  });

  it("takes Escape for the safe choice", () => {
    const { opener, onAct } = openDialog();
    fireEvent(screen.getByRole("dialog"), new Event("cancel", { cancelable: true }));
    expect(document.activeElement).toBe(opener);
    expect(onAct).not.toHaveBeenCalled();
  });

  it("acts once when told to", () => {
    const { onAct } = openDialog();
    fireEvent.click(screen.getByRole("button", { name: "Take Tom off" }));
    expect(onAct).toHaveBeenCalledTimes(1);
  });
});
