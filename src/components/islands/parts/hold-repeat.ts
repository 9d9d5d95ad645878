import { type MouseEvent, type PointerEvent, useEffect, useRef } from "react";

/** Holding a key repeats after 400 ms, 8 times a second. */
export const HOLD_MS = 400;
export const REPEAT_MS = 125;

/**
 * Handlers for a key that repeats while it is held. `step` runs at once and again until it answers false (the end is
 * reached) or the key is let go. A press of Enter or the space bar is one step.
 */
export function useHoldRepeat(step: () => boolean) {
  const timer = useRef<ReturnType<typeof setTimeout>>(undefined);
  const latest = useRef(step);
  latest.current = step;

  function stop() {
    clearTimeout(timer.current);
    timer.current = undefined;
  }

  function repeat(wait: number) {
    timer.current = setTimeout(() => {
      if (latest.current()) repeat(REPEAT_MS);
    }, wait);
  }

  useEffect(() => () => clearTimeout(timer.current), []);

  return {
    onPointerDown(press: PointerEvent) {
      if (press.button !== 0) return;
      stop();
      if (latest.current()) repeat(HOLD_MS);
    },
    onPointerUp: stop,
    onPointerLeave: stop,
    onPointerCancel: stop,
    onBlur: stop,
    /** `detail` 0: the click came from the keyboard or a screen reader, with no pointer before it. */
    onClick(press: MouseEvent) {
      if (press.detail === 0) latest.current();
    },
  };
}
