import { type KeyboardEvent, type RefObject, useEffect, useRef } from "react";

const FOCUSABLE =
  'a[href], button, input:not([type="hidden"]), select, textarea, summary, [tabindex]:not([tabindex="-1"])';

/** Keeps Tab and Shift Tab inside a modal: from its last control to its first and back. */
export function holdFocus(press: KeyboardEvent<HTMLElement>): void {
  if (press.key !== "Tab") return;
  const all = [...press.currentTarget.querySelectorAll<HTMLElement>(FOCUSABLE)].filter(
    (control) => !(control as HTMLButtonElement).disabled && control.getAttribute("aria-hidden") !== "true",
  );
  const [first, last] = [all[0], all.at(-1)];
  const leaving = press.shiftKey ? first : last;
  if (document.activeElement !== leaving && press.currentTarget.contains(document.activeElement)) return;
  press.preventDefault();
  (press.shiftKey ? last : first)?.focus();
}

/** Remembers what has focus now; calling the answer gives it back, if it is still on the page. */
export function focusToReturn(): () => void {
  const before = document.activeElement;
  return () => {
    if (before instanceof HTMLElement && before.isConnected) before.focus({ preventScroll: true });
  };
}

/**
 * A modal in step with `open`: what lies behind is inert, focus starts at `start` and goes back to where it was.
 * Returns the ref of its `<dialog>`.
 */
export function useModal(
  open: boolean,
  start: RefObject<HTMLElement | null>,
): RefObject<HTMLDialogElement | null> {
  const box = useRef<HTMLDialogElement>(null);
  useEffect(() => {
    const dialog = box.current;
    if (!dialog || !open) return;
    const giveBack = focusToReturn();
    dialog.showModal();
    start.current?.focus();
    return () => {
      dialog.close();
      giveBack();
    };
  }, [open, start]);
  return box;
}
