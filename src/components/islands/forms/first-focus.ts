import { type RefObject, useEffect, useRef } from "react";

/** For a form that a press has opened: its first field takes the focus when it is there. */
export function useFirstFocus(takes: boolean): RefObject<HTMLFormElement | null> {
  const form = useRef<HTMLFormElement>(null);
  useEffect(() => {
    if (takes) form.current?.querySelector<HTMLElement>("input, select")?.focus();
  }, [takes]);
  return form;
}
